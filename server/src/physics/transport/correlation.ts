import type { Point } from '../interpolated';
import { interpolated } from '../interpolated';
import { fluidity } from './stockmayer';

/** How a property of the dilute gas was correlated with temperature. Every form gives SI from K between `low` and `high`. */
export type Correlation = { readonly low: number; readonly high: number } & Form;

type Form =
  /** y = C √T / exp Σ aᵢ (ln T/θ)ⁱ: a collision integral by a logarithmic series. */
  | {
      readonly kind: 'collision-integral';
      readonly prefactor: number;
      readonly theta: number;
      readonly coefficients: readonly number[];
    }
  /** y = C √(T/θ) Σ cᵢ (T/θ)^((i−1)/3 − 1), i from 1: the reciprocal collision integral in cube roots. */
  | {
      readonly kind: 'cube-roots';
      readonly prefactor: number;
      readonly theta: number;
      readonly coefficients: readonly number[];
    }
  /** y = C √(T/θ) / Σ Hᵢ (θ/T)ⁱ. */
  | {
      readonly kind: 'inverse-powers';
      readonly prefactor: number;
      readonly theta: number;
      readonly coefficients: readonly number[];
    }
  /** y = Σ dᵢ (T/θ)^(i/4). */
  | { readonly kind: 'fourth-roots'; readonly theta: number; readonly coefficients: readonly number[] }
  /** y = C exp(A ln T + B/T + D/T² + E), piece by piece up to `high`. */
  | { readonly kind: 'exponential'; readonly prefactor: number; readonly pieces: readonly ExponentialPiece[] }
  /** y = C exp(c₀/x + c₁ + c₂x + c₃x² + …) with x = ln T. */
  | { readonly kind: 'logarithmic'; readonly prefactor: number; readonly coefficients: readonly number[] }
  /** y = C Σ aᵢ (T/θ)ⁱ / Σ bᵢ (T/θ)ⁱ. */
  | {
      readonly kind: 'ratio';
      readonly prefactor: number;
      readonly theta: number;
      readonly numerator: readonly number[];
      readonly denominator: readonly number[];
    }
  /** y = C √(T/θ) Σ aᵢ (T/θ)ⁱ / Σ bᵢ (T/θ)ⁱ. */
  | {
      readonly kind: 'root-ratio';
      readonly prefactor: number;
      readonly theta: number;
      readonly numerator: readonly number[];
      readonly denominator: readonly number[];
    }
  /** y = C √T f/Ω(2,2)*(T/θ, δ): the 12-6 potential, or Stockmayer's for a polarity δ above nought (see `stockmayer`). */
  | {
      readonly kind: 'potential';
      readonly prefactor: number;
      readonly theta: number;
      readonly polarity: number;
    }
  /** y = N₁ η + Σ nᵢ (T/θ)^tᵢ: a conductivity that leans on the viscosity, itself correlated. */
  | {
      readonly kind: 'with-viscosity';
      readonly viscosity: Correlation;
      readonly perViscosity: number;
      readonly theta: number;
      readonly terms: readonly { readonly n: number; readonly t: number }[];
    }
  /** A table, as a file states it. */
  | { readonly kind: 'points'; readonly points: readonly Point[] }
  /** One correlation below `from`, another above `to`, and between them the mean weighted evenly in ln T. */
  | {
      readonly kind: 'joined';
      readonly cold: Correlation;
      readonly warm: Correlation;
      readonly from: number;
      readonly to: number;
    };

export interface ExponentialPiece {
  readonly high: number;
  readonly a: readonly [number, number, number, number];
}

/**
 * The prefactor C in η = C √T / Ω of a Chapman–Enskog form, Pa s K^(−1/2).
 * `constant` as printed, for η in µPa s with M in g/mol and σ in nm.
 */
export function chapmanEnskogPrefactor(constant: number, molarMass: number, diameter: number): number {
  return (1e-6 * constant * Math.sqrt(molarMass)) / (diameter * diameter);
}

/** The correlation as published, in SI, for a temperature in K within its range. */
export function correlated(data: Correlation, T: number): number {
  switch (data.kind) {
    case 'collision-integral':
      return (data.prefactor * Math.sqrt(T)) / Math.exp(polynomial(data.coefficients, Math.log(T / data.theta)));
    case 'cube-roots': {
      const root = Math.cbrt(T / data.theta);
      return (data.prefactor * polynomial(data.coefficients, root)) / Math.sqrt(T / data.theta);
    }
    case 'inverse-powers':
      return (data.prefactor * Math.sqrt(T / data.theta)) / polynomial(data.coefficients, data.theta / T);
    case 'fourth-roots':
      return polynomial(data.coefficients, Math.sqrt(Math.sqrt(T / data.theta)));
    case 'exponential':
      return data.prefactor * Math.exp(exponent(data.pieces, T));
    case 'logarithmic': {
      const x = Math.log(T);
      return data.prefactor * Math.exp(polynomial(data.coefficients, x) / x);
    }
    case 'ratio': {
      const x = T / data.theta;
      return (data.prefactor * polynomial(data.numerator, x)) / polynomial(data.denominator, x);
    }
    case 'root-ratio': {
      const x = T / data.theta;
      return (data.prefactor * Math.sqrt(x) * polynomial(data.numerator, x)) / polynomial(data.denominator, x);
    }
    case 'potential':
      return data.prefactor * Math.sqrt(T) * fluidity(T / data.theta, data.polarity);
    case 'with-viscosity': {
      const powers = data.terms.reduce((sum, { n, t }) => sum + n * Math.pow(T / data.theta, t), 0);
      return data.perViscosity * correlated(data.viscosity, T) + powers;
    }
    case 'points':
      return interpolated(data.points, T);
    case 'joined':
      return joined(data.cold, data.warm, data.from, data.to, T);
    default:
      return data satisfies never;
  }
}

function joined(cold: Correlation, warm: Correlation, from: number, to: number, T: number): number {
  if (T <= from) return correlated(cold, T);
  if (to <= T) return correlated(warm, T);
  const weight = Math.log(T / from) / Math.log(to / from);
  return (1 - weight) * correlated(cold, T) + weight * correlated(warm, T);
}

function exponent(pieces: readonly ExponentialPiece[], T: number): number {
  const piece = pieces.find(({ high }) => T <= high) ?? pieces[pieces.length - 1];
  if (piece === undefined) return 0;
  const [a, b, c, d] = piece.a;
  return a * Math.log(T) + (b + c / T) / T + d;
}

/** Σ cᵢ xⁱ. */
function polynomial(coefficients: readonly number[], x: number): number {
  let sum = 0;
  for (let i = coefficients.length - 1; 0 <= i; i--) sum = sum * x + (coefficients[i] ?? 0);
  return sum;
}
