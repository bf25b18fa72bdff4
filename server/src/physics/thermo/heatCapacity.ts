import { c as lightSpeed, h, k, R } from '../constants';
import type { Point } from '../interpolated';
import { interpolated } from '../interpolated';

/** How the ideal-gas heat capacity of a species depends on temperature. */
export type HeatCapacity =
  /** cp = 5/2 R: translation only. Exact until electrons are excited, far above the temperatures of use. */
  | { readonly kind: 'monatomic' }
  | {
      readonly kind: 'nasa-9';
      readonly low: number;
      readonly high: number;
      readonly intervals: readonly Nasa9Interval[];
    }
  | RotorVibrator
  /** A table, as a file states it. */
  | { readonly kind: 'points'; readonly low: number; readonly high: number; readonly points: readonly Point[] };

/** cp/R = a₁T⁻² + a₂T⁻¹ + a₃ + a₄T + a₅T² + a₆T³ + a₇T⁴ up to `high`, K. */
export interface Nasa9Interval {
  readonly high: number;
  readonly a: readonly [number, number, number, number, number, number, number];
}

/** A diatomic molecule from its spectroscopic constants: the levels of a stretching rotor summed, and one harmonic vibration. */
export interface RotorVibrator {
  readonly kind: 'rotor-vibrator';
  readonly low: number;
  readonly high: number;
  /** Rotational constant of the ground state B₀, 1/m. */
  readonly rotation: number;
  /** Centrifugal distortion D₀, 1/m. */
  readonly distortion: number;
  /** Fundamental of the vibration, 1/m. */
  readonly vibration: number;
  /** Shares of the even and the odd rotational levels, frozen as they are at room temperature ("normal" gas). */
  readonly even: number;
  readonly odd: number;
}

/** The range in which the data hold, K. Below and above, the value at the end of the range stands. */
export function heatCapacityRange(data: HeatCapacity): { readonly low: number; readonly high: number } {
  return data.kind === 'monatomic' ? anyTemperature : data;
}

/** Molar heat capacity at constant pressure of the ideal gas, J/(mol K), from the temperature in K. */
export function molarHeatCapacity(data: HeatCapacity, temperature: number): number {
  switch (data.kind) {
    case 'monatomic':
      return 2.5 * R;
    case 'nasa-9':
      return R * nasa9(data.intervals, clamp(temperature, data.low, data.high));
    case 'rotor-vibrator':
      return R * rotorVibrator(data, clamp(temperature, data.low, data.high));
    case 'points':
      return interpolated(data.points, temperature);
    default:
      return data satisfies never;
  }
}

const anyTemperature = { low: 0, high: Infinity };

function clamp(value: number, low: number, high: number): number {
  return Math.min(Math.max(value, low), high);
}

function nasa9(intervals: readonly Nasa9Interval[], T: number): number {
  const interval = intervals.find(({ high }) => T <= high) ?? intervals[intervals.length - 1];
  if (interval === undefined) return 0;
  const [a1, a2, a3, a4, a5, a6, a7] = interval.a;
  return (a1 / T + a2) / T + a3 + T * (a4 + T * (a5 + T * (a6 + T * a7)));
}

/** cp/R = 5/2 + even and odd rotation weighted + vibration x² eˣ/(eˣ − 1)². */
function rotorVibrator(data: RotorVibrator, T: number): number {
  const perKelvin = (h * lightSpeed) / k;
  const rotation = data.even * rotor(data, perKelvin / T, 0) + data.odd * rotor(data, perKelvin / T, 1);
  const x = (perKelvin * data.vibration) / T;
  const decay = Math.exp(-x);
  return 2.5 + rotation + (x * x * decay) / ((1 - decay) * (1 - decay));
}

/** The variance of the rotational energy over (kT)², for the levels of one parity. `beta` is hc/kT in m. */
function rotor({ rotation, distortion }: RotorVibrator, beta: number, parity: 0 | 1): number {
  let weights = 0;
  let energies = 0;
  let squares = 0;
  // Energies count from the lowest level, so that nothing underflows when it is cold.
  const ground = levelEnergy(rotation, distortion, parity);
  for (let J = parity; J <= highestLevel; J += 2) {
    const energy = beta * (levelEnergy(rotation, distortion, J) - ground);
    const weight = (2 * J + 1) * Math.exp(-energy);
    weights += weight;
    energies += weight * energy;
    squares += weight * energy * energy;
    if (weight < 1e-12 * weights) break;
  }
  const mean = energies / weights;
  return squares / weights - mean * mean;
}

function levelEnergy(rotation: number, distortion: number, J: number): number {
  const square = J * (J + 1);
  return square * (rotation - distortion * square);
}

/** Above this level the quadratic distortion would turn the energies down again. */
const highestLevel = 30;
