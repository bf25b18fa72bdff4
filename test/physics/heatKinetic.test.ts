import assert from 'node:assert/strict';
import { flightKernel } from '../../server/src/physics/heat/kinetic/flightKernel';
import { solveHeat } from '../../server/src/physics/heat/kinetic/solveHeat';
import { excessShare, jumpCoefficient } from '../../server/src/physics/heat/excess';
import { excessResistance } from '../../server/src/physics/heat/tables/excessResistance';
import { columnAt, highestLogarithm, resistanceColumns } from '../../server/src/physics/heat/tables/resistanceTable';
import { tableEntry } from '../../server/src/physics/heat/tables/tabulate';
import { integrate, legendre, onPanels } from '../../server/src/physics/numerics/gaussLegendre';
import { near } from '../support/gases';

/** The model's gas conducts so that R = 0.8 δ + … in units of T/(p v₀). */
const beyondLimits = (flux: number, delta: number) => 1 / flux - Math.sqrt(Math.PI) - 0.8 * delta;

describe('the kernel of flight along a chord', () => {
  const rule = onPanels([-1, -0.5, 0, 0.5, 1], 20);
  /** Split where the kernel has its kink. */
  const across = (m: number, n: number, kappa: number) =>
    integrate(rule, (t) => {
      const [below, above] = [onPanels([-1, t], 24), onPanels([t, 1], 24)];
      const inner = (s: number) => legendre(n, s).value * Math.exp(-kappa * Math.abs(t - s));
      return legendre(m, t).value * (integrate(below, inner) + integrate(above, inner));
    });

  for (const kappa of [1e-3, 0.1, 1, 7, 30]) {
    it(`is what quadrature finds at κ = ${kappa}`, () => {
      const count = 8;
      const { matrix, arriving } = flightKernel(kappa, count);
      for (let m = 0; m < count; m++) {
        for (let n = 0; n < count; n++) {
          const found = (m + n) % 2 === 0 ? (matrix[m * count + n] ?? NaN) : 0;
          assert.ok(Math.abs(found - across(m, n, kappa)) < 1e-9, `${m} ${n}`);
        }
        const end = integrate(rule, (t) => legendre(m, t).value * Math.exp(-kappa * (1 - t)));
        assert.ok(Math.abs((arriving[m] ?? NaN) - end) < 1e-9, `${m}`);
      }
    });
  }

  it('goes over into a sharp kernel without a step, whichever way its ratios are found', () => {
    const count = 10;
    const at = (kappa: number) => flightKernel(kappa, count).matrix;
    const [before, after] = [at(count * count * (1 - 1e-9)), at(count * count * (1 + 1e-9))];
    before.forEach((value, cell) => assert.ok(Math.abs(value - (after[cell] ?? NaN)) < 1e-10));
  });
});

describe('heat from the kinetic equation', () => {
  it('is that of free flight in a very rare gas', () => {
    near(solveHeat({ kind: 'plates' }, 1e-7, 4), 1 / Math.sqrt(Math.PI), 1e-6);
    near(solveHeat({ kind: 'cylinders', outer: 3 }, 1e-7, 4), 1 / Math.sqrt(Math.PI), 1e-6);
  });

  it('is what a discrete-ordinate solution of the same equation finds between plates', () => {
    for (const delta of [0.1, 1, 4]) near(solveHeat({ kind: 'plates' }, delta, 12), discreteOrdinates(delta), 2e-4);
  });

  it('jumps at the walls of a dense gas by the published coefficient', () => {
    // ζ = 1.302716: Barichello & Siewert, Eur. J. Appl. Math. 11, 353 (2000), BGK, diffuse (from memory).
    const excess = beyondLimits(solveHeat({ kind: 'plates' }, 30, 20), 30);
    near((excess + Math.sqrt(Math.PI)) / 1.6, 1.302716, 2e-4);
    // 1.954 with Shakhov's model, recommended by Sharipov for single atoms (from memory).
    near(jumpCoefficient, 1.954, 3e-4);
  });

  it('converges from below with the number of polynomials, as a variational bound does', () => {
    for (const outer of [1.5, 20]) {
      const [four, six, nine] = [4, 6, 9].map((order) => solveHeat({ kind: 'cylinders', outer }, 2, order));
      assert.ok(four && six && nine && four > six && six > nine && four - nine < 1e-3 * nine, `${four} ${six} ${nine}`);
    }
  });

  it('between cylinders of nearly one radius is that between plates', () => {
    const outer = 1.001;
    near(solveHeat({ kind: 'cylinders', outer }, 1 / 0.001, 8), solveHeat({ kind: 'plates' }, 1, 8), 1e-3);
  });
});

