import type { StraightWalls } from './straightPassage';

/** The two ends of a strip across the duct. */
type Ends = readonly [number, number];

/** A part of the rim of the section that runs along one of its sides. */
interface Strip {
  readonly side: 'bottom' | 'top' | 'left' | 'right';
  readonly low: number;
  readonly high: number;
  /** Strips that mirror each other carry the same density and count as one. */
  readonly group: number;
}

/**
 * The walls of a rectangular duct of the given width; lengths in heights. Each half of a side is parted into so many strips,
 * narrower towards the corners, and the wall density is taken as even across a strip.
 */
export function ductWalls(width: number, parts: number): StraightWalls {
  const rim = (['bottom', 'top', 'left', 'right'] as const).flatMap((side) => stripsOf(side, width, parts));
  const strips = 2 * parts;
  const pairs = rim.flatMap((a) => rim.filter(({ side }) => side !== a.side).map((b) => [a, b] as const));
  return {
    strips,
    exchange: (z) => {
      const sums = new Float64Array(strips * strips);
      for (const [a, b] of pairs) {
        const entry = a.group * strips + b.group;
        sums[entry] = (sums[entry] ?? 0) + between(a, b, width, z) / width;
      }
      return sums;
    },
  };
}

/** What all the walls exchange over a distance z. */
export function ductExchange(width: number, z: number): number {
  const [floor, side] = [[0, width] as const, [0, 1] as const];
  const facing = 2 * facingStrips(floor, floor, 1, z) + 2 * facingStrips(side, side, width, z);
  return (facing + 8 * perpendicular(floor, side, z)) / width;
}

function stripsOf(side: Strip['side'], width: number, parts: number): readonly Strip[] {
  const upright = side === 'left' || side === 'right';
  const whole = upright ? 1 : width;
  const first = upright ? parts : 0;
  return Array.from({ length: 2 * parts }, (_, i) => ({
    side,
    low: whole * share(i / parts),
    high: whole * share((i + 1) / parts),
    group: first + Math.min(i, 2 * parts - 1 - i),
  }));
}

/** From 0 to 1 as x goes from 0 to 2, slowly at both ends. */
function share(x: number): number {
  return (1 - Math.cos((Math.PI * x) / 2)) / 2;
}

/** The exchange of two strips on different sides, over a distance z along the duct. */
function between(a: Strip, b: Strip, width: number, z: number): number {
  if (isUpright(a) !== isUpright(b)) return perpendicular(fromCorner(a, b, width), fromCorner(b, a, width), z);
  return facingStrips([a.low, a.high], [b.low, b.high], isUpright(a) ? width : 1, z);
}

/** The two ends of a strip, counted from the corner that it shares with the side of the other. */
function fromCorner({ low, high, ...strip }: Strip, other: Strip, width: number): Ends {
  if (other.side === 'bottom' || other.side === 'left') return [low, high];
  const whole = isUpright({ low, high, ...strip }) ? 1 : width;
  return [whole - high, whole - low];
}

function isUpright({ side }: Strip): boolean {
  return side === 'left' || side === 'right';
}

/** ∬ y y′ / (π (y² + y′² + z²)²) dy dy′ */
function perpendicular([a, b]: Ends, [c, d]: Ends, z: number): number {
  const spread = (b * b - a * a) * (d * d - c * c);
  return -Math.log1p(-spread / ((a * a + d * d + z * z) * (b * b + c * c + z * z))) / (4 * Math.PI);
}

/** ∬ s² / (π ((y − y′)² + s² + z²)²) dy dy′ over strips on opposite sides, s apart. */
function facingStrips([a, b]: Ends, [c, d]: Ends, s: number, z: number): number {
  const reach = Math.sqrt(s * s + z * z);
  const twice = (w: number): number => w * Math.atan(w / reach);
  return ((s * s) / (2 * Math.PI * reach ** 3)) * (twice(b - c) + twice(a - d) - twice(a - c) - twice(b - d));
}
