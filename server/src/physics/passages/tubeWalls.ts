import type { StraightWalls } from './straightPassage';
import { partlySpecular } from './partlySpecular';

/** The wall of a round tube with the accommodation α; lengths in radii. */
export function tubeWalls(accommodation = 1): StraightWalls {
  return { strips: 1, exchange: partlySpecular(exchange, accommodation) };
}

/**
 * The second derivative of the view factor between two coaxial discs, F = 1 + z²/2 − z√(1 + z²/4):
 * 1 − (1 + 3v/2)(1 + v)^(−3/2) with v = 4/z², written so that nothing cancels far away.
 */
function exchange(z: number): number {
  const q = z * z + 4;
  if (z < 8) return 1 - (z * (z * z + 6)) / (q * Math.sqrt(q));
  const v = 4 / (z * z);
  // (1 + v)³ − (1 + 3v/2)² = v²(3/4 + v), and a difference of squares over the sum.
  const root = (1 + v) * Math.sqrt(1 + v);
  return (v * v * (0.75 + v)) / (root * (root + 1 + 1.5 * v));
}
