import assert from 'node:assert/strict';
import { kineticErrors } from '../../server/src/physics/rarefied/kineticCoefficients';
import type { GasInPassage } from '../../server/src/physics/rarefied/longConductance';
import { longConductance } from '../../server/src/physics/rarefied/longConductance';
import { halfUnit, references } from '../support/reference';

/** Air at 20 °C: √(2kT/m), c̄ and the viscosity. */
const thermalSpeed = Math.sqrt((2 * 8.314462618 * 293.15) / 28.9647e-3);
const meanSpeed = (2 / Math.sqrt(Math.PI)) * thermalSpeed;
const viscosity = 18.2e-6;

/** A tube of 1 cm bore and 1 m length. */
const tube = {
  section: 'tube',
  size: 5e-3,
  width: 5e-3,
  length: 1,
  accommodation: 1,
  thermalSpeed,
  meanSpeed,
} as const;
const slit = {
  section: 'plates',
  size: 1e-3,
  width: 0.1,
  length: 0.1,
  accommodation: 1,
  thermalSpeed,
  meanSpeed,
} as const;
const rule = {
  source: 'common practice, no source',
  where: 'air at 20 °C, long tube of d = 1 cm',
};

references('conductances by the rules of thumb', [
  {
    ...rule,
    printed: '12.1',
    // C = 12.1 d³/L in L/s and cm
    got: () => 1e3 * 100 * of({ ...tube, rarefaction: 1e-9 }),
  },
  {
    ...rule,
    printed: '135',
    // C = 135 d⁴ p/L in L/s, cm and mbar; at 100 mbar slip no longer counts for much.
    got: () => (1e3 * 100 * of({ ...tube, rarefaction: (tube.size * 1e4) / (viscosity * thermalSpeed) })) / 100,
    within: { tolerance: halfUnit('135') + 0.5, because: 'slip still brings 0.3 % at 100 mbar' },
  },
]);

describe('the conductance of a tube or slit', () => {
  it('is that of Poiseuille in a dense gas', () => {
    const pressure = 1e9;
    const viscous = (size: number) => (size * pressure) / (viscosity * thermalSpeed);
    near(
      of({ ...tube, rarefaction: viscous(tube.size) }),
      (Math.PI * tube.size ** 4 * pressure) / (8 * viscosity * tube.length),
      1e-6,
    );
    near(
      of({ ...slit, rarefaction: viscous(slit.size) }),
      (slit.width * slit.size ** 3 * pressure) / (12 * viscosity * slit.length),
      1e-6,
    );
  });

  it('is Knudsen’s of a long tube where no molecule meets another, for any accommodation', () => {
    for (const accommodation of [1, 0.8, 0.2]) {
      const knudsen = ((2 * Math.PI) / 3) * tube.size ** 3 * meanSpeed * ((2 - accommodation) / accommodation);
      near(of({ ...tube, accommodation, rarefaction: 1e-12 }), knudsen, 1e-7);
    }
  });

  it('is W A c̄/4 with its ends where no molecule meets another', () => {
    // Clausing's factors of tubes, L/r = 2, 10, 50 (from memory), and of slits, L/h = 1, 10, 100 (from memory); any would do.
    for (const [ratio, W] of [
      [2, 0.5142],
      [10, 0.1909],
      [50, 0.0499],
    ] as const) {
      const short = { ...tube, length: ratio * tube.size, transmission: W, rarefaction: 1e-10 };
      near(of(short), (W * Math.PI * tube.size ** 2 * meanSpeed) / 4, 1e-8);
    }
    for (const [ratio, W] of [
      [1, 0.6848],
      [10, 0.24],
      [100, 0.0485],
    ] as const) {
      const short = { ...slit, length: ratio * slit.size, transmission: W, rarefaction: 1e-10 };
      near(of(short), (W * slit.width * slit.size * meanSpeed) / 4, 1e-6);
    }
  });

  it('seems longer by 3π/8 of the radius in a dense gas', () => {
    const short = { ...tube, length: 10 * tube.size, rarefaction: 1e7 };
    near(of(short) / of({ ...short, transmission: 0.1909 }), 1 + (3 * Math.PI) / 80, 1e-5);
  });

  it('has an uncertainty from its ends that vanishes where they are known or far away', () => {
    const error = (gas: GasInPassage) => found(gas).endsError;
    const short = { ...tube, length: 10 * tube.size, transmission: 0.1909 };
    assert.ok(error({ ...short, rarefaction: 1e-6 }) < 1e-6);
    assert.ok(error({ ...short, rarefaction: 1 }) > 0.02);
    assert.ok(error({ ...short, rarefaction: 1e4 }) < 0.01);
    assert.ok(error({ ...tube, rarefaction: 1 }) < 0.02);
    assert.ok(error({ ...tube, length: tube.size, rarefaction: 1 }) > 0.5);
  });

  it('changes without a seam from the molecular end to the viscous one', () => {
    for (const [gas, transmission] of [
      [tube, 0.0499],
      [slit, 0.0485],
    ] as const) {
      const flows = Array.from({ length: 1200 }, (_, i) =>
        Math.log(of({ ...gas, transmission, length: 50 * gas.size, rarefaction: 1e-9 * 1.02 ** i })),
      );
      const steps = flows.slice(1).map((value, i) => value - (flows[i] ?? NaN));
      steps.slice(1).forEach((step, i) => assert.ok(Math.abs(step - (steps[i] ?? NaN)) < 2e-4, `${gas.section} ${i}`));
    }
  });
});

describe('the stated error of the collision model', () => {
  it('vanishes at both ends for Poiseuille flow, and grows with what the model leaves out for creep', () => {
    const coefficients = { poiseuille: 1.5, thermalCreep: 0.7, beyondViscous: 1.5 };
    assert.ok(kineticErrors(coefficients, 1e-6, 'atoms').poiseuille < 1e-3);
    assert.ok(kineticErrors({ ...coefficients, poiseuille: 250, beyondViscous: 1 }, 1e3, 'atoms').poiseuille < 1e-3);
    const creep = (['atoms', 'molecules', 'mixture'] as const).map(
      (of) => kineticErrors(coefficients, 1, of).thermalCreep,
    );
    assert.deepEqual([...creep].sort(), creep);
  });
});

function found(gas: GasInPassage) {
  const outcome = longConductance(gas);
  assert.ok(outcome.ok);
  return outcome.value;
}

function of(gas: GasInPassage): number {
  return found(gas).conductance;
}

function near(value: number, expected: number, relative: number): void {
  assert.ok(Math.abs(value - expected) <= relative * Math.abs(expected), `${value} differs from ${expected}`);
}
