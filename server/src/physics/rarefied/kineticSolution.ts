import { gaussLegendre, onPanels } from '../numerics/gaussLegendre';
import { exponentialKernel } from './exponentialKernel';
import { linearSolve } from '../numerics/linearSolve';
import type { Node } from './speeds';
import { speeds } from './speeds';

/** A round tube, or two infinite parallel plates. */
export type Section = 'tube' | 'plates';

/** The collision model: of Shakhov, with the Prandtl number 2/3, or of Bhatnagar, Gross and Krook, with 1. */
export type CollisionModel = 'shakhov' | 'bgk';

export interface KineticProblem {
  readonly section: Section;
  readonly model: CollisionModel;
  /** δ = a p/(η √(2kT/m)), with the radius of the tube or the gap of the plates as a. */
  readonly rarefaction: number;
  /** Which share of the molecules the walls reflect diffusely (Maxwell); the others are mirrored. */
  readonly accommodation: number;
  /** How many polynomials a profile consists of. */
  readonly order?: number;
}

/** Fully developed flow, linear in the gradients of pressure and temperature along the passage. */
export interface KineticSolution {
  /** G_P: the reduced flow by a pressure gradient. */
  readonly poiseuille: number;
  /** G_T: the reduced flow by a temperature gradient, towards the hot end. */
  readonly thermalCreep: number;
  /** The reduced heat flow by a pressure gradient, which Onsager's relation makes equal to G_T. */
  readonly mechanocaloric: number;
}

/**
 * Solves the linearised kinetic equation by Galerkin's method. The unknowns are the profiles of velocity u and of heat flow q,
 * series of orthogonal polynomials over the section. Between collisions molecules fly straight, so that along each chord the
 * equation is integrated exactly (exponentialKernel); what remains is to sum over chords and speeds. The flow is a quadratic
 * functional of the profiles, so its error is the square of theirs.
 *
 * With c in units of √(2kT/m) and lengths in units of a (F. Sharipov, V. Seleznev, J. Phys. Chem. Ref. Data 27, 657 (1998)):
 *   c·∇h = δ [2 c_z u + (4/15) c_z q (c² − 5/2) − h] − c_z            for the pressure gradient,
 *                                                  − c_z (c² − 5/2)   for the temperature gradient.
 */
export function solveKinetic({
  section,
  model,
  rarefaction: delta,
  accommodation,
  order = 16,
}: KineticProblem): KineticSolution {
  const [b0, b1, b2] = carriedMoments(section, delta, accommodation, order);
  const norm = norms(section, order);
  // Of the heat carried along the passage by the velocities across it and by the one along it: see the moments of c² − 5/2.
  const along = section === 'tube' ? 1.5 : 2;
  const across = section === 'tube' ? 1 : 0.5;
  const shakhov = model === 'shakhov' ? 4 / 15 : 0;
  const cross = (i: number, j: number) => at(b1, i, j) - across * at(b0, i, j);
  const heat = (i: number, j: number) =>
    at(b2, i, j) - 2 * across * at(b1, i, j) + (across * across + along) * at(b0, i, j);

  const size = 2 * order;
  const a = Array.from({ length: size }, () => new Float64Array(size));
  const right = Array.from({ length: size }, () => new Float64Array(2));
  for (let i = 0; i < order; i += 1) {
    const [upper, lower] = [a[i], a[order + i]];
    if (!upper || !lower) continue;
    for (let j = 0; j < order; j += 1) {
      const own = i === j ? (norm[i] ?? 0) : 0;
      upper[j] = own - delta * at(b0, i, j);
      upper[order + j] = -0.5 * delta * shakhov * cross(i, j);
      lower[j] = -delta * cross(i, j);
      lower[order + j] = own - 0.5 * delta * shakhov * heat(i, j);
    }
    right[i]?.set([0.5 * at(b0, i, 0), 0.5 * cross(i, 0)]);
    right[order + i]?.set([0.5 * cross(i, 0), 0.5 * heat(i, 0)]);
  }
  const solution = linearSolve(a, right);
  // The mean over the section is the first coefficient, as all other polynomials are orthogonal to one.
  return {
    poiseuille: 2 * (solution[0]?.[0] ?? NaN),
    thermalCreep: -2 * (solution[0]?.[1] ?? NaN),
    mechanocaloric: -2 * (solution[order]?.[0] ?? NaN),
  };
}

/** Between polynomials i and j: what molecules bring from where they collided, weighted by 1, c² and c⁴ across the passage. */
function carriedMoments(
  section: Section,
  delta: number,
  accommodation: number,
  order: number,
): readonly Float64Array[] {
  const moments = [0, 1, 2].map(() => new Float64Array(order * order));
  for (const { at: half, weight, basis } of chords(section, order)) {
    const sums = moments.map(() => new Float64Array(order * order));
    for (const speed of speedsFor(section, delta, half)) {
      const factor = section === 'tube' ? speed.weight : speed.weight / (Math.sqrt(Math.PI) * speed.at);
      addChord(sums, (delta * half) / speed.at, speed.at, factor, accommodation, order);
    }
    sums.forEach((sum, index) => addTransformed(moments[index], sum, basis, weight * half * half, order));
  }
  return moments;
}

