import { integrate, legendre, onPanels } from '../../numerics/gaussLegendre';
import { solvePositive } from '../../numerics/solvePositive';
import { speeds } from '../../rarefied/speeds';
import type { Chord } from './chords';
import { cylinderChords, plateChords } from './chords';
import { flights } from './flights';

/** Parallel plates at the distance 1, or coaxial cylinders of the radii 1 and `outer`. */
export type HeatSection = { readonly kind: 'plates' } | { readonly kind: 'cylinders'; readonly outer: number };

/**
 * The heat flux through a rarefied gas between diffuse walls, at the first wall, in units of p √(2kT/m) ΔT/T. The rarefaction
 * is p/(η √(2kT/m)) times the unit of length.
 *
 * Solves the linearised equation of Bhatnagar, Gross and Krook by Galerkin's method:
 *   c·∇h = δ [ν + (c² − 3/2) τ − h],
 * with c in units of √(2kT/m). Its unknowns are the profiles of density ν and temperature τ, series of polynomials, and the
 * density that each wall gives off. Between collisions molecules fly straight, so that along each chord the equation is
 * integrated exactly (flights); what remains is to sum over chords and speeds. The heat is a quadratic functional of the
 * unknowns (Bassanini, Cercignani & Pagani 1967), so its error is the square of theirs, and the flux found is too large.
 */
export function solveHeat(section: HeatSection, rarefaction: number, order: number): number {
  const { kind } = section;
  const system = emptySystem(section, rarefaction, order);
  const chords = chordsOf(section, order);
  for (const { at: c, weight } of speeds(SLOWEST[kind] * Math.min(1, rarefaction))) {
    // The measure of the speeds: across the plates, or in the plane across the axis.
    const measure = kind === 'plates' ? weight / c : weight;
    addSpeed(system, { chords, order, rarefaction, c, measure, moments: momentsOf(c * c, kind) });
  }
  return heatOf(system) / (kind === 'plates' ? 1 : 2 * Math.PI);
}

/** What is left out below is less than rounding: how often a molecule that slow collides no longer matters. */
const SLOWEST = { plates: 1e-10, cylinders: 1e-6 } as const;

/** Rows: the density profile, the temperature profile, and the density that each wall gives off. */
interface System {
  readonly size: number;
  readonly matrix: Float64Array;
  /** What comes of the temperature 1 of the first wall. */
  readonly right: Float64Array;
  /** The heat that the first wall gives off, less what of it comes straight back. */
  own: number;
}

function emptySystem(section: HeatSection, rarefaction: number, order: number): System {
  const size = 2 * order + 2;
  const system: System = { size, matrix: new Float64Array(size * size), right: new Float64Array(size), own: 0 };
  for (let i = 0; i < order; i++) {
    for (let j = 0; j < order; j++) {
      const norm = rarefaction * normOf(section, i, j, order);
      add(system, i, j, norm);
      add(system, order + i, order + j, norm);
    }
  }
  // The molecules that a wall of density 1 gives off.
  const root = Math.sqrt(Math.PI);
  const [first, second] = section.kind === 'plates' ? [0.5 / root, 0.5 / root] : [root, root * section.outer];
  add(system, 2 * order, 2 * order, first);
  add(system, 2 * order + 1, 2 * order + 1, second);
  system.own = 2 * first;
  return system;
}

interface Speed {
  readonly chords: readonly Chord[];
  readonly order: number;
  readonly rarefaction: number;
  readonly c: number;
  readonly measure: number;
  readonly moments: Moments;
}

