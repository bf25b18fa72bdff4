import type { Point } from '../interpolated';
import { between } from '../interpolated';
import { bracketedRoot } from './bracketedRoot';

/** How the pressure of a vapour in equilibrium with its solid or liquid was correlated, between `low` and `high`, K. */
export type SaturationCurve = {
  readonly phase: 'solid' | 'liquid';
  readonly low: number;
  readonly high: number;
} & Form;

type Form =
  /** ln(p/p₀) = (T₀/T) Σ nᵢ (1 − T/T₀)^tᵢ: Wagner's equation from the critical point, or for a solid from its triple point. */
  | {
      readonly kind: 'wagner';
      readonly temperature: number;
      readonly pressure: number;
      readonly terms: readonly { readonly n: number; readonly t: number }[];
    }
  /** ln(p/p₀) = Σ aᵢ/Tⁱ + b ln T + Σ cᵢ Tⁱ, i from nought in the first sum and from one in the last. */
  | {
      readonly kind: 'powers';
      readonly pressure: number;
      readonly inverse: readonly number[];
      readonly logarithm?: number;
      readonly direct?: readonly number[];
    }
  /** log₁₀(p/p₀) = A − B/(T + C). */
  | { readonly kind: 'antoine'; readonly pressure: number; readonly a: number; readonly b: number; readonly c: number }
  /** A table, as a file states it: between its points ln p is straight over 1/T, as Clausius and Clapeyron have it. */
  | { readonly kind: 'points'; readonly points: readonly Point[] }
  /** One pressure, as a file states it for the temperatures that it is about. */
  | { readonly kind: 'constant'; readonly pressure: number }
  /** T = Σ Aᵢ ((ln p − B)/C)ⁱ, as the temperature scale defines itself by helium. */
  | {
      readonly kind: 'scale';
      readonly coefficients: readonly number[];
      readonly centre: number;
      readonly width: number;
    };

/** The natural logarithm of the saturation pressure in Pa, at a temperature in K within the range. */
export function logSaturation(curve: SaturationCurve, T: number): number {
  switch (curve.kind) {
    case 'wagner': {
      const tau = Math.max(0, 1 - T / curve.temperature);
      const sum = curve.terms.reduce((total, { n, t }) => total + n * Math.pow(tau, t), 0);
      return Math.log(curve.pressure) + (curve.temperature / T) * sum;
    }
    case 'powers': {
      const { inverse, logarithm = 0, direct = [] } = curve;
      return (
        Math.log(curve.pressure) + polynomial(inverse, 1 / T) + logarithm * Math.log(T) + T * polynomial(direct, T)
      );
    }
    case 'antoine':
      return Math.log(curve.pressure) + Math.LN10 * (curve.a - curve.b / (T + curve.c));
    case 'scale': {
      const x = bracketedRoot((u) => polynomial(curve.coefficients, u) - T, -scaleReach, scaleReach);
      return curve.centre + curve.width * x;
    }
    case 'points':
      return logOfPoints(curve.points, T);
    case 'constant':
      return Math.log(curve.pressure);
    default:
      return curve satisfies never;
  }
}

/** The inverse: the temperature, K, at which the curve has this logarithm of a pressure, which must be one that it reaches. */
export function saturationTemperature(curve: SaturationCurve, logPressure: number): number {
  const { low, high } = curve;
  if (curve.kind === 'scale') return polynomial(curve.coefficients, (logPressure - curve.centre) / curve.width);
  // In reciprocal temperature the curve is nearly straight, so that a few steps suffice.
  return 1 / bracketedRoot((reciprocal) => logSaturation(curve, 1 / reciprocal) - logPressure, 1 / high, 1 / low);
}

/** Both pieces of the helium scale stay within this many widths of their centres. */
const scaleReach = 1.6;

function polynomial(coefficients: readonly number[], x: number): number {
  return coefficients.reduceRight((sum, coefficient) => sum * x + coefficient, 0);
}

function logOfPoints(points: readonly Point[], T: number): number {
  const upper = Math.max(
    1,
    points.findIndex(({ at }) => T <= at),
  );
  const [a, b = a] = points
    .slice(upper - 1, upper + 1)
    .map(({ at, value }) => ({ at: 1 / at, value: Math.log(value) }));
  if (a === undefined || b === undefined) return NaN;
  return a === b ? a.value : between(a, b, 1 / T);
}
