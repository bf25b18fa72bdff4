import type { Sourced } from '../sources';
import type { SaturationCurve } from '../thermo/saturationCurve';

/** What is printed of a vapour: T_c, K, p_c, bar, the four coefficients, and the temperature, K, from which they hold. */
interface Printed {
  readonly temperature: number;
  readonly bar: number;
  readonly coefficients: readonly [number, number, number, number];
  readonly low: number;
}

/** Vapour pressures by Wagner's equation in its form of the powers 1, 1.5, 3 and 6, as the book tabulates them. */
export function wagnerVapour(
  { temperature, bar, coefficients, low }: Printed,
  uncertainty = 0.02,
): Sourced<SaturationCurve> {
  const [a, b, c, d] = coefficients;
  const terms = [
    { n: a, t: 1 },
    { n: b, t: 1.5 },
    { n: c, t: 3 },
    { n: d, t: 6 },
  ];
  return {
    value: { kind: 'wagner', phase: 'liquid', low, high: temperature, temperature, pressure: 1e5 * bar, terms },
    source: 'Reid 1987',
    where: 'appendix A, equation 1; from memory, checked against boiling points; the error is our judgement',
    uncertainty,
  };
}
