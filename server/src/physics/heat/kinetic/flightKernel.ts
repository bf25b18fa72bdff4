/**
 * The kernel e^(−κ|t−t'|) between Legendre polynomials on −1 ≤ t ≤ 1, by which molecules that fly along a chord carry what
 * they took up on it: Eₘₙ = ∫∫ Pₘ(t) Pₙ(t') e^(−κ|t−t'|) dt dt', which is zero for m and n of different parity.
 *
 * Integration by parts turns the three-term recurrence of the polynomials into that of the modified spherical Bessel functions
 * i and k: for m > n of one parity Eₘₙ = −(8/π) iₘ(κ) kₙ(κ), and Eₙₙ = (8/π) κ (iₙ₊₁kₙ + iₙkₙ₋₁)/(2n+1). Only ratios and
 * products of them are formed, so that nothing overflows for any κ > 0.
 */
export interface FlightKernel {
  /** Eₘₙ by m·count + n. */
  readonly matrix: Float64Array;
  /** ∫ Pₙ(t) e^(−κ(1−t)) dt: what arrives at the end of the chord; at its beginning, times (−1)ⁿ. */
  readonly arriving: Float64Array;
}

export function flightKernel(kappa: number, count: number): FlightKernel {
  const falling = fallingRatios(kappa, count);
  const decay = -Math.expm1(-2 * kappa);
  const matrix = new Float64Array(count * count);
  const arriving = new Float64Array(count);

  /** (8/π) iₙ kₙ, e^(−κ) iₙ and kₙ₋₁/kₙ, carried along n. */
  let product = (2 * decay) / (kappa * kappa);
  let inner = decay / (2 * kappa);
  let rising = 1;
  for (let n = 0; n < count; n++) {
    const ratio = falling[n + 1] ?? 0;
    arriving[n] = 2 * inner;
    matrix[n * count + n] = (kappa * product * (ratio + rising)) / (2 * n + 1);
    let across = product * ratio;
    for (let m = n + 2; m < count; m += 2) {
      across *= falling[m] ?? 0;
      matrix[n * count + m] = -across;
      matrix[m * count + n] = -across;
      across *= falling[m + 1] ?? 0;
    }
    const next = kappa / (kappa * rising + 2 * n + 1);
    product *= ratio / next;
    inner *= ratio;
    rising = n === 0 ? kappa / (1 + kappa) : next;
  }
  return { matrix, arriving };
}

/** iₙ/iₙ₋₁ for n = 1 … top. Each way the recurrence forgets where it began in its own half of the numbers. */
function fallingRatios(kappa: number, top: number): Float64Array {
  const ratios = new Float64Array(top + 1);
  if (kappa > top * top) {
    ratios[1] = (1 + Math.exp(-2 * kappa)) / -Math.expm1(-2 * kappa) - 1 / kappa;
    for (let n = 1; n < top; n++) ratios[n + 1] = 1 / (ratios[n] ?? 1) - (2 * n + 1) / kappa;
    return ratios;
  }
  const start = Math.ceil(top + 20 + 6 * Math.sqrt(kappa));
  let ratio = kappa / (start + 1 + Math.hypot(start + 1, kappa));
  for (let n = start; n >= 1; n--) {
    ratio = kappa / (kappa * ratio + 2 * n + 1);
    if (n <= top) ratios[n] = ratio;
  }
  return ratios;
}
