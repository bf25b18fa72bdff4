const superscripts = '⁰¹²³⁴⁵⁶⁷⁸⁹';

/** An exponent as it stands behind a unit: nothing for 1, `²`, `⁻¹`, and `^(1/2)` for a fraction. */
export function superscript(exponent: number): string {
  if (exponent === 1) return '';
  if (!Number.isInteger(exponent)) return fractionText(exponent);
  const digits = Array.from(String(Math.abs(exponent)), (digit) => superscripts.charAt(Number(digit)));
  return (exponent < 0 ? '⁻' : '') + digits.join('');
}

/** The number that raised digits stand for. */
export function superscriptValue(text: string): number {
  const negative = text.startsWith('⁻');
  const digits = Array.from(text.slice(negative ? 1 : 0), (character) => superscripts.indexOf(character));
  return Number(digits.join('')) * (negative ? -1 : 1);
}

/** Exponents are sixths at the finest (see dimension.ts). */
function fractionText(exponent: number): string {
  const denominator = [2, 3, 6].find((n) => Math.abs(exponent * n - Math.round(exponent * n)) < 1e-9) ?? 6;
  return `^(${Math.round(exponent * denominator)}/${denominator})`;
}
