import assert from 'node:assert/strict';
import { unitFactor } from '../../server/src/quantities/conversion';
import { dimension, dimensionless, powerDimension } from '../../server/src/quantities/dimension';
import { unitOf } from '../../server/src/quantities/parseUnit';
import {
  describeDimension,
  describeUnit,
  kindNamed,
  kindsOf,
  quantityKinds,
} from '../../server/src/quantities/quantityKinds';

describe('kinds of quantity', () => {
  it('are told in coherent SI units', () => {
    for (const { name, unit, dimension: of } of quantityKinds) {
      assert.equal(unitFactor(unitOf(unit)), 1, name);
      assert.equal(unitOf(unit).dimension, of, name);
      assert.equal(unitOf(unit).text, unit, `${name}: canonical spelling`);
    }
  });

  it('have usual units of their own dimension, spelled canonically', () => {
    for (const { name, usual, ladder, dimension: of } of quantityKinds) {
      for (const text of [...usual, ...ladder]) {
        assert.equal(unitOf(text).dimension, of, `${name}: ${text}`);
        assert.equal(unitOf(text).text, text, `${name}: ${text}`);
      }
    }
  });

  it('climb their ladder', () => {
    for (const { name, ladder } of quantityKinds) {
      const factors = ladder.map((text) => unitFactor(unitOf(text)));
      assert.deepEqual(
        factors,
        [...factors].sort((a, b) => a - b),
        name,
      );
    }
  });

  it('have one name each', () => {
    assert.equal(new Set(quantityKinds.map((kind) => kind.name)).size, quantityKinds.length);
    assert.equal(kindNamed('pressure')?.unit, 'Pa');
    assert.equal(kindNamed('preassure'), undefined);
  });

  it('come with the most general one first', () => {
    const check = (unit: string, ...names: string[]) =>
      assert.deepEqual(
        kindsOf(unitOf(unit).dimension).map((kind) => kind.name),
        names,
      );
    check('W', 'throughput', 'power');
    check('1/s', 'frequency', 'molecule_flow');
    check('L/s', 'volume_flow', 'conductance', 'pumping_speed');
    check('%', 'number', 'fraction', 'angle');
    check('kg²', ...[]);
  });
});

describe('words for dimensions', () => {
  it('name the kind, or the coherent unit', () => {
    assert.equal(describeDimension(unitOf('mbar').dimension), 'a pressure');
    assert.equal(describeDimension(unitOf('mm').dimension), 'a length');
    assert.equal(describeDimension(unitOf('eV').dimension), 'an energy');
    assert.equal(describeDimension(dimensionless), 'a number');
    assert.equal(describeDimension(dimension({ mass: 1, length: -3, time: 1 })), 'a quantity in kg·m⁻³·s');
  });

  it('go by the unit where kinds share a dimension', () => {
    const check = (unit: string, words: string) => assert.equal(describeUnit(unitOf(unit)), words);
    check('mbar·L/s', 'a throughput');
    check('kW', 'a power');
    check('W/m²', 'a heat flux');
    check('mbar·L/(s·cm²)', 'an outgassing rate');
    check('%', 'a fraction');
    check('°', 'an angle');
    check('1', 'a number');
    check('Hz', 'a frequency');
    check('kg²', 'a quantity in kg²');
  });
});

describe('dimensions', () => {
  it('are one object each, roots included', () => {
    const area = dimension({ length: 2 });
    assert.equal(powerDimension(area, 0.5), dimension({ length: 1 }));
    assert.equal(powerDimension(powerDimension(area, 1 / 3), 3), area);
    assert.equal(powerDimension(area, 0), dimensionless);
    assert.equal(powerDimension(dimension({ time: -1 }), -1).exponents[0], 0);
  });
});
