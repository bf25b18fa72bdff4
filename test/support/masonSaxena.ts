/** What the rule needs of each species: mole fraction, molar mass, viscosity and conductivity, each in any one unit. */
export interface Conductor {
  readonly x: number;
  readonly molarMass: number;
  readonly viscosity: number;
  readonly conductivity: number;
}

/**
 * Thermal conductivity of a mixture by Wassiljewa's equation with the coefficients of Mason & Saxena 1958 (eqs. 1 and 21 with
 * ε = 1): λ = Σᵢ xᵢλᵢ / Σⱼ xⱼAᵢⱼ, Aᵢⱼ = [1 + √(λ′ᵢ/λ′ⱼ) (Mᵢ/Mⱼ)^¼]² / √(8(1 + Mᵢ/Mⱼ)), where the translational
 * conductivities λ′ stand as η/M. Known to be good to some 6 %, and independent of the engine.
 */
export function masonSaxena(parts: readonly Conductor[]): number {
  return parts.reduce((sum, one) => {
    const shared = parts.reduce((total, other) => total + other.x * coefficient(one, other), 0);
    return sum + (one.x * one.conductivity) / shared;
  }, 0);
}

function coefficient(one: Conductor, other: Conductor): number {
  const masses = one.molarMass / other.molarMass;
  const root = 1 + Math.sqrt(one.viscosity / other.viscosity / Math.sqrt(masses));
  return (root * root) / Math.sqrt(8 * (1 + masses));
}
