import type { ViscosityCorrelation } from '../transport/viscosityCorrelation';
import { chapmanEnskogPrefactor } from '../transport/viscosityCorrelation';

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
): ViscosityCorrelation {
  return {
    kind: 'collision-integral',
    prefactor: chapmanEnskogPrefactor(0.0266958, molarMass, diameter),
    theta,
    coefficients: [0.431, -0.4623, 0.08406, 0.005341, -0.00331],
    ...range,
  };
}
