import type { Correlation } from '../transport/correlation';
import { chapmanEnskogPrefactor } from '../transport/correlation';

/**
 * The dilute-gas term of Lemmon & Jacobsen 2004 (eqs. 2 and 3), which nitrogen, oxygen, argon and air share:
 * η⁰ = 0.0266958 √(M T) / (σ² Ω), ln Ω = Σ bᵢ (ln T/θ)ⁱ, with the coefficients of its table II.
 * `molarMass` in g/mol, `diameter` σ in nm, `theta` = ε/k in K, all as printed in its table I.
 */
export function lemmonJacobsen(
  molarMass: number,
  diameter: number,
  theta: number,
  range: { readonly low: number; readonly high: number },
): Correlation {
  return {
    kind: 'collision-integral',
    prefactor: chapmanEnskogPrefactor(0.0266958, molarMass, diameter),
    theta,
    coefficients: [0.431, -0.4623, 0.08406, 0.005341, -0.00331],
    ...range,
  };
}

/**
 * Its dilute-gas conductivity (eq. 5, table III): λ⁰ = N₁ η⁰/(1 µPa s) + N₂ τ^t₂ + N₃ τ^t₃ in mW/(m K), with τ = Tc/T.
 * `terms` holds N and t as printed; the first term's exponent is not used.
 */
export function lemmonJacobsenConductivity(
  viscosity: Correlation,
  criticalTemperature: number,
  perViscosity: number,
  terms: readonly { readonly n: number; readonly t: number }[],
): Correlation {
  return {
    kind: 'with-viscosity',
    viscosity,
    perViscosity: perViscosity * 1e3,
    theta: criticalTemperature,
    terms: terms.map(({ n, t }) => ({ n: 1e-3 * n, t: -t })),
    low: viscosity.low,
    high: viscosity.high,
  };
}
