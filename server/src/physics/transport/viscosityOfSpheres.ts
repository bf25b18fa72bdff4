import type { Correlation } from './correlation';
import { hardSphereViscosity } from './viscosity';

/** The viscosity of hard spheres, in proportion to √T, to stand where only a diameter is known. Metres and kg/mol. */
export function viscosityOfSpheres(diameter: number, molarMass: number): Correlation {
  const prefactor = hardSphereViscosity(diameter, molarMass, 1);
  return { kind: 'root-ratio', prefactor, theta: 1, numerator: [1], denominator: [1], low: 0, high: Infinity };
}
