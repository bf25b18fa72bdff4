import type { Axis, ChebyshevTable } from '../numerics/chebyshevTable';
import { gridOf } from '../numerics/chebyshevTable';
import { leastAccommodation } from './accommodation';
import { annulusReference } from './annulus';
import { annulusWalls } from './annulusWalls';
import { shortestMitre, steepestMitre, straightOf } from './bend';
import { sampleBend } from './bendSampling';
import { coneReference, halfAngleOf, stretched } from './cone';
import { coneExchange } from './conePassage';
import { ductReference } from './duct';
import { ductWalls } from './ductWalls';
import { slitReference } from './slit';
import { slitWalls } from './slitWalls';
import { straightTransmission } from './straightPassage';
import { tubeReference } from './tube';
import { tubeWalls } from './tubeWalls';

/** How a table in physics/tables comes about. Making all of them takes some minutes, so they are kept as files. */
export interface TableMaker {
  readonly name: string;
  readonly axes: readonly Axis[];
  /** The number of significant digits that are kept. */
  readonly digits: number;
  readonly entry: (...at: readonly number[]) => number;
}

const lengths: Axis = { low: 0, high: Math.log1p(1e6), count: 32 };
const fewerLengths: Axis = { ...lengths, count: 26 };
const accommodations: Axis = { low: Math.log(leastAccommodation), high: 0, count: 9 };
const wholeTo1000: Axis = { low: 0, high: Math.log(1000), count: 9 };
const fine = { functions: 9, points: 10 };
const fair = { functions: 7, points: 8 };

export const tableMakers: readonly TableMaker[] = [
  {
    name: 'tubeTable',
    axes: [lengths, accommodations],
    digits: 7,
    entry: (x = 0, y = 0) =>
      at(x, (l) => straightTransmission(tubeWalls(Math.exp(y)), l, fine) / tubeReference(l, Math.exp(y))),
  },
  {
    name: 'slitTable',
    axes: [lengths, accommodations],
    digits: 7,
    entry: (x = 0, y = 0) =>
      at(x, (l) => straightTransmission(slitWalls(Math.exp(y)), l, fine) / slitReference(l, Math.exp(y))),
  },
  {
    name: 'annulusTable',
    axes: [wholeTo1000, fewerLengths],
    digits: 7,
    entry: (x = 0, y = 0) => {
      // Without an inner wall there are no chords to it; the thinnest wire stands for it.
      const k = Math.max(-Math.expm1(-x), 1e-6);
      return at(y, (l) => straightTransmission(annulusWalls(k), l, fair) / annulusReference(k, l));
    },
  },
  {
    name: 'ductTable',
    axes: [wholeTo1000, fewerLengths],
    digits: 7,
    entry: (x = 0, y = 0) =>
      at(y, (l) => straightTransmission(ductWalls(Math.exp(x), 2), l, fair) / ductReference(Math.exp(x), l)),
  },
  {
    name: 'coneTable',
    axes: [
      { low: 0, high: stretched(Math.PI / 2), count: 16 },
      { low: 0, high: Math.log1p(1e4), count: 24 },
    ],
    digits: 7,
    entry: (x = 0, y = 0) => {
      const slope = Math.tan(halfAngleOf(x));
      // A wall that stands across the axis is no wall.
      if (slope < 0 || slope > 1e6) return 1;
      return at(
        y,
        (l) => coneExchange(1 + slope * l, l, { functions: 12, points: 8 }) / coneReference(1 + slope * l, l),
      );
    },
  },
  {
    name: 'bendTable',
    axes: [
      { low: 0, high: Math.PI, count: 5 },
      { low: 0, high: 1, count: 4 },
      { low: 0, high: 1, count: 3 },
    ],
    digits: 4,
    entry: (angle = 0, curvature = 0, share = 0) => {
      if (angle === 0 || curvature === 0 || share === 1) return 1;
      const arm = straightOf(share) / 2;
      const radius = 1 / curvature;
      const { value } = sampleBend({ angle, radius, inlet: arm, outlet: arm }, MOLECULES, SEED);
      return value / straightTransmission(tubeWalls(), 2 * arm + angle * radius, fair);
    },
  },
  {
    name: 'mitreTable',
    axes: [
      { low: 0, high: steepestMitre, count: 4 },
      { low: 0, high: 1, count: 3 },
    ],
    digits: 4,
    entry: (angle = 0, share = 0) => {
      if (angle === 0 || share === 1) return 1;
      const straight = straightOf(share) + shortestMitre(angle);
      const { value } = sampleBend({ angle, radius: 0, inlet: straight / 2, outlet: straight / 2 }, MOLECULES, SEED);
      return value / straightTransmission(tubeWalls(), straight, fair);
    },
  },
];

/** So many that the chance is known to about 0.1 % of all molecules, 95 %. */
export const MOLECULES = 1_000_000;
const SEED = 1960;

export function makeTable({ axes, digits, entry }: TableMaker): ChebyshevTable {
  return { axes, values: gridOf(axes).map((at) => Number(entry(...at).toPrecision(digits))) };
}

/** By the logarithm of the length; an opening lets everything through. */
function at(x: number, ratio: (l: number) => number): number {
  return x === 0 ? 1 : ratio(Math.expm1(x));
}
