import assert from 'node:assert/strict';
import { speciesList } from '../../server/src/physics/species/list';
import { bStar, omega11 } from '../../server/src/physics/transport/collisionIntegrals';
import { mixtureConductivity, translationalConductivity } from '../../server/src/physics/transport/mixtureConductivity';
import type { Pairs } from '../../server/src/physics/transport/pairs';
import { figures, gas, mixture, near, part, whole } from '../support/gases';
import { masonSaxena } from '../support/masonSaxena';

const conductivity = (parts: Readonly<Record<string, number>>, T: number) =>
  whole(figures(mixture(parts), T, 1e4), 'thermal_conductivity');

/** The rule for checks, from the figures of the species. */
function rule(parts: Readonly<Record<string, number>>, T: number): number {
  const state = figures(mixture(parts), T, 1e4);
  return masonSaxena(
    Object.entries(parts).map(([name, x]) => ({
      x,
      molarMass: part(state, name, 'molar_mass'),
      viscosity: part(state, name, 'viscosity'),
      conductivity: part(state, name, 'thermal_conductivity'),
    })),
  );
}

describe('the ratio B* of the 12-6 potential', () => {
  it('follows from Ω(1,1)* by the recurrence, with numerical slopes', () => {
    const next = (integral: (T: number) => number, s: number) => (T: number) => {
      const h = 1e-3 * T;
      return integral(T) + ((T / (s + 2)) * (integral(T + h) - integral(T - h))) / (2 * h);
    };
    const omega12 = next(omega11, 1);
    const omega13 = next(omega12, 2);
    for (const T of [0.5, 1, 2, 5, 20, 100])
      near(bStar(T), (5 * omega12(T) - 4 * omega13(T)) / omega11(T), 1e-4, `${T}`);
  });

  it('is near 1.1 for most gases at room temperature, and greater when it is cold', () => {
    assert.ok(Math.abs(bStar(3) - 1.1) < 0.02);
    assert.ok(bStar(5) < bStar(2) && bStar(2) < bStar(1));
  });
});

