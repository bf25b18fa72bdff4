import assert from 'node:assert/strict';
import { R } from '../../server/src/physics/constants';
import { speciesList } from '../../server/src/physics/species/list';
import { heatCapacityRange, molarHeatCapacity } from '../../server/src/physics/thermo/heatCapacity';
import { gas } from '../support/gases';

const cp = (name: string, T: number) => molarHeatCapacity(gas(name).heatCapacity!.value, T);

describe('heat capacity', () => {
  const known = speciesList.filter((species) => species.heatCapacity !== undefined);

  it('joins its intervals and stands still beyond its ends', () => {
    for (const { formula, heatCapacity } of known) {
      const { low, high } = heatCapacityRange(heatCapacity!.value);
      assert.ok(Math.abs(cp(formula, 1000 * (1 + 1e-9)) / cp(formula, 1000) - 1) < 2e-3, formula);
      assert.equal(cp(formula, low / 2), cp(formula, low));
      if (high < Infinity) assert.equal(cp(formula, 2 * high), cp(formula, high));
    }
  });

  it('of normal deuterium freezes out in the cold: only the ortho levels still turn', () => {
    assert.ok(Math.abs(cp('D2', 10) / (2.5 * R) - 1) < 1e-3);
    assert.ok(cp('D2', 60) < 3.5 * R);
  });

  it('exceeds translation, and that of molecules exceeds rotation at room temperature', () => {
    for (const { formula, heatCapacity } of known) {
      const least = heatCapacity!.value.kind === 'monatomic' ? 2.5 : 3.4;
      for (const T of [298.15, 500, 1000, 1500]) assert.ok(least * R <= cp(formula, T), `${formula} at ${T} K`);
    }
  });
});