function speedsFor(section: Section, delta: number, half: number): readonly Node[] {
  // Below this, what is left out is less than rounding: the integrand falls as c² (tube) or c (plates) where c < δ.
  return speeds(section === 'tube' ? 1e-8 * Math.min(1, Math.sqrt(delta * half)) : 1e-15 * Math.min(1, delta));
}

function addChord(
  sums: readonly Float64Array[],
  kappa: number,
  c: number,
  factor: number,
  accommodation: number,
  order: number,
): void {
  const { matrix, arriving } = exponentialKernel(kappa, order);
  const mirrored = 1 - accommodation;
  // The sum over all later chords of molecules that are mirrored again and again.
  const again = (2 * mirrored) / (accommodation - mirrored * Math.expm1(-2 * kappa));
  let power = factor;
  for (const sum of sums) {
    for (let i = 0; i < order; i += 1) {
      for (let j = 0; j < order; j += 1) {
        const index = i * order + j;
        const value = (matrix[index] ?? 0) + again * (arriving[i] ?? 0) * (arriving[j] ?? 0);
        sum[index] = (sum[index] ?? 0) + power * value;
      }
    }
    power *= c * c;
  }
}

interface Chord extends Node {
  /** The coefficients of the section's polynomials in even Legendre polynomials along the chord, by polynomial·order + k. */
  readonly basis: Float64Array;
}

const chordsOf = new Map<string, readonly Chord[]>();

/** The chords, by half their length. Between plates all are alike but for their slope, which the speed across accounts for. */
function chords(section: Section, order: number): readonly Chord[] {
  const key = `${section} ${order}`;
  const known = chordsOf.get(key);
  if (known) return known;
  const found = section === 'tube' ? tubeChords(order) : [{ at: 0.5, weight: 1, basis: identity(order) }];
  chordsOf.set(key, found);
  return found;
}

/** Chords at the distance cos φ from the axis have the half length sin φ; short ones matter where the path is short. */
function tubeChords(order: number): readonly Chord[] {
  const breaks = [0, 1e-4, 1e-3, 1e-2, 0.1, 0.4, 0.9, Math.PI / 2];
  return breaks.slice(1).flatMap((high, index) => {
    const low = breaks[index] ?? 0;
    // Enough for the polynomials, which swing up to 4·order times over the half circle.
    const angles = onPanels([low, high], Math.ceil(12 + 2 * order * (high - low)));
    return Array.from(angles.nodes, (angle, i) => tubeChord(angle, angles.weights[i] ?? 0, order));
  });
}

function tubeChord(angle: number, weight: number, order: number): Chord {
  const [half, distance] = [Math.sin(angle), Math.cos(angle)];
  const basis = new Float64Array(order * order);
  const { nodes, weights } = gaussLegendre(2 * order);
  for (const [point, s] of nodes.entries()) {
    const across = legendreValues(order, 2 * (distance * distance + half * half * s * s) - 1);
    const along = legendreValues(2 * order, s);
    for (let j = 0; j < order; j += 1) {
      for (let k = 0; k < order; k += 1) {
        const part = 0.5 * (4 * k + 1) * (weights[point] ?? 0) * (across[j] ?? 0) * (along[2 * k] ?? 0);
        basis[j * order + k] = (basis[j * order + k] ?? 0) + part;
      }
    }
  }
  return { at: half, weight: 2 * half * weight, basis };
}

/** The values P₀(x) … P(count−1)(x). */
function legendreValues(count: number, x: number): Float64Array {
  const values = new Float64Array(count);
  let [before, value] = [0, 1];
  for (let n = 0; n < count; n += 1) {
    values[n] = value;
    [before, value] = [value, ((2 * n + 1) * x * value - n * before) / (n + 1)];
  }
  return values;
}

function identity(order: number): Float64Array {
  return Float64Array.from({ length: order * order }, (_, index) => (index % (order + 1) === 0 ? 1 : 0));
}

/** into += factor · basis · sum · basisᵀ */
function addTransformed(
  into: Float64Array | undefined,
  sum: Float64Array,
  basis: Float64Array,
  factor: number,
  order: number,
): void {
  if (!into) return;
  const half = product(basis, sum, order);
  for (let i = 0; i < order; i += 1) {
    for (let j = 0; j < order; j += 1) {
      let total = 0;
      for (let k = 0; k < order; k += 1) total += (half[i * order + k] ?? 0) * (basis[j * order + k] ?? 0);
      into[i * order + j] = (into[i * order + j] ?? 0) + factor * total;
    }
  }
}

function product(a: Float64Array, b: Float64Array, order: number): Float64Array {
  const result = new Float64Array(order * order);
  for (let i = 0; i < order; i += 1) {
    for (let k = 0; k < order; k += 1) {
      const factor = a[i * order + k] ?? 0;
      for (let j = 0; j < order; j += 1) {
        result[i * order + j] = (result[i * order + j] ?? 0) + factor * (b[k * order + j] ?? 0);
      }
    }
  }
  return result;
}

/** The integrals of the squared polynomials over the section. */
function norms(section: Section, order: number): readonly number[] {
  return Array.from({ length: order }, (_, j) => (section === 'tube' ? Math.PI / (2 * j + 1) : 1 / (4 * j + 1)));
}

function at(matrix: Float64Array | undefined, i: number, j: number): number {
  return matrix?.[i * Math.round(Math.sqrt(matrix.length)) + j] ?? 0;
}
