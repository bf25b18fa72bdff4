import type { Correlation } from '../transport/correlation';
import { viscosityOfPotential } from '../transport/stockmayer';
import type { LennardJones } from './species';

/** What the estimate of Chung, Ajlan, Lee & Starling 1988 needs of a molecule without polarity. */
interface Critical {
  /** K. */
  readonly temperature: number;
  /** m³/mol. */
  readonly volume: number;
  readonly acentric: number;
}

/** The potential by the critical point: σ/Å = 0.809 (V_c/(cm³/mol))^⅓, ε/k = T_c/1.2593. */
export function chungPotential({ temperature, volume }: Critical): LennardJones {
  return { diameter: 0.809e-10 * Math.cbrt(1e6 * volume), wellDepth: temperature / 1.2593 };
}

/** Its viscosity: that of the potential times F_c = 1 − 0.2756 ω, for a shape that is not a ball. `molarMass` in kg/mol. */
export function chungViscosity(
  critical: Critical,
  molarMass: number,
  range: { readonly low: number; readonly high: number },
): Correlation {
  const { diameter, wellDepth } = chungPotential(critical);
  const shape = 1 - 0.2756 * critical.acentric;
  return viscosityOfPotential({ diameter: diameter / Math.sqrt(shape), wellDepth }, molarMass, range);
}
