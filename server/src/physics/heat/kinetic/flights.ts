import type { Chord, Panel } from './chords';
import { flightKernel } from './flightKernel';

/** What flies from where to where, summed over the chords. */
export interface Flights {
  /** Between profiles i and j, by i·order + j. */
  readonly between: Float64Array;
  /** From or to a wall, by wall·order + i. */
  readonly fromWall: Float64Array;
  /** From wall to wall, by 2·from + to. */
  readonly betweenWalls: Float64Array;
}

/** Where molecules collide κ times per unit of length. */
export function flights(chords: readonly Chord[], kappa: number, order: number): Flights {
  const between = new Float64Array(order * order);
  const fromWall = new Float64Array(2 * order);
  const betweenWalls = new Float64Array(4);
  for (const { weight, start, end, panels } of chords) {
    const sent = panels.map((panel) => sentBy(panel, kappa, order));
    addBetween(between, weight, sent, order);
    addScaled(fromWall, end * order, weight, arriving(sent, order));
    addScaled(fromWall, start * order, weight, arriving(sent.map(turned).reverse(), order));
    const through = weight * sent.reduce((product, panel) => product * panel.through, 1);
    for (const cell of [2 * start + end, 2 * end + start]) betweenWalls[cell] = (betweenWalls[cell] ?? 0) + through;
  }
  return { between, fromWall, betweenWalls };
}

/** What the profiles along one panel send. */
interface Sent {
  /** From each profile to each within the panel. */
  readonly within: Float64Array;
  /** Out of its end and out of its beginning. */
  readonly onwards: Float64Array;
  readonly back: Float64Array;
  /** The share of what comes in that flies through. */
  readonly through: number;
}

function sentBy({ half, degrees, profiles }: Panel, kappa: number, order: number): Sent {
  const { matrix, arriving: weights } = flightKernel(kappa * half, degrees);
  const within = new Float64Array(order * order);
  const onwards = new Float64Array(order);
  const back = new Float64Array(order);
  const sent = new Float64Array(degrees);
  for (let i = 0; i < order; i++) {
    for (let n = 0; n < degrees; n++) {
      const value = half * (profiles[i * degrees + n] ?? 0) * (weights[n] ?? 0);
      onwards[i] = (onwards[i] ?? 0) + value;
      back[i] = (back[i] ?? 0) + (n % 2 === 0 ? value : -value);
      let sum = 0;
      for (let m = n % 2; m < degrees; m += 2) {
        sum += (profiles[i * degrees + m] ?? 0) * (matrix[m * degrees + n] ?? 0);
      }
      sent[n] = half * half * sum;
    }
    for (let j = 0; j <= i; j++) {
      let sum = 0;
      for (let n = 0; n < degrees; n++) sum += (sent[n] ?? 0) * (profiles[j * degrees + n] ?? 0);
      within[i * order + j] = sum;
      within[j * order + i] = sum;
    }
  }
  return { within, onwards, back, through: Math.exp(-2 * kappa * half) };
}

/** The panel as met by who comes from the other side. */
function turned({ within, onwards, back, through }: Sent): Sent {
  return { within, onwards: back, back: onwards, through };
}

/** What of each profile arrives at the end of the chord. */
function arriving(panels: readonly Sent[], order: number): Float64Array {
  const carried = new Float64Array(order);
  for (const panel of panels) carryOn(carried, panel);
  return carried;
}

/** Adds what profiles send each other within the panels and from panel to panel, both ways. */
function addBetween(between: Float64Array, weight: number, panels: readonly Sent[], order: number): void {
  const carried = new Float64Array(order);
  for (const panel of panels) {
    const { within, back } = panel;
    for (let i = 0; i < order; i++) {
      for (let j = 0; j < order; j++) {
        const cell = i * order + j;
        const crossing = (back[i] ?? 0) * (carried[j] ?? 0) + (carried[i] ?? 0) * (back[j] ?? 0);
        between[cell] = (between[cell] ?? 0) + weight * ((within[cell] ?? 0) + crossing);
      }
    }
    carryOn(carried, panel);
  }
}

function carryOn(carried: Float64Array, { onwards, through }: Sent): void {
  for (let i = 0; i < carried.length; i++) carried[i] = through * (carried[i] ?? 0) + (onwards[i] ?? 0);
}

function addScaled(sums: Float64Array, first: number, weight: number, values: Float64Array): void {
  for (let i = 0; i < values.length; i++) sums[first + i] = (sums[first + i] ?? 0) + weight * (values[i] ?? 0);
}
