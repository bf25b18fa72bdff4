import { gradedBreaks, legendre, onPanels } from '../numerics/gaussLegendre';
import type { Rule } from '../numerics/gaussLegendre';
import { solvePositive } from '../numerics/solvePositive';
import type { Fineness } from './straightPassage';

/**
 * A conical tube with diffuse walls, of the radii 1 and `radius` and the length l: the area from which every molecule gets
 * through, over π. Divided by the square of the radius at one end, it is the transmission probability from there.
 *
 * It is the least value of E(u), as in a straight passage (see straightPassage.ts), with
 *
 *   E(u) = X(0, l) + ∫ −X′(0, x) u² dx + ∫ X′(x, l) (1 − u)² dx + ∬_{x<x′} k (u(x) − u(x′))² dx dx′ ,
 *
 * X(x, x′) being what two sections exchange, in the manner of coaxial discs, and k its mixed second derivative. The density is
 * sought among polynomials in a variable that resolves both ends, and the solution for a very long cone.
 */
export function coneExchange(radius: number, l: number, { functions, points }: Fineness): number {
  const cone: Cone = { radius, length: l, slope: (radius - 1) / l };
  const fill = basisOf(cone, functions);
  const matrix = new Float64Array(functions * functions);
  const right = new Float64Array(functions);
  const here = new Float64Array(functions);
  const there = new Float64Array(functions);
  let constant = sections(cone);
  const add = (weight: number) => {
    for (let j = 0; j < functions; j++) {
      const step = weight * ((here[j] ?? 0) - (there[j] ?? 0));
      for (let k = 0; k < functions; k++) {
        const entry = j * functions + k;
        matrix[entry] = (matrix[entry] ?? 0) + step * ((here[k] ?? 0) - (there[k] ?? 0));
      }
    }
  };
  const along = bothEnds(0, l, 1, radius, points);
  along.nodes.forEach((x, i) => {
    const weight = along.weights[i] ?? 0;
    fill(x, here);
    there.fill(0);
    add(weight * (toInlet(cone, x) + toOutlet(cone, x)));
    const outwards = weight * toOutlet(cone, x);
    constant += outwards;
    for (let j = 0; j < functions; j++) right[j] = (right[j] ?? 0) + outwards * (here[j] ?? 0);
  });
  const distances = onPanels(gradedBreaks(0, l, Math.min(l / 2, FIRST), GROWTH), points);
  distances.nodes.forEach((z, i) => {
    const places = bothEnds(0, l - z, 1, radius, points);
    places.nodes.forEach((x, p) => {
      fill(x, here);
      fill(x + z, there);
      add((distances.weights[i] ?? 0) * (places.weights[p] ?? 0) * between(cone, x, z));
    });
  });
  const coefficients = solvePositive(matrix, right, functions);
  return constant - coefficients.reduce((sum, c, i) => sum + c * (right[i] ?? 0), 0);
}

interface Cone {
  readonly radius: number;
  readonly length: number;
  readonly slope: number;
}

const FIRST = 0.25;
const GROWTH = 2;

function radiusAt({ slope }: Cone, x: number): number {
  return 1 + slope * x;
}

/** Panels that are fine near both ends, on the scale of the radius there. */
function bothEnds(low: number, high: number, first: number, last: number, points: number): Rule {
  const middle = (low + high) / 2;
  const half = middle - low;
  const rising = gradedBreaks(0, half, Math.min(half, FIRST * first), GROWTH);
  const falling = gradedBreaks(0, half, Math.min(half, FIRST * last), GROWTH);
  const breaks = [
    ...rising.map((x) => low + x),
    ...falling
      .slice(0, -1)
      .reverse()
      .map((x) => high - x),
  ];
  return onPanels(breaks, points);
}

function basisOf(cone: Cone, functions: number): (x: number, out: Float64Array) => void {
  const { radius, length: l } = cone;
  const variable = (x: number): number => Math.log((x + 1) / (l - x + radius));
  const low = variable(0);
  const width = variable(l) - low;
  // Far from the ends a molecule in a long cone wanders with a diffusivity that goes with the radius.
  const wandering = (x: number): number => (x * (radiusAt(cone, x) + 1)) / radiusAt(cone, x) ** 2;
  const whole = wandering(l);
  return (x, out) => {
    out[0] = wandering(x) / whole;
    const eta = (2 * (variable(x) - low)) / width - 1;
    for (let j = 1; j < functions; j++) out[j] = legendre(j - 1, eta).value;
  };
}

/** X(0, l): what passes straight through. */
function sections({ radius, length: l }: Cone): number {
  const sum = 1 + radius * radius + l * l;
  return (2 * radius * radius) / (sum + Math.sqrt(sum * sum - 4 * radius * radius));
}

/** −dX(0, x)/dx */
function toInlet(cone: Cone, x: number): number {
  return -sectionSlope(1, radiusAt(cone, x), x, cone.slope);
}

/** dX(x, l)/dx */
function toOutlet(cone: Cone, x: number): number {
  return -sectionSlope(cone.radius, radiusAt(cone, x), cone.length - x, -cone.slope);
}

/** The derivative of X = 2 a² b² / (Z + D), Z = a² + b² + h², D² = Z² − 4 a² b², as h grows and b with it by the slope. */
function sectionSlope(a: number, b: number, h: number, slope: number): number {
  const sigma = a + b;
  const stretch = Math.sqrt(1 + slope * slope);
  const reach = Math.sqrt(h * h + sigma * sigma);
  const sum = a * a + b * b + h * h + stretch * h * reach;
  const growth = 2 * (b * slope + h) + stretch * (reach + (h * (h + sigma * slope)) / reach);
  return (2 * a * a * b * (2 * slope * sum - b * growth)) / (sum * sum);
}

/** −∂²X/∂x∂x′ = ½ (1 − y)² (2 + y) with y = √(1 + slope²) h / √(h² + (r + r′)²) and 1 − y² = 4 r r′ / (h² + (r + r′)²). */
function between(cone: Cone, x: number, h: number): number {
  const here = radiusAt(cone, x);
  const there = radiusAt(cone, x + h);
  const square = h * h + (here + there) ** 2;
  const y = h * Math.sqrt((1 + cone.slope ** 2) / square);
  const rest = (4 * here * there) / (square * (1 + y));
  return (rest * rest * (2 + y)) / 2;
}
