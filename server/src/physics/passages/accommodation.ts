import type { Failure } from '../outcome';
import { failure } from '../outcome';

/** Below this the tables of partly specular walls end; no technical surface is that smooth. Wholly specular walls are exact. */
export const leastAccommodation = 0.05;

/** Why there is no value for these walls, where flights between mirror reflections are not all alike and diffuse walls are asked for. */
export function unlessDiffuse(accommodation: number, passage: string): Failure | undefined {
  return accommodation === 1 ? undefined : failure({ kind: 'diffuse-only', passage });
}

/** Why there is no value for these walls where the tables know partly specular ones. */
export function unlessKnown(accommodation: number): Failure | undefined {
  if (accommodation === 0 || accommodation >= leastAccommodation) return undefined;
  return failure({
    kind: 'outside-range',
    quantity: 'accommodation',
    value: accommodation,
    low: leastAccommodation,
    high: 1,
  });
}
