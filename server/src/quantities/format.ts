import type { StandardReference } from './conversion';
import { fromSI, fromSIDifference, standardReference } from './conversion';
import type { Unit } from './parseUnit';

export interface FormatOptions {
  /** Significant digits. */
  readonly digits?: number;
  readonly reference?: StandardReference;
}

/** What stands for a number that there is none of. */
const noNumber = '–';

/** Significant digits, zeros at the end kept, so that the width is steady: `22.30`, `1.230e-6`. */
export function formatNumber(value: number, digits: number): string {
  if (!Number.isFinite(value)) return noNumber;
  if (value === 0) return '0';
  // 293.15 is not quite 293.15 in binary, and yet rounds up.
  const nudged = Math.abs(value) < 1e300 ? value * (1 + 2 ** -50) : value;
  const rounded = Number(nudged.toPrecision(digits));
  if (!(Math.abs(rounded) >= 1e-3 && Math.abs(rounded) < 1e5))
    return withShortExponent(nudged.toExponential(digits - 1));
  return fixed(rounded, digits - 1 - decade(rounded));
}

export function formatQuantity(
  si: number,
  unit: Unit,
  { digits = 4, reference = standardReference }: FormatOptions = {},
): string {
  const value = fromSI(si, unit, reference);
  return Number.isFinite(value) ? withUnit(formatNumber(value, digits), unit) : noNumber;
}

/**
 * `22.3 ± 2.3 mm`: the tolerance with two significant digits, the value to the same place. Small and large numbers
 * share their exponent: `(3.00 ± 0.30)e-3 mbar`. A tolerance far below the digits shown stands by itself.
 */
export function formatWithTolerance(si: number, tolerance: number, unit: Unit, options: FormatOptions = {}): string {
  const { digits = 4, reference = standardReference } = options;
  const value = fromSI(si, unit, reference);
  const width = Math.abs(fromSIDifference(tolerance, unit, reference));
  if (!(width > 0) || !Number.isFinite(value) || !Number.isFinite(width)) return formatQuantity(si, unit, options);

  const lead = decade(Math.max(Math.abs(Number(value.toPrecision(digits))), Number(width.toPrecision(2))));
  const last = decade(Number(width.toPrecision(2))) - 1;
  if (lead - last >= mostDigits) return withUnit(`${formatNumber(value, digits)} ± ${formatNumber(width, 2)}`, unit);
  if (lead >= -2 && lead < 5) return withUnit(`${fixed(value, -last)} ± ${fixed(width, -last)}`, unit);
  const shared = (n: number) => fixed(n / 10 ** lead, lead - last);
  return withUnit(`(${shared(value)} ± ${shared(width)})e${lead}`, unit);
}

/** Beyond this many digits a common last place helps nobody. */
const mostDigits = 9;

/** The exponent of the leading digit: 1 for 22.3, −3 for 0.001. */
function decade(value: number): number {
  return value === 0 ? -Infinity : Number(value.toExponential().split('e')[1]);
}

/** Plain notation; negative decimals round to tens, hundreds and so on. */
function fixed(value: number, decimals: number): string {
  const place = 10 ** Math.max(0, -decimals);
  const text = place === 1 ? value.toFixed(Math.max(0, decimals)) : String(Math.round(value / place) * place);
  return /^-[0.]*$/.test(text) ? text.slice(1) : text;
}

/** `1.230e-6`, not `1.230e+5`. */
function withShortExponent(text: string): string {
  return text.replace('e+', 'e');
}

/** The degree of angle stands tight (SI Brochure, 5.4.3), every other unit after a space. */
function withUnit(number: string, unit: Unit): string {
  if (unit.text === '1') return number;
  return unit.text === '°' ? `${number}°` : `${number} ${unit.text}`;
}
