import { gaussLegendre, gradedBreaks, integrate, legendre, onPanels } from '../numerics/gaussLegendre';
import type { Rule } from '../numerics/gaussLegendre';
import { solvePositive } from '../numerics/solvePositive';

/**
 * The walls of a straight passage of any section, parted lengthwise into strips. All lengths count in one size of the section.
 *
 * `exchange(z)` holds for every pair of strips, row by row, the share of molecules that fly from a unit length of the one
 * straight to a unit length of the other, z further along, times the area of that unit length over the area of the section.
 * It is symmetric, and Σ∫z·exchange dz from 0 to ∞ is 1: what enters through a section meets a wall somewhere.
 */
export interface StraightWalls {
  readonly strips: number;
  exchange(z: number): ArrayLike<number>;
}

/** The number of functions that the wall density is sought in, and of points in each panel. */
export interface Fineness {
  readonly functions: number;
  readonly points: number;
}

const usual: Fineness = { functions: 8, points: 10 };

/**
 * The free-molecular transmission probability of a straight passage of length l with diffuse walls.
 *
 * Let u(x) be the chance that a molecule leaving the wall at x gets out through the far end (Clausing's integral equation).
 * With u = 0 before the inlet and u = 1 behind the outlet, the transmission probability is the least value of
 *
 *   E(u) = ½ ΣΣ ∬ exchange(|x − x′|) (u_a(x) − u_b(x′))² dx dx′ ,
 *
 * which is the variational principle of DeMarcus and Cole for this equation. It is minimised over functions that are odd about
 * the middle: the straight line, exact far from the ends, and Legendre polynomials of η = ln((x + 1)/(l − x + 1)), which
 * resolves what happens near the ends on whatever scale. The error is of second order in that of u, and always positive.
 */
export function straightTransmission(walls: StraightWalls, l: number, fineness: Fineness = usual): number {
  if (l <= 0) return 1;
  const basis = basisOf(l, fineness.functions);
  const n = basis.size * walls.strips;
  const matrix = new Float64Array(n * n);
  const right = new Float64Array(n);
  const constant = addEnds(walls, l, basis, fineness, matrix, right);
  addWalls(walls, l, basis, fineness, matrix);
  const coefficients = solvePositive(matrix, right, n);
  return constant - coefficients.reduce((sum, c, i) => sum + c * (right[i] ?? 0), 0);
}

interface Basis {
  readonly size: number;
  /** The values of all functions at x, into `out`. */
  fill(x: number, out: Float64Array): void;
}

function basisOf(l: number, functions: number): Basis {
  const scale = 1 / Math.log1p(l);
  // In a short passage η is itself a straight line, which must not come twice.
  const withLine = l > 4;
  const first = withLine ? 1 : 0;
  return {
    size: functions,
    fill: (x, out) => {
      if (withLine) out[0] = (2 * x - l) / l;
      const eta = scale * Math.log((x + 1) / (l - x + 1));
      for (let j = first; j < functions; j++) out[j] = legendre(2 * (j - first) + 1, eta).value;
    },
  };
}

/** What passes from the ends to the walls and straight through; returns the part that no coefficient changes. */
function addEnds(
  walls: StraightWalls,
  l: number,
  basis: Basis,
  { points }: Fineness,
  matrix: Float64Array,
  right: Float64Array,
): number {
  const { strips } = walls;
  const { size } = basis;
  const n = size * strips;
  const values = new Float64Array(size);
  let constant = integrate(beyond(l, points), (z) => (z - l) * total(walls.exchange(z)));
  const rule = onPanels(gradedBreaks(0, l, Math.min(l, FIRST), GROWTH), points);
  rule.nodes.forEach((x, i) => {
    const seen = fromInlet(walls, x, points);
    basis.fill(x, values);
    for (let strip = 0; strip < strips; strip++) {
      const weight = 2 * (rule.weights[i] ?? 0) * (seen[strip] ?? 0);
      constant += weight / 4;
      for (let j = 0; j < size; j++) {
        const own = strip * size + j;
        right[own] = (right[own] ?? 0) - (weight / 2) * (values[j] ?? 0);
        for (let k = 0; k < size; k++) add(matrix, own * n + strip * size + k, weight * product(values, j, values, k));
      }
    }
  });
  return constant;
}

