import { randomStream } from '../../server/src/physics/numerics/random';

/** Molecules followed through straight passages and cones by another way than the engine’s: an independent check of its integral equations. */

type Vector = [number, number, number];

/** A passage along x from 0 to its length. */
export interface SampledPassage {
  readonly length: number;
  /** A place spread evenly over the inlet, as y and z. */
  start(random: () => number): readonly [number, number];
  /** Where the wall is met next, with the normal into the gas; nothing where it is met never. */
  meet(at: Vector, direction: Vector): { readonly distance: number; normal(at: Vector): Vector } | undefined;
}

/** The share of molecules that get through, the walls reflecting the share α of them diffusely. */
export function sampledChance(passage: SampledPassage, molecules: number, accommodation = 1): number {
  const random = randomStream(20_240_229);
  let through = 0;
  for (let molecule = 0; molecule < molecules; molecule++) if (follow(passage, accommodation, random)) through++;
  return through / molecules;
}

function follow(passage: SampledPassage, accommodation: number, random: () => number): boolean {
  const [y, z] = passage.start(random);
  let at: Vector = [0, y, z];
  let direction = lambert([1, 0, 0], random);
  for (;;) {
    const wall = passage.meet(at, direction);
    const x = wall ? at[0] + direction[0] * wall.distance : direction[0] * Infinity;
    if (!wall || x <= 0 || x >= passage.length) return x > 0;
    at = moved(at, direction, wall.distance);
    const normal = wall.normal(at);
    direction = random() < accommodation ? lambert(normal, random) : mirrored(direction, normal);
  }
}

export function cone(inlet: number, outlet: number, length: number): SampledPassage {
  const slope = (outlet - inlet) / length;
  return {
    length,
    start: (random) => onRing(0, inlet, random),
    meet: ([x, y, z], [dx, dy, dz]) => {
      const r = inlet + slope * x;
      const a = dy * dy + dz * dz - slope * slope * dx * dx;
      const b = y * dy + z * dz - slope * r * dx;
      const c = y * y + z * z - r * r;
      const distance = nextRoot(a, b, Math.min(c, 0), (t) => r + slope * dx * t > 0);
      return distance === undefined
        ? undefined
        : { distance, normal: ([, v, w]) => unit([slope, -v / Math.hypot(v, w), -w / Math.hypot(v, w)]) };
    },
  };
}

export function annulus(inner: number, outer: number, length: number): SampledPassage {
  return {
    length,
    start: (random) => onRing(inner, outer, random),
    meet: ([, y, z], [, dy, dz]) => {
      const a = dy * dy + dz * dz;
      const b = y * dy + z * dz;
      const square = y * y + z * z;
      const inside = b * b - a * (square - inner * inner);
      if (b < 0 && inside > 0) {
        const distance = (-b - Math.sqrt(inside)) / a;
        // A molecule that has just left the inner wall moves away from it.
        if (distance > 1e-12) return { distance, normal: ([, v, w]) => unit([0, v, w]) };
      }
      const distance = (-b + Math.sqrt(Math.max(0, b * b - a * (square - outer * outer)))) / a;
      return { distance, normal: ([, v, w]) => unit([0, -v, -w]) };
    },
  };
}

export function duct(width: number, height: number, length: number): SampledPassage {
  return {
    length,
    start: (random) => [width * random(), height * random()],
    meet: ([, y, z], [, dy, dz]) => {
      const toSide = dy > 0 ? (width - y) / dy : dy < 0 ? -y / dy : Infinity;
      const toFloor = dz > 0 ? (height - z) / dz : dz < 0 ? -z / dz : Infinity;
      if (toSide < toFloor) return { distance: toSide, normal: () => [0, dy > 0 ? -1 : 1, 0] };
      return { distance: toFloor, normal: () => [0, 0, dz > 0 ? -1 : 1] };
    },
  };
}

/** The first root of a t² + 2 b t + c = 0 that lies ahead and on the right half of the cone. */
function nextRoot(a: number, b: number, c: number, fits: (t: number) => boolean): number | undefined {
  const root = b * b - a * c;
  if (root < 0) return undefined;
  const roots = [(-b + Math.sqrt(root)) / a, (-b - Math.sqrt(root)) / a];
  const ahead = roots.filter((t) => t > 1e-12 && fits(t)).sort((p, q) => p - q);
  return ahead[0];
}

function onRing(inner: number, outer: number, random: () => number): readonly [number, number] {
  const r = Math.sqrt(inner * inner + (outer * outer - inner * inner) * random());
  const turn = 2 * Math.PI * random();
  return [r * Math.cos(turn), r * Math.sin(turn)];
}

/** A direction by the cosine law, as a point on the unit sphere that touches the wall. */
function lambert(normal: Vector, random: () => number): Vector {
  const height = 2 * random() - 1;
  const turn = 2 * Math.PI * random();
  const r = Math.sqrt(1 - height * height);
  return unit([normal[0] + r * Math.cos(turn), normal[1] + r * Math.sin(turn), normal[2] + height]);
}

function mirrored(direction: Vector, normal: Vector): Vector {
  const along = direction[0] * normal[0] + direction[1] * normal[1] + direction[2] * normal[2];
  return moved(direction, normal, -2 * along);
}

function moved([x, y, z]: Vector, [dx, dy, dz]: Vector, by: number): Vector {
  return [x + dx * by, y + dy * by, z + dz * by];
}

function unit([x, y, z]: Vector): Vector {
  const size = Math.hypot(x, y, z);
  return [x / size, y / size, z / size];
}
