import type { LiteralRole } from '../../model/literal';
import type { Scope } from '../../model/scope';
import type { StandardReference } from '../../quantities/conversion';
import { fromSI, fromSIDifference, toSI, toSIDifference } from '../../quantities/conversion';
import type { Unit } from '../../quantities/parseUnit';

/** What a reading in a unit is in SI: absolute where the unit counts from a zero of its own or from the ambient. */
export function siOfReading(reading: number, unit: Unit, role: LiteralRole, scope: Scope): number {
  if (role === 'difference') return toSIDifference(reading, unit, referenceOf(scope));
  return toSI(reading, unit, referenceOf(scope)) + ambientOf(unit, scope);
}

/** What is read in a unit of a value in SI. */
export function readingOfSi(si: number, unit: Unit, role: LiteralRole, scope: Scope): number {
  if (role === 'difference') return fromSIDifference(si, unit, referenceOf(scope));
  return fromSI(si - ambientOf(unit, scope), unit, referenceOf(scope));
}

/** A number as a person would write it, without an exponent unless that is shorter or the usual thing. */
export function writeReading(reading: number): string {
  const value = shortest(reading);
  const plain = String(value);
  const size = Math.abs(value);
  if (value === 0 || (size >= 1e-3 && size < 1e5)) return plain;
  const [mantissa = '', exponent = ''] = value.toExponential().split('e');
  const short = `${mantissa}e${Number(exponent)}`;
  return plain.includes('e') || short.length < plain.length ? short : plain;
}

export function writeQuantity(reading: number, unit: Unit): string {
  return withUnit(writeReading(reading), unit);
}

/** The degree of angle stands tight, every other unit after a space; a plain number has none. */
export function withUnit(number: string, { text }: Unit): string {
  if (text === '1') return number;
  return text === '°' ? `${number}°` : `${number} ${text}`;
}

/** The fewest digits within a billionth, so that a conversion and its way back end where they began. */
function shortest(reading: number): number {
  const slack = Math.abs(reading) * 1.000001e-9;
  for (let digits = 1; digits < 17; digits += 1) {
    const value = Number(reading.toPrecision(digits));
    if (Math.abs(value - reading) <= slack) return value;
  }
  return reading;
}

function ambientOf(unit: Unit, scope: Scope): number {
  return unit.kind === 'gauge' ? scope.condition('ambient_pressure').si : 0;
}

function referenceOf(scope: Scope): StandardReference {
  return { temperature: scope.condition('standard_temperature').si, pressure: scope.condition('standard_pressure').si };
}
