import type { ChebyshevTable } from '../numerics/chebyshevTable';

/** Made by passages/makeTables.ts; `UPDATE=1` with test/physics/passageTables.test.ts makes it anew. */
export const mitreTable: ChebyshevTable = {
  axes: [
    { low: 0, high: 2.0943951023931953, count: 4 },
    { low: 0, high: 1, count: 3 },
  ],
  // prettier-ignore
  values: [
    1, 1, 1, 1.001, 0.988, 1, 1.054, 0.96, 1, 1.183, 1.03, 1,
  ],
};