/** What passes from wall to wall: for every distance z, over all places x, the square of u_a(x) − u_b(x + z). */
function addWalls(walls: StraightWalls, l: number, basis: Basis, { points }: Fineness, matrix: Float64Array): void {
  const { strips } = walls;
  const { size } = basis;
  const n = size * strips;
  const here = new Float64Array(size);
  const there = new Float64Array(size);
  const distances = onPanels(gradedBreaks(0, l, Math.min(l / 2, FIRST), GROWTH), points);
  distances.nodes.forEach((z, i) => {
    const exchange = walls.exchange(z);
    const near = new Float64Array(size * size);
    const far = new Float64Array(size * size);
    const mixed = new Float64Array(size * size);
    const half = (l - z) / 2;
    // The other half mirrors this one.
    const places = onPanels(gradedBreaks(0, half, Math.min(half, FIRST), GROWTH), points);
    places.nodes.forEach((x, p) => {
      const weight = 2 * (places.weights[p] ?? 0) * (distances.weights[i] ?? 0);
      basis.fill(x, here);
      basis.fill(x + z, there);
      for (let j = 0; j < size; j++) {
        for (let k = 0; k < size; k++) {
          const entry = j * size + k;
          add(near, entry, weight * product(here, j, here, k));
          add(far, entry, weight * product(there, j, there, k));
          add(mixed, entry, weight * product(here, j, there, k));
        }
      }
    });
    for (let a = 0; a < strips; a++) {
      for (let b = 0; b < strips; b++) {
        const strength = exchange[a * strips + b] ?? 0;
        for (let j = 0; j < size; j++) {
          for (let k = 0; k < size; k++) {
            const entry = j * size + k;
            const [aj, ak, bj, bk] = [a * size + j, a * size + k, b * size + j, b * size + k];
            add(matrix, aj * n + ak, strength * (near[entry] ?? 0));
            add(matrix, bj * n + bk, strength * (far[entry] ?? 0));
            add(matrix, aj * n + bk, -strength * (mixed[entry] ?? 0));
            add(matrix, bk * n + aj, -strength * (mixed[entry] ?? 0));
          }
        }
      }
    }
  });
}

/** The width of the first panel at an end, in sizes of the section, and how the next ones grow. */
const FIRST = 0.25;
const GROWTH = 2;

/** What each strip at x exchanges with the inlet: with all the walls that would be there if the passage went on before it. */
function fromInlet(walls: StraightWalls, x: number, points: number): Float64Array {
  const sums = new Float64Array(walls.strips);
  const rule = beyond(x, points);
  rule.nodes.forEach((z, i) => {
    const exchange = walls.exchange(z);
    for (let a = 0; a < walls.strips; a++) {
      for (let b = 0; b < walls.strips; b++)
        add(sums, a, (rule.weights[i] ?? 0) * (exchange[a * walls.strips + b] ?? 0));
    }
  });
  return sums;
}

/** A rule from z to infinity, for what falls off as a power of the distance. */
function beyond(z: number, points: number): Rule {
  const start = z + FIRST;
  const near = onPanels([z, start], points);
  const far = gaussLegendre(points);
  const nodes = [...near.nodes];
  const weights = [...near.weights];
  // From each start to its double, until nothing is left.
  for (let low = start, count = 0; count < DOUBLINGS; low *= 2, count++) {
    far.nodes.forEach((t, i) => {
      nodes.push(low * (1.5 + t / 2));
      weights.push((low / 2) * (far.weights[i] ?? 0));
    });
  }
  return { nodes: Float64Array.from(nodes), weights: Float64Array.from(weights) };
}

const DOUBLINGS = 40;

function total(exchange: ArrayLike<number>): number {
  let sum = 0;
  for (let i = 0; i < exchange.length; i++) sum += exchange[i] ?? 0;
  return sum;
}

function add(sums: Float64Array, index: number, amount: number): void {
  sums[index] = (sums[index] ?? 0) + amount;
}

function product(a: Float64Array, j: number, b: Float64Array, k: number): number {
  return (a[j] ?? 0) * (b[k] ?? 0);
}

/**
 * The value of E(u) for the straight line u = x/l, which is never below the transmission probability and meets it in short and
 * in long passages:
 *
 *   ∫₀^l exchange (z²/l − z³/(3l²)) dz + ∫_l^∞ exchange (z − l/3) dz .
 */
export function straightLineTransmission(exchange: (z: number) => number, l: number): number {
  const near = onPanels(gradedBreaks(0, l, Math.min(l, FIRST), GROWTH), LINE_POINTS);
  return (
    integrate(near, (z) => (exchange(z) * z * z * (1 - z / (3 * l))) / l) +
    integrate(beyond(l, LINE_POINTS), (z) => exchange(z) * (z - l / 3))
  );
}

const LINE_POINTS = 7;
