import type { Composition } from '../composition';
import type { StatePoint } from './closure';

/** What a state is evaluated from. */
export interface StateRequest {
  readonly composition: Composition;
  readonly point: StatePoint;
  /** Adsorption sites per area that make a monolayer, 1/m². */
  readonly siteDensity: number;
  /** The hard-sphere diameter, m, if the file states one; else it follows from the viscosity. */
  readonly collisionDiameter?: number;
}

/** Factors on the correlations and methods named by the keys, by which their errors are propagated. */
export interface Trial {
  readonly factors: ReadonlyMap<string, number>;
}

/** The factor on what the key names: one, unless it is on trial. */
export function factor(trial: Trial, key: string): number {
  return trial.factors.get(key) ?? 1;
}
