import { gaussLegendre, onPanels } from '../../numerics/gaussLegendre';

/** A straight way through the gas from wall to wall, with what the profiles are along it. */
export interface Chord {
  /** How much of the lines it stands for, both ways along it taken together. */
  readonly weight: number;
  readonly start: Wall;
  readonly end: Wall;
  readonly panels: readonly Panel[];
}

/** The hot and the cold wall by index: of cylinders, the inner and the outer one. */
export type Wall = 0 | 1;

/** A part of a chord on which the profiles are polynomials of the way. */
export interface Panel {
  readonly half: number;
  /** How many Legendre polynomials describe the profiles along it. */
  readonly degrees: number;
  /** Coefficients of Legendre polynomials along the panel, by profile·degrees + degree. */
  readonly profiles: Float64Array;
}

/** Between plates at the distance 1 all ways are alike but for their slope, which the speed across accounts for. */
export function plateChords(order: number): readonly Chord[] {
  const profiles = new Float64Array(order * order);
  for (let j = 0; j < order; j++) profiles[j * order + j] = 1;
  return [{ weight: 1 / Math.sqrt(Math.PI), start: 0, end: 1, panels: [{ half: 0.5, degrees: order, profiles }] }];
}

/**
 * Between cylinders of the radii 1 and `outer`: those from the one to the other, at a distance b < 1 from the axis, and
 * those from the outer cylinder to itself. Seen along the axis; the speed along it is averaged over.
 */
export function cylinderChords(outer: number, order: number): readonly Chord[] {
  const chords: Chord[] = [];
  const { nodes, weights } = onPanels([0, 0.8, 1.3, Math.PI / 2], 12);
  nodes.forEach((angle, i) => {
    const b = Math.sin(angle);
    const weight = 4 * (weights[i] ?? 0) * Math.cos(angle);
    const breaks = breaksFrom(Math.cos(angle), Math.sqrt(outer * outer - b * b), b);
    chords.push({ weight, start: 0, end: 1, panels: panelsOf(breaks, b, outer, order) });
  });
  const around = onPanels(angleBreaks(Math.asin(1 / outer)), 10);
  around.nodes.forEach((angle, i) => {
    const b = outer * Math.sin(angle);
    const weight = 2 * (around.weights[i] ?? 0) * outer * Math.cos(angle);
    const half = breaksFrom(0, outer * Math.cos(angle), b);
    const breaks = [
      ...half
        .slice(1)
        .map((s) => -s)
        .reverse(),
      ...half,
    ];
    chords.push({ weight, start: 1, end: 1, panels: panelsOf(breaks, b, outer, order) });
  });
  return chords;
}

/** Wide where the distance from the axis is large, as profiles follow its logarithm. */
function breaksFrom(start: number, end: number, b: number): readonly number[] {
  const breaks = [start];
  for (let s = start; s < end;) {
    const next = s + 0.8 * Math.hypot(s, b);
    s = next > end - 0.2 * Math.hypot(s, b) ? end : next;
    breaks.push(s);
  }
  return breaks;
}

/** From the ways that graze the inner cylinder to those that hardly leave the outer one. */
function angleBreaks(first: number): readonly number[] {
  const breaks = [first];
  for (let angle = first * 1.6; angle < 1.2; angle *= 1.6) breaks.push(angle);
  return [...breaks, ...[1.3, 1.5].filter((angle) => angle > (breaks.at(-1) ?? 0) + 0.05), Math.PI / 2];
}

function panelsOf(breaks: readonly number[], b: number, outer: number, order: number): readonly Panel[] {
  return breaks.slice(1).map((high, k) => {
    const low = breaks[k] ?? high;
    const half = (high - low) / 2;
    return { half, ...projected((t) => profilePlace(Math.hypot(b, low + half * (1 + t)), outer), order) };
  });
}

/** Between −1 and 1 by the logarithm of the radius, along which heat conducts evenly. */
function profilePlace(radius: number, outer: number): number {
  return (2 * Math.log(radius)) / Math.log(outer) - 1;
}

/** What the profiles, Legendre polynomials of their own place, are along a panel, to as many degrees as matter. */
function projected(place: (t: number) => number, order: number): Pick<Panel, 'degrees' | 'profiles'> {
  const { nodes, weights } = gaussLegendre(MOST_DEGREES + 4);
  const rows = Array.from({ length: MOST_DEGREES }, () => new Float64Array(order));
  nodes.forEach((t, i) => {
    const along = legendreValues(MOST_DEGREES, t);
    const across = legendreValues(order, place(t));
    rows.forEach((row, n) => {
      const scale = (n + 0.5) * (weights[i] ?? 0) * (along[n] ?? 0);
      for (let j = 0; j < order; j++) row[j] = (row[j] ?? 0) + scale * (across[j] ?? 0);
    });
  });
  const matters = rows.map((row) => row.some((value) => Math.abs(value) > NEGLIGIBLE));
  const degrees = 1 + matters.lastIndexOf(true);
  const profiles = new Float64Array(order * degrees);
  rows.slice(0, degrees).forEach((row, n) => row.forEach((value, j) => (profiles[j * degrees + n] = value)));
  return { degrees, profiles };
}

const MOST_DEGREES = 32;
const NEGLIGIBLE = 1e-12;

function legendreValues(count: number, x: number): Float64Array {
  const values = new Float64Array(count);
  let [before, value] = [0, 1];
  for (let n = 0; n < count; n++) {
    values[n] = value;
    [before, value] = [value, ((2 * n + 1) * x * value - n * before) / (n + 1)];
  }
  return values;
}