function addSpeed(system: System, { chords, order, rarefaction, c, measure, moments }: Speed): void {
  const { between, fromWall, betweenWalls } = flights(chords, rarefaction / c, order);
  const { one, mixed, temperature, wallOne, wallTemperature, wallHeat } = moments;
  const walls = 2 * order;
  for (let i = 0; i < order; i++) {
    for (let j = 0; j < order; j++) {
      const value = rarefaction * rarefaction * measure * (between[i * order + j] ?? 0);
      add(system, i, j, -value * one);
      add(system, i, order + j, -value * mixed);
      add(system, order + i, j, -value * mixed);
      add(system, order + i, order + j, -value * temperature);
    }
    for (const wall of [0, 1]) {
      const value = rarefaction * measure * c * (fromWall[wall * order + i] ?? 0);
      addBoth(system, i, walls + wall, -value * one);
      addBoth(system, order + i, walls + wall, -value * mixed);
    }
    const hot = rarefaction * measure * c * (fromWall[i] ?? 0);
    addRight(system, i, hot * wallOne);
    addRight(system, order + i, hot * wallTemperature);
  }
  for (const from of [0, 1]) {
    for (const to of [0, 1]) {
      const value = measure * c * c * (betweenWalls[2 * from + to] ?? 0);
      add(system, walls + from, walls + to, -value * one);
      if (from === 0) addRight(system, walls + to, value * wallOne);
      if (from === 0 && to === 0) system.own -= value * wallHeat;
    }
  }
}

/** Means over the velocities across the chords' own, of products of 1, of √(2/3)(c² − 3/2), and of c² − 2. */
interface Moments {
  readonly one: number;
  readonly mixed: number;
  readonly temperature: number;
  /** c² − 2 is what a wall of temperature 1 gives off: heat, and no more molecules. */
  readonly wallOne: number;
  readonly wallTemperature: number;
  readonly wallHeat: number;
}

/** From the squared speed along the chords, in the space that is not averaged over. */
function momentsOf(squared: number, kind: HeatSection['kind']): Moments {
  const [mean, variance] = kind === 'plates' ? [1, 1] : [0.5, 0.5];
  const root = Math.sqrt(2 / 3);
  const warm = squared + mean - 1.5;
  const wall = squared + mean - 2;
  return {
    one: 1,
    mixed: root * warm,
    temperature: (2 / 3) * (warm * warm + variance),
    wallOne: wall,
    wallTemperature: root * (warm * wall + variance),
    wallHeat: wall * wall + variance,
  };
}

/** Where all is denser alike nothing flows: the density that the second wall gives off is taken as zero. */
function heatOf({ size, matrix, right, own }: System): number {
  const open = size - 1;
  const reduced = new Float64Array(open * open);
  for (let i = 0; i < open; i++) reduced.set(matrix.subarray(i * size, i * size + open), i * open);
  const solution = solvePositive(reduced, right.subarray(0, open), open);
  return solution.reduce((heat, value, i) => heat - value * (right[i] ?? 0), own);
}

/** ∫ of the product of two profiles over the section. */
function normOf(section: HeatSection, i: number, j: number, order: number): number {
  if (section.kind === 'plates') return i === j ? 1 / (2 * i + 1) : 0;
  const half = Math.log(section.outer) / 2;
  const areaOf = (x: number) => 2 * Math.PI * half * Math.exp(2 * half * (x + 1));
  const rule = onPanels([-1, -0.5, 0, 0.5, 1], 2 * order + 12);
  return integrate(rule, (x) => areaOf(x) * legendre(i, x).value * legendre(j, x).value);
}

const prepared = new Map<string, readonly Chord[]>();

function chordsOf(section: HeatSection, order: number): readonly Chord[] {
  const key = section.kind === 'plates' ? `${order}` : `${order} ${section.outer}`;
  const known = prepared.get(key);
  if (known) return known;
  const chords = section.kind === 'plates' ? plateChords(order) : cylinderChords(section.outer, order);
  prepared.set(key, chords);
  return chords;
}

function add({ size, matrix }: System, i: number, j: number, value: number): void {
  matrix[i * size + j] = (matrix[i * size + j] ?? 0) + value;
}

function addBoth(system: System, i: number, j: number, value: number): void {
  add(system, i, j, value);
  add(system, j, i, value);
}

function addRight({ right }: System, i: number, value: number): void {
  right[i] = (right[i] ?? 0) + value;
}
