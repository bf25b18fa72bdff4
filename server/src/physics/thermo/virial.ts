import { R } from '../constants';
import type { Composition } from '../composition';
import type { Outcome } from '../outcome';
import { failure, success } from '../outcome';
import { speciesByName } from '../species/list';
import type { Species } from '../species/species';
import { fittedVirial, measuredVirialOf } from './measuredVirial';
import type { Corresponding } from './tsonopoulos';
import { correspondingOf, correspondingOfPair, tsonopoulosVirial } from './tsonopoulos';

/** The second virial coefficient B in p = ρRT(1 + Bρ + …), with the volume by which it may be in error. */
export interface Virial {
  /** m³/mol. */
  readonly coefficient: number;
  /** What the relative error of the method multiplies, m³/mol: B itself may be nought. */
  readonly scale: number;
}

/** The error of the method, 95 %, as a share of `scale`: 5 cm³/mol for nitrogen at room temperature, 5 % where B is large. */
export const virialError = 0.015;

/** B of a mixture, Σᵢ Σⱼ xᵢ xⱼ Bᵢⱼ, at a temperature in K. A blend counts as what it consists of. */
export function secondVirial(composition: Composition, T: number): Outcome<Virial> {
  const parts = unblended(composition);
  const known: Known[] = [];
  for (const { species, fraction } of parts) {
    const corresponding = correspondingOf(species, T);
    if (corresponding === undefined) {
      return failure({ kind: 'no-data', species: species.formula, property: 'critical_point' });
    }
    known.push({ species, fraction, corresponding });
  }
  let coefficient = 0;
  let scale = 0;
  known.forEach((one, i) => {
    known.slice(0, i + 1).forEach((other, j) => {
      const own = i === j;
      const pair = own ? one.corresponding : correspondingOfPair(one.corresponding, other.corresponding);
      const value = own ? pureVirial(one.species, pair, T) : tsonopoulosVirial(pair, T);
      const share = (own ? 1 : 2) * one.fraction * other.fraction;
      coefficient += share * value;
      scale += share * ((R * pair.temperature) / pair.pressure + 3 * Math.abs(value));
    });
  });
  return success({ coefficient, scale });
}

interface Known {
  readonly species: Species;
  readonly fraction: number;
  readonly corresponding: Corresponding;
}

/** As measured within the range of the measurements; beyond it, moved along Tsonopoulos's correlation without a step. */
function pureVirial(species: Species, corresponding: Corresponding, T: number): number {
  const fit = measuredVirialOf(species);
  if (fit === undefined) return tsonopoulosVirial(corresponding, T);
  const end = Math.min(Math.max(T, fit.low), fit.high);
  const atEnd = fittedVirial(fit, end);
  if (end === T) return atEnd;
  const there = correspondingOf(species, end) ?? corresponding;
  return atEnd + tsonopoulosVirial(corresponding, T) - tsonopoulosVirial(there, end);
}

/** Each species with its share; a blend is taken apart, and what comes twice is counted together. */
function unblended({ species, moleFractions }: Composition): readonly { species: Species; fraction: number }[] {
  const shares = new Map<Species, number>();
  const count = (one: Species, fraction: number) => shares.set(one, (shares.get(one) ?? 0) + fraction);
  species.forEach((one, i) => {
    const fraction = moleFractions[i] ?? 0;
    const parts = Object.entries(one.blend?.value ?? {}).map(([name, share]) => ({ part: speciesByName(name), share }));
    for (const { part, share } of parts) if (part !== undefined) count(part, fraction * share);
    if (parts.length === 0) count(one, fraction);
  });
  return [...shares].map(([one, fraction]) => ({ species: one, fraction }));
}
