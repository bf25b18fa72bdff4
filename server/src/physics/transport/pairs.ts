import type { Species } from '../species/species';
import { aStar, bStar, combined } from './collisionIntegrals';
import { diameterOfViscosity, hardSphereViscosity, potentialViscosity } from './viscosity';

/** What unlike molecules do to each other, row by row for every pair of species. Not a number where it is not known. */
export interface Pairs {
  /** Pair viscosities ηᵢⱼ, Pa s; on the diagonal the species' own. */
  readonly viscosity: ArrayLike<number>;
  /** The ratios Aᵢⱼ* of Ω(2,2)* to Ω(1,1)*. */
  readonly aStar: ArrayLike<number>;
  /** The ratios Bᵢⱼ* = (5 Ω(1,2)* − 4 Ω(1,3)*)/Ω(1,1)*. */
  readonly bStar: ArrayLike<number>;
}

/**
 * Pair viscosities by first-order Chapman–Enskog (Hirschfelder, Curtiss & Bird 1954, eq. 8.2-12) with the potential of
 * Lorentz and Berthelot. Each pair is scaled by the geometric mean of the two factors by which the species' own viscosities
 * differ from their potentials'. So two gases that are alike make a pair like either, and a gas mixed with itself stays as it is.
 * Where a potential of a pair is missing, both are taken as hard spheres with the diameters that give their viscosities.
 * A pair is not known where a viscosity of it is missing.
 */
export function pairsOf(species: readonly Species[], own: readonly (number | undefined)[], temperature: number): Pairs {
  const n = species.length;
  const pairs = { viscosity: unknown(n), aStar: unknown(n), bStar: unknown(n) };
  species.forEach((one, i) => {
    for (let j = 0; j <= i; j++) {
      const other = species[j];
      const pair = other && pairOf(one, own[i], other, own[j], temperature);
      if (pair === undefined) continue;
      for (const cell of [i * n + j, j * n + i]) {
        pairs.viscosity[cell] = pair.viscosity;
        pairs.aStar[cell] = pair.aStar;
        pairs.bStar[cell] = pair.bStar;
      }
    }
  });
  return pairs;
}

/** M₁M₂/(M₁ + M₂), kg/mol. */
export function reducedMass(a: Species, b: Species): number {
  return (a.molarMass.value * b.molarMass.value) / (a.molarMass.value + b.molarMass.value);
}

/** A* of a species with itself, at a temperature in K. */
export function ownAStar({ lennardJones, hardSphere }: Species, temperature: number): number {
  if (lennardJones !== undefined) return aStar(temperature / lennardJones.value.wellDepth);
  return hardSphere === undefined ? usualAStar : 1;
}

interface Pair {
  readonly viscosity: number;
  readonly aStar: number;
  readonly bStar: number;
}

function pairOf(
  one: Species,
  ownOfOne: number | undefined,
  other: Species,
  ownOfOther: number | undefined,
  T: number,
): Pair | undefined {
  if (ownOfOne === undefined || ownOfOther === undefined) return undefined;
  const a = one.lennardJones?.value;
  const b = other.lennardJones?.value;
  if (a === undefined || b === undefined) return pairOfSpheres(one, ownOfOne, other, ownOfOther, T);
  const potential = one === other ? a : combined(a, b);
  const reduced = T / potential.wellDepth;
  const ratios = { aStar: aStar(reduced), bStar: bStar(reduced) };
  if (one === other) return { viscosity: ownOfOne, ...ratios };
  const scale = Math.sqrt(
    (ownOfOne / potentialViscosity(a, one.molarMass.value, T)) *
      (ownOfOther / potentialViscosity(b, other.molarMass.value, T)),
  );
  return { viscosity: scale * potentialViscosity(potential, 2 * reducedMass(one, other), T), ...ratios };
}

/** First-order Chapman–Enskog of hard spheres whose diameters have the arithmetic mean between them. */
function pairOfSpheres(one: Species, ownOfOne: number, other: Species, ownOfOther: number, T: number): Pair {
  const rigid = one.hardSphere !== undefined && other.hardSphere !== undefined;
  const ratios = rigid ? { aStar: 1, bStar: 1 } : { aStar: usualAStar, bStar: usualBStar };
  if (one === other) return { viscosity: ownOfOne, ...ratios };
  const diameters = [
    diameterOfViscosity(ownOfOne, one.molarMass.value, T),
    diameterOfViscosity(ownOfOther, other.molarMass.value, T),
  ] as const;
  const mean = (diameters[0] + diameters[1]) / 2;
  return { viscosity: hardSphereViscosity(mean, 2 * reducedMass(one, other), T), ...ratios };
}

/** Where no potential is known: the values of most gases near room temperature, within 3 %. */
const usualAStar = 1.1;
const usualBStar = 1.1;

function unknown(n: number): number[] {
  return new Array<number>(n * n).fill(NaN);
}
