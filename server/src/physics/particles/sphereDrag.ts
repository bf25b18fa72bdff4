import type { Outcome } from '../outcome';
import { failure, success } from '../outcome';
import type { SourceId } from '../sources';

/** Where the slip factor comes from. */
export const dragSources: readonly SourceId[] = ['Allen & Raabe 1985'];

/** A small sphere in a gas at rest, in SI units. */
export interface SphereInGas {
  readonly diameter: number;
  readonly density: number;
  readonly viscosity: number;
  readonly gasDensity: number;
  /** λ from the viscosity */
  readonly freePath: number;
  /** c̄ of the gas */
  readonly meanSpeed: number;
}

/**
 * Cunningham's slip factor: how many times less the drag is than by Stokes' law, C = 1 + Kn [1.142 + 0.558 e^(−0.999/Kn)] with
 * Kn = 2λ/d. Solid spheres of polystyrene latex in air.
 * M. D. Allen, O. G. Raabe, Aerosol Sci. Technol. 4, 269 (1985).
 */
export function slipFactor({ diameter, freePath }: Pick<SphereInGas, 'diameter' | 'freePath'>): number {
  const kn = (2 * freePath) / diameter;
  return 1 + kn * (1.142 + 0.558 * Math.exp(-0.999 / kn));
}

/** τ = ρ_p d² C/(18 η): how long it takes to take on the motion of the gas. */
export function relaxationTime(sphere: SphereInGas): number {
  return (sphere.density * sphere.diameter ** 2 * slipFactor(sphere)) / (18 * sphere.viscosity);
}

/** The steady speed of its fall by its weight less its buoyancy; upwards below zero. */
export function settlingSpeed(sphere: SphereInGas, gravity: number): Outcome<number> {
  const speed = relaxationTime(sphere) * gravity * (1 - sphere.gasDensity / sphere.density);
  return slow(sphere, Math.abs(speed), speed);
}

/** How far it gets into the gas at rest when it enters at a speed: uτ. */
export function stoppingDistance(sphere: SphereInGas, speed: number): Outcome<number> {
  return slow(sphere, speed, speed * relaxationTime(sphere));
}

/** Re = ρ u d/η with the density of the gas. */
export function sphereReynolds({ gasDensity, diameter, viscosity }: SphereInGas, speed: number): number {
  return (gasDensity * Math.abs(speed) * diameter) / viscosity;
}

/** Stokes' law takes the inertia of the gas for nothing; Oseen's correction to it is 3/16 Re. */
export const largestReynolds = 1;

/** Where molecules decide, the drag grows in proportion to the speed only while that is small against theirs. */
const largestSpeedRatio = 0.3;

/** The result, if the speed is one at which the drag is proportional to it. */
function slow(sphere: SphereInGas, speed: number, result: number): Outcome<number> {
  const reynolds = sphereReynolds(sphere, speed);
  if (!(reynolds <= largestReynolds)) {
    return failure({
      kind: 'outside-range',
      quantity: 'reynolds_number',
      value: reynolds,
      low: 0,
      high: largestReynolds,
    });
  }
  const ratio = speed / sphere.meanSpeed;
  if (!(ratio <= largestSpeedRatio)) {
    return failure({
      kind: 'outside-range',
      quantity: 'speed_over_mean_speed',
      value: ratio,
      low: 0,
      high: largestSpeedRatio,
    });
  }
  return success(result);
}
