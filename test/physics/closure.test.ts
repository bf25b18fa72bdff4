import assert from 'node:assert/strict';
import { kelvin, kilogramPerCubicMetre, pascal, perCubicMetre } from '../../server/src/physics/brands';
import {
  compositionOfMasses,
  compositionOfMoles,
  massFractions,
  meanMolarMass,
  pure,
} from '../../server/src/physics/composition';
import { solveState } from '../../server/src/physics/state/closure';
import { figures, gas, mixture, near, valueOf, whole } from '../support/gases';

describe('closure', () => {
  const air = pure(gas('air'));
  const point = valueOf(solveState(air, { temperature: kelvin(250), pressure: pascal(7) }));
  const density = kilogramPerCubicMetre(whole(figures('air', 250, 7), 'density'));

  it('gives the same state from every pair that fixes it', () => {
    const pairs = [
      { pressure: point.pressure, numberDensity: point.numberDensity },
      { temperature: point.temperature, numberDensity: point.numberDensity },
      { pressure: point.pressure, density },
      { temperature: point.temperature, density },
    ];
    for (const pair of pairs) {
      const solved = valueOf(solveState(air, pair));
      near(solved.temperature, 250, 1e-14);
      near(solved.pressure, 7, 1e-14);
      near(solved.numberDensity, point.numberDensity, 1e-14);
    }
  });

  const check = (inputs: Parameters<typeof solveState>[1], kind: string) => {
    const outcome = solveState(air, inputs);
    assert.ok(!outcome.ok, JSON.stringify(outcome));
    assert.equal(outcome.reason.kind, kind);
  };

  it('says why there is no state', () => {
    check({}, 'insufficient');
    check({ pressure: pascal(1) }, 'insufficient');
    check({ numberDensity: perCubicMetre(1e20), density: kilogramPerCubicMetre(1) }, 'insufficient');
    check({ pressure: pascal(1), temperature: kelvin(300), numberDensity: perCubicMetre(1) }, 'surplus');
    check({ pressure: pascal(-1), temperature: kelvin(300) }, 'not-positive');
    check({ pressure: pascal(1), temperature: kelvin(0) }, 'not-positive');
    check({ pressure: pascal(NaN), temperature: kelvin(300) }, 'not-finite');
    check({ pressure: pascal(Infinity), temperature: kelvin(300) }, 'not-finite');
    check({ pressure: pascal(1e300), temperature: kelvin(1e-300) }, 'not-finite');
  });
});

describe('composition', () => {
  const species = ['He', 'SF6', 'N2'].map(gas);

  it('turns mole into mass fractions and back', () => {
    const moles = valueOf(compositionOfMoles(species, [0.2, 0.3, 0.5]));
    const back = valueOf(compositionOfMasses(species, massFractions(moles)));
    back.moleFractions.forEach((x, i) => near(x, moles.moleFractions[i]!, 1e-14));
    near(meanMolarMass(moles), 0.2 * 4.002602e-3 + 0.3 * 146.05e-3 + 0.5 * 28.014e-3, 1e-14);
  });

  it('of dry air adds up, in sum and in molar mass', () => {
    const parts = gas('air').blend!.value;
    near(
      Object.values(parts).reduce((a, b) => a + b, 0),
      1,
      1e-12,
    );
    near(meanMolarMass(mixture(parts)), gas('air').molarMass.value, 2e-4);
  });

  it('refuses fractions that do not add up, or are below nought', () => {
    const kind = (fractions: number[]) => {
      const outcome = compositionOfMoles(species, fractions);
      return outcome.ok ? 'ok' : outcome.reason.kind;
    };
    assert.equal(kind([0.2, 0.3, 0.4]), 'fraction-sum');
    assert.equal(kind([0.2, 0.8]), 'fraction-sum');
    assert.equal(kind([-0.2, 0.7, 0.5]), 'not-positive');
    assert.equal(kind([NaN, 0.5, 0.5]), 'not-positive');
    const empty = compositionOfMoles([], []);
    assert.ok(!empty.ok && empty.reason.kind === 'empty-composition');
  });
});
