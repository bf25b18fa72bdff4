import { R } from '../constants';
import type { Species } from '../species/species';

/**
 * Thermal conductivity of one gas, W/(m K), from its viscosity (Pa s) and molar heat capacity cv (J/(mol K)).
 * One atom: λ = 15/4 R/M η, first-order Chapman–Enskog; the higher orders, below 0.5 %, are left out.
 * More atoms: modified Eucken, λ M/(η cv) = 1.32 + 1.77 R/cv (Poling, Prausnitz & O'Connell 2001, eq. 10-3.3), about 10 %.
 */
export function conductivity(species: Species, viscosity: number, cv: number): number {
  const perMole = viscosity / species.molarMass.value;
  return isMonatomic(species) ? 3.75 * R * perMole : perMole * (1.32 * cv + 1.77 * R);
}

export function isMonatomic(species: Species): boolean {
  return species.heatCapacity?.value.kind === 'monatomic';
}

/**
 * Thermal conductivity of a mixture, W/(m K), by Wassiljewa's equation with the coefficients of Mason & Saxena 1958
 * (eqs. 1 and 21 with ε = 1): λ = Σᵢ xᵢλᵢ / Σⱼ xⱼAᵢⱼ, Aᵢⱼ = [1 + √(λ′ᵢ/λ′ⱼ) (Mᵢ/Mⱼ)^¼]² / √(8(1 + Mᵢ/Mⱼ)),
 * where the translational conductivities λ′ stand as η/M. About 6 %.
 */
export function mixtureConductivity(
  x: readonly number[],
  molarMass: readonly number[],
  viscosity: readonly number[],
  own: readonly number[],
): number {
  let sum = 0;
  for (let i = 0; i < x.length; i++) {
    let shared = 0;
    for (let j = 0; j < x.length; j++) {
      shared += at(x, j) * weight(at(molarMass, i) / at(molarMass, j), at(viscosity, i) / at(viscosity, j));
    }
    sum += (at(x, i) * at(own, i)) / shared;
  }
  return sum;
}

function weight(massRatio: number, viscosityRatio: number): number {
  const root = 1 + Math.sqrt(viscosityRatio / Math.sqrt(massRatio));
  return (root * root) / Math.sqrt(8 * (1 + massRatio));
}

function at(values: readonly number[], index: number): number {
  return values[index] ?? 0;
}
