import { gradedBreaks, onPanels } from '../numerics/gaussLegendre';
import type { StraightWalls } from './straightPassage';

/** The inner and the outer wall of the gap between coaxial cylinders whose radii are as k to 1; lengths in gaps. */
export function annulusWalls(k: number): StraightWalls {
  const chords = annulusChords(k);
  return {
    strips: 2,
    exchange: (z) => {
      const sums = { across: 0, around: 0 };
      for (const { kind, square, weight } of chords) sums[kind] += weight / (square + z * z) ** 2;
      return [0, sums.across, sums.across, sums.around];
    },
  };
}

/** Flights whose ends are as far apart across the axis as the root of `square`, from wall to wall or along the outer one. */
export interface Chord {
  readonly kind: 'across' | 'around';
  readonly square: number;
  /** The exchange of these flights over a distance z is weight / (square + z²)². */
  readonly weight: number;
}

/** All flights through the section, by the angle that they span about the axis. The inner cylinder hides what lies behind it. */
export function annulusChords(k: number): readonly Chord[] {
  const inner = k / (1 - k);
  const outer = 1 / (1 - k);
  const area = Math.PI * (outer * outer - inner * inner);
  const seen = Math.acos(k);
  const chords: Chord[] = [];
  // Near the angle 0 the flights across are short on the scale of the gap, those around on no scale at all.
  const across = onPanels(gradedBreaks(0, seen, Math.min(seen, 0.5 / outer), 2), POINTS);
  across.nodes.forEach((angle, i) => {
    const cos = Math.cos(angle);
    const cosines = (outer * cos - inner) * (outer - inner * cos);
    const square = 1 + 4 * inner * outer * Math.sin(angle / 2) ** 2;
    const weight = ((4 * inner * outer) / area) * cosines * (across.weights[i] ?? 0);
    chords.push({ kind: 'across', square, weight });
  });
  const around = onPanels(gradedBreaks(0, 2 * seen, Math.min(seen, FINEST / outer), 3), POINTS);
  around.nodes.forEach((angle, i) => {
    const versine = 2 * Math.sin(angle / 2) ** 2;
    const weight = ((4 * outer ** 4) / area) * versine * versine * (around.weights[i] ?? 0);
    chords.push({ kind: 'around', square: 2 * outer * outer * versine, weight });
  });
  return chords;
}

const POINTS = 8;
const FINEST = 1e-3;