describe('the table of resistances', () => {
  it('is what the kinetic equation gives', () => {
    for (const [row, column] of [
      [0, 0],
      [0, 12],
      [0, 17],
      [2, 9],
      [5, 13],
      [7, 10],
    ] as const) {
      const kept = excessResistance[row]?.[column] ?? NaN;
      assert.ok(Math.abs(kept - tableEntry(row, column)) < 2e-6, `${row} ${column}: ${kept}`);
    }
  }).timeout(30_000);

  it('interpolates what it does not hold', () => {
    const share = (flux: number, delta: number) => beyondLimits(flux, delta) / Math.sqrt(Math.PI);
    for (const delta of [0.02, 0.7, 2.5, 12]) {
      const solved = share(solveHeat({ kind: 'plates' }, delta, 16), delta);
      assert.ok(Math.abs(excessShare(delta, 0) - solved) < 1e-3, `${delta}`);
    }
    for (const outer of [1.1, 2, 10]) {
      for (const reduced of [0.05, 0.8, 6]) {
        const logarithm = Math.log(outer);
        const solved = share(solveHeat({ kind: 'cylinders', outer }, reduced / logarithm, 9), reduced);
        const found = excessShare(reduced, logarithm);
        assert.ok(Math.abs(found - solved) < 1.5e-3, `${outer} ${reduced}: ${found} ${solved}`);
      }
    }
  }).timeout(30_000);

  it('goes on beyond its ends without a kink that heat would show', () => {
    const resistance = (reduced: number, logarithm: number) =>
      Math.log(1 + (8 * reduced) / (15 * Math.sqrt(Math.PI)) + excessShare(reduced, logarithm));
    const step = 1e-4;
    for (const logarithm of [0, 0.1, 0.7, 3, 6]) {
      for (const column of [columnAt(0), columnAt(resistanceColumns.count - 1)]) {
        const at = (steps: number) => resistance(column * (1 + steps * step), logarithm);
        const [before, after] = [(at(0) - at(-1)) / step, (at(1) - at(0)) / step];
        assert.ok(Math.abs(after - before) < 0.005, `${logarithm} ${column}: ${before} ${after}`);
      }
    }
  });

  it('goes on beyond its ends without a step', () => {
    const last = resistanceColumns.count - 1;
    for (const logarithm of [0, 0.1, 0.7, 3, 6]) {
      for (const column of [columnAt(0), columnAt(last)]) {
        const [below, above] = [
          excessShare(column * (1 - 1e-9), logarithm),
          excessShare(column * (1 + 1e-9), logarithm),
        ];
        assert.ok(Math.abs(below - above) < 1e-8);
      }
    }
    const [below, above] = [
      excessShare(1, highestLogarithm * (1 - 1e-12)),
      excessShare(1, highestLogarithm * (1 + 1e-12)),
    ];
    assert.ok(Math.abs(below - above) < 1e-8);
  });

  it('vanishes in free flight and leaves the jumps in a dense gas', () => {
    for (const logarithm of [0, 0.3, 2, 8]) {
      assert.ok(Math.abs(excessShare(1e-12, logarithm)) < 1e-10);
      const share = Math.exp(-Math.min(logarithm, highestLogarithm));
      const jumps = ((8 / 15) * jumpCoefficient * (1 + share)) / Math.sqrt(Math.PI) - 1;
      assert.ok(Math.abs(excessShare(1e9, logarithm) - jumps) < 1e-7);
    }
  });
});

/**
 * The equation of Bhatnagar, Gross and Krook between diffuse plates by another way: values on a grid over the distance and
 * over the speed across, iterated until the source stands. The distributions are those of the mean over the other speeds and
 * of what they carry.
 */
function discreteOrdinates(delta: number): number {
  const cells = 400;
  const width = 1 / cells;
  // Squares of evenly resolved roots, as much happens at small speeds.
  const rule = onPanels([0, 0.2, 0.6, 1.2, 2.3], 10);
  const speeds = [...rule.nodes].map((root, i) => {
    const c = root * root;
    return { c, weight: ((rule.weights[i] ?? 0) * 2 * root * Math.exp(-c * c)) / Math.sqrt(Math.PI) };
  });
  let density = new Float64Array(cells);
  let temperature = new Float64Array(cells);
  const given = [0, 0];
  let flux = 0;
  for (let round = 0; round < 400; round++) {
    const nextDensity = new Float64Array(cells);
    const nextTemperature = new Float64Array(cells);
    const arriving = [0, 0];
    const heat = [0, 0];
    for (const { c, weight } of speeds) {
      const u = c * c;
      const through = Math.exp((-delta * width) / c);
      for (const direction of [0, 1]) {
        const wall = direction === 0 ? 0.5 : -0.5;
        let mean = (given[direction] ?? 0) + (u - 1) * wall;
        let spread = wall;
        const sign = direction === 0 ? 1 : -1;
        if (direction === 0) heat[0] = (heat[0] ?? 0) + weight * c * (u * mean + spread);
        for (let step = 0; step < cells; step++) {
          const cell = direction === 0 ? step : cells - 1 - step;
          const sourceMean = (density[cell] ?? 0) + (u - 0.5) * (temperature[cell] ?? 0);
          const sourceSpread = temperature[cell] ?? 0;
          const kept = ((1 - through) * c) / (delta * width);
          const [averageMean, averageSpread] = [
            sourceMean + (mean - sourceMean) * kept,
            sourceSpread + (spread - sourceSpread) * kept,
          ];
          nextDensity[cell] = (nextDensity[cell] ?? 0) + weight * averageMean;
          nextTemperature[cell] =
            (nextTemperature[cell] ?? 0) + (2 / 3) * weight * ((u - 0.5) * averageMean + averageSpread);
          mean = sourceMean + (mean - sourceMean) * through;
          spread = sourceSpread + (spread - sourceSpread) * through;
        }
        const end = direction === 0 ? 1 : 0;
        arriving[end] = (arriving[end] ?? 0) + weight * c * mean;
        if (end === 0) heat[1] = (heat[1] ?? 0) + sign * weight * c * (u * mean + spread);
      }
    }
    // What arrives is given off again: the flux of density 1 is 1/(2√π).
    const before = flux;
    given[0] = 2 * Math.sqrt(Math.PI) * (arriving[0] ?? 0);
    given[1] = 2 * Math.sqrt(Math.PI) * (arriving[1] ?? 0);
    flux = (heat[0] ?? 0) + (heat[1] ?? 0);
    density = nextDensity;
    temperature = nextTemperature;
    if (round > 20 && Math.abs(flux - before) < 1e-9) break;
  }
  return flux;
}
