/** An exact fraction in lowest terms, the denominator positive. Conversion factors stay exact until the very end. */
export interface Ratio {
  readonly num: bigint;
  readonly den: bigint;
}

export const one: Ratio = { num: 1n, den: 1n };

/** Reads decimals joined by `*` and `/`, left to right: `101325 / 760`, `1.602176634e-19`. */
export function ratio(text: string): Ratio {
  let result = one;
  for (const [, operator, decimal] of text.matchAll(/([*/]?)\s*([\d.]+(?:e[+-]?\d+)?)/g)) {
    const factor = decimalRatio(decimal ?? '1');
    result = multiplyRatios(result, operator === '/' ? powerRatio(factor, -1) : factor);
  }
  return result;
}

export function multiplyRatios(a: Ratio, b: Ratio): Ratio {
  return reduced(a.num * b.num, a.den * b.den);
}

/** The exponent is a whole number. */
export function powerRatio(base: Ratio, exponent: number): Ratio {
  const n = BigInt(Math.abs(exponent));
  return exponent < 0 ? reduced(base.den ** n, base.num ** n) : { num: base.num ** n, den: base.den ** n };
}

/** The double nearest to the fraction. */
export function ratioToNumber({ num, den }: Ratio): number {
  if (num === 0n) return 0;
  // Sixty-six or more bits of quotient, with a sticky last bit, so that the one rounding happens in Number().
  const shift = Math.max(0, 66 + bits(den) - bits(num));
  const scaled = abs(num) << BigInt(shift);
  const quotient = scaled / den;
  const sticky = quotient * den === scaled ? quotient : quotient | 1n;
  const half = Math.floor(shift / 2);
  const size = Number(sticky) * 2 ** -half * 2 ** (half - shift);
  return num < 0n ? -size : size;
}

function decimalRatio(text: string): Ratio {
  const [mantissa = '0', exponent = '0'] = text.split('e');
  const [whole = '0', fraction = ''] = mantissa.split('.');
  const power = Number(exponent) - fraction.length;
  const digits = BigInt(whole + fraction);
  return power < 0 ? reduced(digits, 10n ** BigInt(-power)) : { num: digits * 10n ** BigInt(power), den: 1n };
}

function reduced(num: bigint, den: bigint): Ratio {
  const divisor = greatestCommonDivisor(abs(num), abs(den));
  const sign = den < 0n ? -1n : 1n;
  return { num: (sign * num) / divisor, den: (sign * den) / divisor };
}

function greatestCommonDivisor(a: bigint, b: bigint): bigint {
  while (b !== 0n) [a, b] = [b, a % b];
  return a;
}

function abs(n: bigint): bigint {
  return n < 0n ? -n : n;
}

function bits(n: bigint): number {
  return abs(n).toString(16).length * 4;
}
