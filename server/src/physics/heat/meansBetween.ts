import type { Kelvin, Pascal } from '../brands';
import { kelvin, pascal } from '../brands';
import type { Composition } from '../composition';
import { R } from '../constants';
import { gaussLegendre } from '../numerics/gaussLegendre';
import type { Outcome } from '../outcome';
import { all, failure, success } from '../outcome';
import { solveState } from '../state/closure';
import type { GasState } from '../state/gasState';
import { gasState } from '../state/gasState';
import type { Trial } from '../state/request';

/** Means over the temperatures between two walls. */
export interface Means {
  /** W/(m K): ∫λ dT over the difference. */
  readonly conductivity: number;
  /** Of each species, what a molecule that strikes a wall carries away per kelvin, times N_A, J/(mol K): c_p − R/2. */
  readonly carried: readonly number[];
}

/** Enough for ten digits of any correlation that is smooth between the walls. */
const NODES = 12;

/** Many trials move neither temperature nor gas, so the last means of a gas are kept as long as the gas is. */
const last = new WeakMap<Composition, Kept>();

interface Kept {
  readonly cold: number;
  readonly hot: number;
  readonly factors: Trial['factors'];
  readonly means: Outcome<Means>;
}

export function meansBetween(composition: Composition, cold: Kelvin, hot: Kelvin, trial: Trial): Outcome<Means> {
  const { factors } = trial;
  const kept = last.get(composition);
  if (kept?.cold === cold && kept.hot === hot && kept.factors === factors) return kept.means;
  const means = integrated(composition, cold, hot, trial);
  last.set(composition, { cold, hot, factors, means });
  return means;
}

function integrated(composition: Composition, cold: Kelvin, hot: Kelvin, trial: Trial): Outcome<Means> {
  const { nodes, weights } = gaussLegendre(NODES);
  const carried = composition.species.map(() => 0);
  let conductivity = 0;
  for (const [index, node] of nodes.entries()) {
    const temperature = kelvin((hot + cold) / 2 + ((hot - cold) / 2) * node);
    const state = gasAt(composition, temperature, ANY_PRESSURE, trial);
    if (!state.ok) return state;
    const heats = all(state.value.species.map(({ cp }) => cp));
    if (!heats.ok) return heats;
    if (!state.value.conductivity.ok) return state.value.conductivity;
    const share = (weights[index] ?? 0) / 2;
    conductivity += share * state.value.conductivity.value;
    heats.value.forEach((cp, i) => (carried[i] = (carried[i] ?? 0) + share * (cp - R / 2)));
  }
  if (!(conductivity > 0)) return failure({ kind: 'not-finite', quantity: 'conductivity' });
  return success({ conductivity, carried });
}

/** Of a dilute gas neither the conductivity nor the heat capacity knows the pressure. */
const ANY_PRESSURE = pascal(1);

/** The gas at one temperature between the walls. */
export function gasAt(
  composition: Composition,
  temperature: Kelvin,
  pressure: Pascal,
  trial: Trial,
): Outcome<GasState> {
  const point = solveState(composition, { temperature, pressure });
  if (!point.ok) return point;
  // No monolayer is asked for here.
  return success(gasState({ composition, point: point.value, siteDensity: 1 }, trial));
}
