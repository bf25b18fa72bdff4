import type { Kelvin, Pascal } from '../brands';
import { kelvin } from '../brands';
import type { Composition } from '../composition';
import { N_A, R } from '../constants';
import type { Outcome } from '../outcome';
import { failure, map, success } from '../outcome';
import type { GasState } from '../state/gasState';
import type { Trial } from '../state/request';
import { factor } from '../state/request';
import { excessShare, jumpCoefficient } from './excess';
import { gasAt, meansBetween } from './meansBetween';
import type { HeatPath, HeatWalls } from './walls';
import { heatPath } from './walls';

export interface Conduction {
  readonly composition: Composition;
  readonly hot: Kelvin;
  readonly cold: Kelvin;
  /** Of the gas at rest, at the mean of the two temperatures. */
  readonly pressure: Pascal;
  readonly walls: HeatWalls;
  /** Energy accommodation coefficients, above 0 up to 1. */
  readonly hotAccommodation: number;
  readonly coldAccommodation: number;
}

/** SI. Fluxes count at one plate, or at the inner cylinder. */
export interface ConductedHeat {
  readonly flux: number;
  readonly flow: number;
  /** What Fourier's law without jumps would need for the same heat. */
  readonly conductivity: number;
  readonly hotJump: number;
  readonly coldJump: number;
  readonly freeMolecularFlow: number;
  readonly continuumFlow: number;
  readonly knudsen: Outcome<number>;
}

/**
 * Heat through a gas at rest between two walls, over all Knudsen numbers: ΔT over a sum of resistances in series,
 *   R = R_c + R_m (1 + ε) + R_m [(1 − α₁)/α₁ + (A/A₂)(1 − α₂)/α₂].
 * R_c is that of the continuum, Fourier's law with the conductivity integrated between the temperatures. R_m is that of
 * diffuse walls in free flight (Knudsen 1911), ΔT over Σᵢ pᵢ/√(2πmᵢkT) ∫(c_p − R/2)/N_A dT, which is
 * (γ+1)/(γ−1) √(R/8πMT) p ΔT for one gas of constant heat capacity. ε is from the linearised kinetic equation (excessShare).
 * The last term is exact for walls that send molecules back in all directions with the spread of one temperature: such a
 * wall is a resistance in series with a diffuse one. So both limits are exact, whatever the accommodation. Molecules of
 * several atoms, and mixtures, are taken to be alike a gas of single atoms at the same ratio of R_c and R_m.
 */
export function conductHeat(conduction: Conduction, trial: Trial): Outcome<ConductedHeat> {
  const { composition, hot, cold, pressure, walls } = conduction;
  const { hotAccommodation, coldAccommodation } = conduction;
  if (!(hot > cold)) return failure({ kind: 'not-positive', quantity: 'temperatureDifference', value: hot - cold });
  const means = meansBetween(composition, cold, hot, trial);
  if (!means.ok) return means;
  const middle = gasAt(composition, kelvin((hot + cold) / 2), pressure, trial);
  if (!middle.ok) return middle;
  const path = heatPath(walls);
  const { conductivity, carried } = means.value;

  const continuum = path.length / conductivity;
  const molecular = 1 / exchange(middle.value, carried);
  const hotWall = path.hotShare * (1 / hotAccommodation - 1);
  const coldWall = path.coldShare * (1 / coldAccommodation - 1);
  const walled = molecular * (1 + hotWall + coldWall);
  const excess = molecular * excessShare(((15 * Math.sqrt(Math.PI)) / 8) * (continuum / molecular), path.logarithm);
  const between = (4 * continuum * walled) / (continuum + walled) ** 2;
  const doubt = 1 + (factor(trial, transition) - 1) * between;
  const flux = (hot - cold) / ((continuum + walled + excess) * doubt);
  if (!(flux > 0 && flux < Infinity)) return failure({ kind: 'not-finite', quantity: 'heat_flux' });

  const jump = (accommodation: number) =>
    (conductivity * molecular * (diffuseJump * accommodation + 1 - accommodation)) / accommodation;
  return success({
    flux,
    flow: flux * path.area,
    conductivity: (flux * path.length) / (hot - cold),
    hotJump: jump(hotAccommodation),
    coldJump: jump(coldAccommodation),
    freeMolecularFlow: ((hot - cold) * path.area) / walled,
    continuumFlow: ((hot - cold) * path.area) / continuum,
    knudsen: knudsenOf(middle.value, path),
  });
}

/** The key of the error of what lies between the limits. */
export const transition = 'heat_transition';

/**
 * Its size, 95 %, where both resistances are alike: our judgement. Molecules of several atoms jump some 2.5 % less, walls that
 * mirror a part of the molecules up to 3 % more; for mixtures that differ in mass little is published.
 */
export function transitionError({ species }: Composition): number {
  return species.length > 1 ? 0.05 : 0.02;
}

/** Of the resistance R_m, what one diffuse wall adds to that of the continuum. */
const diffuseJump = ((8 / 15) * jumpCoefficient) / Math.sqrt(Math.PI);

/** What diffuse walls exchange in free flight, W/(m² K). */
function exchange({ species }: GasState, carried: readonly number[]): number {
  return species.reduce((sum, { numberDensity, meanSpeed }, i) => {
    return sum + ((numberDensity * meanSpeed) / 4) * ((carried[i] ?? 0) / N_A);
  }, 0);
}

/** On the free path from the viscosity at the mean temperature. */
function knudsenOf({ viscosity, point, molarMass }: GasState, { characteristic }: HeatPath): Outcome<number> {
  const speed = Math.sqrt((Math.PI * R * point.temperature) / (2 * molarMass));
  return map(viscosity, (eta) => ((eta / point.pressure) * speed) / characteristic);
}
