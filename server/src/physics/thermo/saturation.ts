import type { Outcome } from '../outcome';
import { failure, success } from '../outcome';
import type { Species } from '../species/species';
import type { SaturationCurve } from './saturationCurve';
import { logSaturation, saturationTemperature } from './saturationCurve';

/**
 * Saturation pressure of one species, Pa, over its solid or liquid at a temperature in K.
 * Nothing is continued beyond the data: cold matter changes its crystals, and above the critical point there is no liquid.
 */
export function saturationPressure(species: Species, temperature: number): Outcome<number> {
  const curves = curvesOf(species);
  const [first] = curves;
  const last = curves.at(-1);
  if (first === undefined || last === undefined) return unknown(species);
  const { low } = first.curve;
  const { high } = last.curve;
  if (low <= temperature && temperature <= high) {
    const here = curves.find(({ curve }) => temperature < curve.high) ?? last;
    return success(Math.exp(logPressure(here, temperature)));
  }
  const critical = criticalPoint(species, last.curve);
  if (critical !== undefined && critical.temperature < temperature) {
    return aboveCritical(species, 'temperature', critical.temperature);
  }
  return failure({ kind: 'outside-range', quantity: 'temperature', value: temperature, low, high });
}

/** Dew or frost point of one species, K: the temperature at which its saturation pressure is the pressure given, Pa. */
export function dewPoint(species: Species, pressure: number): Outcome<number> {
  const curves = curvesOf(species);
  const [first] = curves;
  const last = curves.at(-1);
  if (first === undefined || last === undefined) return unknown(species);
  if (first.curve.kind === 'constant') {
    return failure({ kind: 'no-data', species: species.formula, property: 'saturation_curve' });
  }
  const wanted = Math.log(pressure);
  const low = logPressure(first, first.curve.low);
  const high = logPressure(last, last.curve.high);
  if (low <= wanted && wanted <= high) {
    const here = curves.find((each) => wanted < logPressure(each, each.curve.high)) ?? last;
    return success(saturationTemperature(here.curve, wanted - here.shift));
  }
  const critical = criticalPoint(species, last.curve);
  if (critical !== undefined && critical.pressure < pressure)
    return aboveCritical(species, 'pressure', critical.pressure);
  const range = { low: Math.exp(low), high: Math.exp(high) };
  return failure({ kind: 'outside-range', quantity: 'pressure', value: pressure, ...range });
}

/**
 * Whether a vapour at this pressure, Pa, would condense or freeze at this temperature, K. Colder than the data reach it
 * must, if its pressure is above the saturation pressure where they end, because that falls with the temperature.
 */
export function wouldCondense(species: Species, temperature: number, pressure: number): boolean {
  const range = saturationRange(species);
  if (range === undefined) return false;
  const saturated = saturationPressure(species, Math.max(temperature, range.low));
  return saturated.ok && saturated.value < pressure;
}

/** What a vapour at this temperature, K, condenses to. */
export function condensedPhase(species: Species, temperature: number): 'solid' | 'liquid' {
  const curves = species.saturation?.map(({ value }) => value) ?? [];
  return (curves.find(({ high }) => temperature < high) ?? curves.at(-1))?.phase ?? 'liquid';
}

/** Where the saturation pressure of a species is known, K. */
export function saturationRange({ saturation = [] }: Species): TemperatureRange | undefined {
  const [first] = saturation;
  const last = saturation.at(-1);
  return first && last && { low: first.value.low, high: last.value.high };
}

interface TemperatureRange {
  readonly low: number;
  readonly high: number;
}

/** A curve and what is added to its logarithm, so that it joins its warmer neighbour without a step. */
interface Joined {
  readonly curve: SaturationCurve;
  readonly shift: number;
}

const joinedCurves = new WeakMap<Species, readonly Joined[]>();

/**
 * The curves of a species from cold to warm. The warmest stands as published, since liquids are measured best; each colder one
 * is scaled to begin where its neighbour ends, which stays well within its own error.
 */
function curvesOf(species: Species): readonly Joined[] {
  const known = joinedCurves.get(species);
  if (known !== undefined) return known;
  const joined: Joined[] = [];
  for (const { value: curve } of [...(species.saturation ?? [])].reverse()) {
    const [warmer] = joined;
    const shift = warmer ? logPressure(warmer, curve.high) - logSaturation(curve, curve.high) : 0;
    joined.unshift({ curve, shift });
  }
  joinedCurves.set(species, joined);
  return joined;
}

function logPressure({ curve, shift }: Joined, T: number): number {
  return logSaturation(curve, T) + shift;
}

/** Wagner's equation of a liquid ends at the critical point; of the others the species may know it. */
function criticalPoint(
  species: Species,
  warmest: SaturationCurve,
): { readonly temperature: number; readonly pressure: number } | undefined {
  return warmest.kind === 'wagner' && warmest.phase === 'liquid' ? warmest : species.critical?.value;
}

function unknown(species: Species): Outcome<number> {
  return failure({ kind: 'no-data', species: species.formula, property: 'saturation_pressure' });
}

function aboveCritical(species: Species, quantity: 'temperature' | 'pressure', critical: number): Outcome<number> {
  return failure({ kind: 'above-critical', species: species.formula, quantity, critical });
}
