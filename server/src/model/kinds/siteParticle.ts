import type { Outcome } from '../../physics/outcome';
import type { SphereInGas } from '../../physics/particles/sphereDrag';
import {
  dragSources,
  largestReynolds,
  relaxationTime,
  settlingSpeed,
  slipFactor,
  sphereReynolds,
  stoppingDistance,
} from '../../physics/particles/sphereDrag';
import { constantNamed } from '../../quantities/constants';
import { formatNumber } from '../../quantities/format';
import { unitOf } from '../../quantities/parseUnit';
import { figure } from '../figures';
import { propagate } from '../propagate';
import { plainNumber, quantity } from '../quantity';
import { citation } from '../reasons';
import { resultNamed } from '../results';
import { exact } from '../tolerance';
import type { Figure, Members, Quantity, Record } from '../values';
import { quantityOf } from './siteMembers';

/** How a small sphere moves in a gas at rest. */
export function particleMembers(state: Record, particle: Record): Members {
  const diameter = quantityOf(particle.members, 'diameter');
  const density = quantityOf(particle.members, 'density');
  const [viscosity, gasDensity, freePath, meanSpeed] = [
    ...['viscosity', 'density', 'mean_free_path', 'mean_speed'].map((name) => quantityOf(state.members, name)),
  ];
  if (!diameter || !density || !viscosity || !gasDensity || !freePath || !meanSpeed) return new Map();
  const speed = quantityOf(state.members, 'speed');
  const { result, leans } = propagate<Motion>({
    inputs: [diameter, density, viscosity, gasDensity, freePath, meanSpeed, speed ?? plainNumber(NaN)],
    run: ([d = NaN, own = NaN, eta = NaN, rho = NaN, lambda = NaN, c = NaN, u = NaN], factors) => {
      const sphere = { diameter: d, density: own, viscosity: eta, gasDensity: rho, freePath: lambda, meanSpeed: c };
      return motionOf(sphere, u, factors);
    },
    errorsOf: ({ errors }) => errors,
    valuesOf: ({ values }) => values,
  });
  const found = (name: Result, method: string, more: { range?: string; assumptions?: readonly string[] } = {}) => {
    const value = result.values.get(name);
    const why = result.reasons.get(name) ?? `the particle has no ${name}`;
    const made: Figure =
      value === undefined
        ? { kind: 'absent', why }
        : figure(shaped(name, value, leans.get(name) ?? exact), {
            ...{ method, sources: dragSources.map(citation), assumptions: more.assumptions ?? [] },
            ...(more.range === undefined ? {} : { range: more.range }),
          });
    return [name, made] as const;
  };
  const creeping = (name: Result) =>
    `Stokes’ law, for Reynolds numbers below 0.1; here ${result.reynolds.get(name) ?? ''}`;
  const sphere = ['a smooth solid sphere that reflects molecules as polystyrene in air does'];
  return new Map([
    found('slip_factor', 'Cunningham’s slip factor, 1 + Kn (1.142 + 0.558 e^(−0.999/Kn)) with Kn = 2λ/d', {
      range: 'measured in air',
      assumptions: sphere,
    }),
    found('relaxation_time', 'Stokes’ law with Cunningham’s slip factor, ρd²C/(18η)', { assumptions: sphere }),
    found('settling_speed', 'Stokes’ law with Cunningham’s slip factor, weight less buoyancy', {
      range: creeping('settling_speed'),
      assumptions: [...sphere, 'standard gravity'],
    }),
    found('stopping_distance', 'speed of the stream times relaxation time', {
      range: creeping('stopping_distance'),
      assumptions: [...sphere, 'a particle that enters gas at rest with the stated speed'],
    }),
  ]);
}

type Result = 'slip_factor' | 'relaxation_time' | 'settling_speed' | 'stopping_distance';

interface Motion {
  readonly values: ReadonlyMap<Result, number>;
  readonly reasons: ReadonlyMap<Result, string>;
  /** As shown. */
  readonly reynolds: ReadonlyMap<Result, string>;
  readonly errors: readonly { readonly key: string; readonly relative: number }[];
}

/** Of the share of the drag that slip takes away: what its measurements and its mean free path leave open. */
const SLIP_ERROR = 0.03;

function motionOf(sphere: SphereInGas, speed: number, factors: ReadonlyMap<string, number>): Motion {
  const slip = factors.get('slip_correction') ?? 1;
  const settling = settlingSpeed(sphere, constantNamed('g_n').value);
  const stopping = Number.isNaN(speed) ? undefined : stoppingDistance(sphere, speed);
  const settles = settling.ok ? settling.value : NaN;
  return {
    values: new Map<Result, number>([
      ['slip_factor', slipFactor(sphere) * slip],
      ['relaxation_time', relaxationTime(sphere) * slip],
      ...(settling.ok
        ? [['settling_speed', settling.value * slip * (factors.get('inertia_of_the_gas') ?? 1)] as const]
        : []),
      ...(stopping?.ok
        ? [['stopping_distance', stopping.value * slip * (factors.get('inertia_at_the_given_speed') ?? 1)] as const]
        : []),
    ]),
    reasons: new Map<Result, string>([
      ['settling_speed', reasonOf(settling)],
      [
        'stopping_distance',
        stopping ? reasonOf(stopping) : 'the state has no speed, at which the particle would enter it',
      ],
    ]),
    reynolds: new Map<Result, string>([
      ['settling_speed', formatNumber(sphereReynolds(sphere, settles), 2)],
      ['stopping_distance', formatNumber(sphereReynolds(sphere, speed), 2)],
    ]),
    errors: [
      { key: 'slip_correction', relative: SLIP_ERROR * (1 - 1 / slipFactor(sphere)) },
      { key: 'inertia_of_the_gas', relative: oseen(sphere, settles) },
      { key: 'inertia_at_the_given_speed', relative: oseen(sphere, speed) },
    ],
  };
}

/** The first term that Stokes' law leaves out, 3/16 Re. */
function oseen(sphere: SphereInGas, speed: number): number {
  return Number.isFinite(speed) ? (3 / 16) * Math.min(sphereReynolds(sphere, speed), largestReynolds) : 0;
}

function reasonOf(outcome: Outcome<number>): string {
  if (outcome.ok || outcome.reason.kind !== 'outside-range') return '';
  const { quantity: what, value, high } = outcome.reason;
  return what === 'reynolds_number'
    ? `at a Reynolds number of ${formatNumber(value, 2)} the drag is no longer that of Stokes, which holds below ${high}`
    : `at ${formatNumber(value, 2)} of the mean speed of the molecules the drag is no longer proportional to the speed`;
}

const units: { readonly [name in Result]: string } = {
  slip_factor: '1',
  relaxation_time: 's',
  settling_speed: 'm/s',
  stopping_distance: 'm',
};

function shaped(name: Result, si: number, leans: Quantity['leans']): Quantity {
  const quantityKind = resultNamed(name)?.quantityKind ?? 'number';
  return { ...quantity(si, unitOf(units[name]).dimension, leans), quantityKind };
}
