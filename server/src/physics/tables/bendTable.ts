import type { ChebyshevTable } from '../numerics/chebyshevTable';

/** Made by passages/makeTables.ts; `UPDATE=1` with test/physics/passageTables.test.ts makes it anew. */
export const bendTable: ChebyshevTable = {
  axes: [
    { low: 0, high: 3.141592653589793, count: 5 },
    { low: 0, high: 1, count: 4 },
    { low: 0, high: 1, count: 3 },
  ],
  // prettier-ignore
  values: [
    1, 1, 1, 1, 1, 1, 1, 1, 1, 1, 1, 1, 1, 1, 1, 0.9945, 0.9917, 1, 0.9967, 0.99, 1, 0.9976, 0.9897, 1, 1, 1,
    1, 0.9621, 0.9521, 1, 0.9543, 0.9268, 1, 0.9559, 0.9227, 1, 1, 1, 1, 0.9401, 0.9347, 1, 0.9047, 0.896, 1,
    0.8997, 0.8892, 1, 1, 1, 1, 0.9282, 0.925, 1, 0.8923, 0.8878, 1, 0.8832, 0.8778, 1,
  ],
};
