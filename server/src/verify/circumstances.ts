import { constantNamed } from '../quantities/constants';
import type { Constant } from '../quantities/constants';

/** What ran, and with which constants. */
export interface Circumstances {
  /** `tenuity 0.1.0`, `Node.js 20.19.0`. */
  readonly versions: readonly string[];
  readonly constants: readonly Constant[];
}

export function circumstances(versions: readonly string[]): Circumstances {
  return { versions, constants: inUse.map((name) => constantNamed(name)) };
}

/** Those that the engine reckons with. */
const inUse = ['k', 'N_A', 'R', 'h', 'c'] as const;
