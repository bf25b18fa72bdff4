/**
 * The kernel e^(−κ|s−s'|) between even Legendre polynomials on −1 ≤ s ≤ 1, by which molecules that fly along a chord carry
 * what they took up on it: Eₘₙ = ∫∫ Pₘ(s) Pₙ(s') e^(−κ|s−s'|) ds ds'.
 *
 * Integration by parts turns the three-term recurrence of Legendre polynomials into that of the modified spherical Bessel
 * functions i and k, so that for m > n of one parity Eₘₙ = −(8/π) iₘ(κ) kₙ(κ), and Eₙₙ = (8/π) κ (iₙ₊₁kₙ + iₙkₙ₋₁)/(2n+1).
 * Only ratios and products of them are formed, so that nothing overflows for any κ > 0.
 */
export interface ExponentialKernel {
  /** Eₘₙ by m·count + n, of P₀, P₂, P₄, … */
  readonly matrix: Float64Array;
  /** ∫ Pₘ(s) e^(−κ(1−s)) ds: what arrives at the end of the chord. */
  readonly arriving: Float64Array;
}

export function exponentialKernel(kappa: number, count: number): ExponentialKernel {
  const top = 2 * count - 1;
  const falling = fallingRatios(kappa, top + 1);
  const decay = -Math.expm1(-2 * kappa);
  const matrix = new Float64Array(count * count);
  const arriving = new Float64Array(count);

  /** (8/π) iₙ kₙ, e^(−κ) iₙ and kₙ₋₁/kₙ, carried along n. */
  let product = (2 * decay) / (kappa * kappa);
  let inner = decay / (2 * kappa);
  let rising = 1;
  for (let n = 0; n <= top; n += 1) {
    const ratio = falling[n + 1] ?? 0;
    if (n % 2 === 0) {
      const row = n / 2;
      arriving[row] = 2 * inner;
      matrix[row * count + row] = (kappa * product * (ratio + rising)) / (2 * n + 1);
      let across = product * ratio;
      for (let m = n + 2; m <= top; m += 2) {
        across *= falling[m] ?? 0;
        matrix[row * count + m / 2] = -across;
        matrix[(m / 2) * count + row] = -across;
        across *= falling[m + 1] ?? 0;
      }
    }
    const next = kappa / (kappa * rising + 2 * n + 1);
    product *= ratio / next;
    inner *= ratio;
    rising = n === 0 ? kappa / (1 + kappa) : next;
  }
  return { matrix, arriving };
}

/** iₙ/iₙ₋₁ for n = 1 … top, by the downward recurrence, which forgets where it began. */
function fallingRatios(kappa: number, top: number): Float64Array {
  const start = top + 20;
  const ratios = new Float64Array(top + 1);
  let ratio = kappa / (start + 1 + Math.hypot(start + 1, kappa));
  for (let n = start; n >= 1; n -= 1) {
    ratio = kappa / (kappa * ratio + 2 * n + 1);
    if (n <= top) ratios[n] = ratio;
  }
  return ratios;
}
