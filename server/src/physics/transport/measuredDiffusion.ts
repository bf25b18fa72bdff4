import type { SourceId } from '../sources';
import type { Species } from '../species/species';
import { isStated } from '../species/species';

/**
 * Diffusion of pairs of gases as measured: pD = a Tˢ exp(−b/T), the evaluations of Marrero & Mason 1972 (table 22), by formula.
 * `a` is printed for p in atm and D in cm²/s. The equations are from memory, and checked against the values that handbooks
 * have printed from them; the range is the one in which they were checked.
 */
export interface MeasuredPair {
  readonly pair: readonly [string, string];
  readonly a: number;
  readonly s: number;
  readonly b: number;
}

export const measuredDiffusionSource: SourceId = 'Marrero & Mason 1972';
export const measuredRange = { low: 273, high: 674 } as const;

/** Relative error of the evaluations, 95 %. */
export const measuredError = 0.04;

const measuredPairs: readonly MeasuredPair[] = [
  { pair: ['air', 'CH4'], a: 1.03e-5, s: 1.747, b: 0 },
  { pair: ['air', 'CO'], a: 1.12e-5, s: 1.73, b: 0 },
  { pair: ['air', 'CO2'], a: 2.7e-5, s: 1.59, b: 102.1 },
  { pair: ['air', 'H2'], a: 3.64e-5, s: 1.75, b: 0 },
  { pair: ['air', 'H2O'], a: 1.87e-6, s: 2.072, b: 0 },
  { pair: ['air', 'He'], a: 3.78e-5, s: 1.729, b: 0 },
  { pair: ['Ar', 'CH4'], a: 7.84e-6, s: 1.785, b: 0 },
  { pair: ['Ar', 'CO'], a: 9.04e-6, s: 1.752, b: 0 },
  { pair: ['Ar', 'CO2'], a: 1.74e-5, s: 1.646, b: 89.1 },
  { pair: ['Ar', 'N2'], a: 9.04e-6, s: 1.752, b: 0 },
  { pair: ['Ar', 'O2'], a: 9.77e-6, s: 1.736, b: 0 },
  { pair: ['CH4', 'H2'], a: 3.13e-5, s: 1.765, b: 0 },
  { pair: ['CH4', 'He'], a: 3.13e-5, s: 1.75, b: 0 },
  { pair: ['CH4', 'N2'], a: 1e-5, s: 1.75, b: 0 },
  { pair: ['CH4', 'O2'], a: 1.68e-5, s: 1.695, b: 44.2 },
  { pair: ['CO2', 'H2'], a: 3.14e-5, s: 1.75, b: 11.7 },
  { pair: ['CO2', 'N2'], a: 3.15e-5, s: 1.57, b: 113.6 },
  { pair: ['H2O', 'N2'], a: 1.87e-6, s: 2.072, b: 0 },
  { pair: ['H2O', 'O2'], a: 1.89e-6, s: 2.072, b: 0 },
  { pair: ['N2', 'O2'], a: 1.13e-5, s: 1.724, b: 0 },
];

const byPair: ReadonlyMap<string, MeasuredPair> = new Map(
  measuredPairs.flatMap((row) => {
    const [one, other] = row.pair;
    return [
      [pairKey(one, other), row],
      [pairKey(other, one), row],
    ];
  }),
);

export function measuredPair(one: Species, other: Species): MeasuredPair | undefined {
  return isStated(one) || isStated(other) ? undefined : byPair.get(pairKey(one.formula, other.formula));
}

/** pD in Pa m²/s, at a temperature in K within the range. */
export function measuredDiffusion({ a, s, b }: MeasuredPair, temperature: number): number {
  return a * squareCentimetreAtmosphere * Math.pow(temperature, s) * Math.exp(-b / temperature);
}

/** 1 cm²·atm in SI units. */
const squareCentimetreAtmosphere = 1e-4 * 101325;

function pairKey(one: string, other: string): string {
  return `${one}|${other}`;
}