describe('conductivity of mixtures', () => {
  it('of two single-atom gases is the closed form of Hirschfelder, Curtiss & Bird 1954, eq. 8.2-36 (from memory)', () => {
    for (const [m1, m2, eta1, eta2, eta12, A, B] of [
      [0.004, 0.04, 20e-6, 22.7e-6, 16e-6, 1.1, 1.09],
      [0.004, 0.1313, 20e-6, 23e-6, 14e-6, 1.09, 1.1],
      [0.02, 0.0838, 31e-6, 25e-6, 29e-6, 1.11, 1.12],
    ] as const) {
      for (const x1 of [0, 0.1, 0.5, 0.9, 1]) {
        const pairs: Pairs = {
          viscosity: Float64Array.of(eta1, eta12, eta12, eta2),
          aStar: new Float64Array(4).fill(A),
          bStar: new Float64Array(4).fill(B),
        };
        const own = [translationalConductivity(eta1, m1), translationalConductivity(eta2, m2)];
        const got = mixtureConductivity({
          x: [x1, 1 - x1],
          molarMass: [m1, m2],
          viscosity: [eta1, eta2],
          conductivity: own,
          pairs,
          diffusion: [
            [1, 1],
            [1, 1],
          ],
        });
        near(
          got,
          closedForm(x1, [m1, m2], own, translationalConductivity(eta12, (2 * m1 * m2) / (m1 + m2)), A, B),
          1e-12,
        );
      }
    }
  });

  it('keeps the pure values exactly, and a trace changes nothing', () => {
    for (const { formula, viscosity, heatCapacity, lennardJones } of speciesList) {
      if (!viscosity || !heatCapacity || !lennardJones) continue;
      const other = formula === 'Xe' ? 'He' : 'Xe';
      for (const T of [90, 300, 1000]) {
        const alone = whole(figures(formula, T, 1e4), 'thermal_conductivity');
        near(conductivity({ [formula]: 1, [other]: 0 }, T), alone, 1e-12, formula);
        near(conductivity({ [other]: 0, [formula]: 1 }, T), alone, 1e-12, formula);
        near(conductivity({ [formula]: 1 - 1e-9, [other]: 1e-9 }, T), alone, 1e-6, formula);
      }
    }
  });

  it('of a gas mixed with itself under another name stays as it is', () => {
    for (const name of ['N2', 'CO2', 'He', 'CH4', 'SO2']) {
      const one = gas(name);
      const composition = { species: [one, { ...one, formula: 'other' }], moleFractions: [0.3, 0.7] };
      near(
        whole(figures(composition, 320, 1e4), 'thermal_conductivity'),
        whole(figures(name, 320, 1e4), 'thermal_conductivity'),
        1e-12,
        name,
      );
    }
  });

  it('does not depend on the order of the species', () => {
    near(conductivity({ H2: 0.2, N2: 0.3, CO2: 0.5 }, 300), conductivity({ CO2: 0.5, H2: 0.2, N2: 0.3 }, 300), 1e-12);
  });

  it('of dry air follows from its three parts, within the 2 % that each of their correlations states', () => {
    for (const T of [200, 300, 500, 1000]) {
      const air = whole(figures('air', T, 1e4), 'thermal_conductivity');
      near(conductivity({ N2: 0.7812, O2: 0.2096, Ar: 0.0092 }, T), air, 0.025, `${T} K`);
    }
  });

  it('agrees with the rule of Mason & Saxena, which is too high for a light gas in a heavy one', () => {
    const alike = { low: 0.95, high: 1.05 };
    const unlike = { low: 0.85, high: 1 };
    for (const [one, other, { low, high }] of [
      ['Ar', 'Kr', alike],
      ['N2', 'O2', alike],
      ['N2', 'CO2', alike],
      ['Ar', 'N2', alike],
      ['CH4', 'N2', alike],
      ['Ne', 'Xe', unlike],
      ['He', 'Xe', unlike],
      ['He', 'Ar', unlike],
      ['He', 'N2', unlike],
      ['H2', 'N2', unlike],
    ] as const) {
      for (const x of [0.1, 0.25, 0.5, 0.75, 0.9]) {
        for (const T of [250, 300, 600]) {
          const parts = { [one]: x, [other]: 1 - x };
          const ratio = conductivity(parts, T) / rule(parts, T);
          assert.ok(low < ratio && ratio < high, `${one} ${x} ${other} at ${T} K: ${ratio}`);
        }
      }
    }
  });

  it('is positive and finite from 1 K to 20000 K', () => {
    for (let T = 1; T < 2e4; T *= 1.3) {
      const value = conductivity({ H2: 0.1, SF6: 0.2, H2O: 0.3, He: 0.4 }, T);
      assert.ok(0 < value && value < Infinity, `${T} K`);
    }
  });
});

function closedForm(
  x1: number,
  [m1, m2]: readonly [number, number],
  [l1 = 0, l2 = 0]: readonly number[],
  l12: number,
  A: number,
  B: number,
): number {
  const x2 = 1 - x1;
  const b = (2.4 * B + 1) / 12;
  const differ = ((m1 - m2) * (m1 - m2)) / (m1 * m2);
  const total = ((m1 + m2) * (m1 + m2)) / (4 * m1 * m2);
  const u1 = (4 / 15) * A - (b * m1) / m2 + differ / 2;
  const u2 = (4 / 15) * A - (b * m2) / m1 + differ / 2;
  const uy = ((4 / 15) * A * total * l12 * l12) / (l1 * l2) - b - (5 / (32 * A)) * (2.4 * B - 5) * differ;
  const uz = (4 / 15) * A * (total * (l12 / l1 + l12 / l2) - 1) - b;
  const x = (x1 * x1) / l1 + (2 * x1 * x2) / l12 + (x2 * x2) / l2;
  const y = ((x1 * x1) / l1) * u1 + ((2 * x1 * x2) / l12) * uy + ((x2 * x2) / l2) * u2;
  const z = x1 * x1 * u1 + 2 * x1 * x2 * uz + x2 * x2 * u2;
  return (1 + z) / (x + y);
}
