import assert from 'node:assert/strict';
import fc from 'fast-check';
import { chooseUnit } from '../../server/src/quantities/chooseUnit';
import { formatNumber, formatQuantity, formatWithTolerance } from '../../server/src/quantities/format';
import { unitOf } from '../../server/src/quantities/parseUnit';
import { kindNamed, quantityKinds } from '../../server/src/quantities/quantityKinds';

describe('numbers', () => {
  const check = (value: number, digits: number, text: string) => assert.equal(formatNumber(value, digits), text);

  it('keep their significant digits', () => {
    check(22.3, 4, '22.30');
    check(22.3, 3, '22.3');
    check(1, 4, '1.000');
    check(-0.5, 2, '-0.50');
    check(1013.25, 4, '1013');
    check(1013.25, 3, '1010');
    check(12345.6, 4, '12350');
    check(0, 4, '0');
    check(-0, 4, '0');
  });

  it('leave plain notation where it would be long', () => {
    check(0.001, 3, '0.00100');
    check(0.00099, 3, '9.90e-4');
    check(0.00099999, 3, '0.00100');
    check(99990, 4, '99990');
    check(99999.6, 4, '1.000e5');
    check(1.23456e-6, 3, '1.23e-6');
    check(7.243e22, 4, '7.243e22');
    check(-3.2e-9, 2, '-3.2e-9');
  });

  it('never write what is no number', () => {
    for (const value of [NaN, Infinity, -Infinity]) check(value, 4, '–');
    assert.equal(formatQuantity(NaN, unitOf('mm')), '–');
    assert.equal(formatQuantity(1e308, unitOf('fm')), '–');
    assert.equal(formatWithTolerance(NaN, 1, unitOf('mm')), '–');
    assert.equal(formatWithTolerance(1, Infinity, unitOf('m')), '1.000 m');
  });

  it('read back as what was meant, to the digits shown', () => {
    fc.assert(
      fc.property(
        fc.double({ noNaN: true, noDefaultInfinity: true }),
        fc.integer({ min: 1, max: 12 }),
        (value, digits) => {
          const text = formatNumber(value, digits);
          assert.match(text, /^(0|-?\d+(\.\d+)?(e-?\d+)?)$/);
          assert.equal(Number(text), Number(value.toPrecision(digits)) + 0);
        },
      ),
    );
  });
});

describe('quantities', () => {
  const check = (si: number, unit: string, text: string) => assert.equal(formatQuantity(si, unitOf(unit)), text);

  it('stand a space before their unit, but for the degree of angle', () => {
    check(0.0223, 'mm', '22.30 mm');
    check(294.15, '°C', '21.00 °C');
    check(0.95, '%', '95.00 %');
    check(Math.PI / 2, 'deg', '90.00°');
    check(0.5, '1', '0.5000');
    check(2.686780111e25, '1/cm³', '2.687e19 1/cm³');
  });
});

describe('quantities with tolerance', () => {
  const check = (si: number, tolerance: number, unit: string, text: string) =>
    assert.equal(formatWithTolerance(si, tolerance, unitOf(unit)), text);

  it('show two digits of the tolerance and the value to the same place', () => {
    check(0.0223, 0.0023, 'mm', '22.3 ± 2.3 mm');
    check(0.0223, 0.00023, 'mm', '22.30 ± 0.23 mm');
    check(0.0223, 0.023, 'mm', '22 ± 23 mm');
    check(-0.0223, 0.0023, 'mm', '-22.3 ± 2.3 mm');
    check(294.15, 2, '°C', '21.0 ± 2.0 °C');
    check(0.1, 0.01, '%', '10.0 ± 1.0 %');
    check(0, 2, 'm', '0.0 ± 2.0 m');
    check(22304, 230, 'm', '22300 ± 230 m');
    check(Math.PI / 2, Math.PI / 180, '°', '90.0 ± 1.0°');
  });

  it('share the exponent', () => {
    check(0.3, 0.03, 'mbar', '(3.00 ± 0.30)e-3 mbar');
    check(2.69e25, 1e23, '1/m³', '(2.690 ± 0.010)e25 1/m³');
    check(0, 2e-6, 'm', '(0.0 ± 2.0)e-6 m');
  });

  it('carry a rounding into the next digit', () => {
    check(0.0223, 0.000996, 'mm', '22.3 ± 1.0 mm');
    check(0.09999996, 0.0023, 'mm', '100.0 ± 2.3 mm');
    check(9.9999e-7, 1e-9, 'm', '(1.0000 ± 0.0010)e-6 m');
  });

  it('leave a tolerance alone that is none, or far below the digits shown', () => {
    check(0.0223, 0, 'mm', '22.30 mm');
    check(1, 1e-12, 'm', '1.000 ± 1.0e-12 m');
  });

  it('are text for any two numbers', () => {
    fc.assert(
      fc.property(fc.double(), fc.double(), fc.constantFrom('mm', '°C', '%', 'sccm'), (si, tolerance, unit) => {
        assert.doesNotMatch(formatWithTolerance(si, tolerance, unitOf(unit)), /NaN|Infinity|undefined/);
      }),
    );
  });
});

describe('the unit for automatic display', () => {
  const check = (si: number, kind: string, unit: string) => assert.equal(chooseUnit(si, kindNamed(kind)!).text, unit);

  it('keeps the number between 1 and 1000', () => {
    check(5e-5, 'length', 'µm');
    check(0.0223, 'length', 'mm');
    check(1, 'length', 'm');
    check(0.3, 'pressure', 'mPa');
    check(-2500, 'pressure', 'kPa');
    check(90, 'time', 'min');
    check(0.02, 'conductance', 'L/s');
    check(0, 'length', 'm');
    check(NaN, 'length', 'm');
    check(1e-20, 'length', 'pm');
  });

  it('is of the right dimension, whatever the number', () => {
    for (const kind of quantityKinds) {
      for (let exponent = -30; exponent <= 30; exponent++) {
        assert.equal(chooseUnit(Number(`1e${exponent}`), kind).dimension, kind.dimension, kind.name);
      }
    }
  });
});
