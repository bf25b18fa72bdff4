import assert from 'node:assert/strict';
import fc from 'fast-check';
import {
  fromSI,
  fromSIDifference,
  standardReference,
  toSI,
  toSIDifference,
  unitFactor,
} from '../../server/src/quantities/conversion';
import { unitOf } from '../../server/src/quantities/parseUnit';

const celsius = unitOf('°C');
const fahrenheit = unitOf('°F');
const sccm = unitOf('sccm');

describe('offset temperatures', () => {
  it('are absolute when converted as values', () => {
    const check = (value: number, unit: string, kelvin: number) => assert.equal(toSI(value, unitOf(unit)), kelvin);
    check(0, '°C', 273.15); // SI Brochure, 9th edition, 2.3.1
    check(-273.15, '°C', 0);
    check(21, '°C', 294.15);
    check(100, 'degC', 373.15);
    check(32, '°F', 273.15); // NIST SP 811, B.8: T/K = (t/°F + 459.67)/1.8
    check(212, '°F', 373.15);
    check(-459.67, 'degF', 0);
    check(491.67, '°R', 273.15);
  });

  it('meet at −40', () => assert.equal(toSI(-40, celsius), toSI(-40, fahrenheit)));

  it('are scaled only when converted as differences', () => {
    assert.equal(toSIDifference(5, celsius), 5);
    assert.equal(toSIDifference(9, fahrenheit), 5);
    assert.equal(fromSIDifference(5, fahrenheit), 9);
    assert.equal(fromSIDifference(5, unitOf('mm')), 5000);
  });

  it('tell their zero in kelvin', () => {
    assert.equal(celsius.zero, 273.15);
    assert.equal(fahrenheit.zero, 459.67 / 1.8);
    assert.equal(unitOf('°R').zero, undefined);
  });
});

describe('gauge pressures', () => {
  it('keep their kind, and convert by scale alone', () => {
    assert.equal(unitOf('psig').kind, 'gauge');
    assert.equal(toSI(2, unitOf('barg')), 2e5);
    assert.equal(unitFactor(unitOf('psig')), unitFactor(unitOf('psi')));
  });
});

describe('standard flows', () => {
  it('follow the molar volume of CODATA 2018, 22.413 969 54 L/mol at 273.15 K and 101.325 kPa', () => {
    const molarVolume = toSI(1, unitOf('slm')) * 60; // mol in one standard litre
    assert.ok(Math.abs(1 / molarVolume - 22.41396954) < 1e-8);
  });

  it('follow the molar volume of CODATA 2018, 22.710 954 64 L/mol at 273.15 K and 100 kPa', () => {
    const reference = { temperature: 273.15, pressure: 1e5 };
    assert.ok(Math.abs(1 / (toSI(1, unitOf('slm'), reference) * 60) - 22.71095464) < 1e-8);
  });

  it('grow with the pressure and fall with the temperature of the reference', () => {
    const warm = { temperature: 293.15, pressure: 101325 };
    const ratio = unitFactor(sccm, standardReference) / unitFactor(sccm, warm);
    assert.ok(Math.abs(ratio - 293.15 / 273.15) < 1e-14);
    assert.ok(Math.abs(fromSI(toSI(50, sccm, warm), sccm, warm) - 50) < 1e-13);
  });

  it('stand in products', () => {
    const warm = { temperature: 300, pressure: 1e5 };
    const density = unitFactor(unitOf('sccm/cm²'), warm);
    assert.ok(Math.abs(density / (unitFactor(sccm, warm) * 1e4) - 1) < 1e-15);
    assert.equal(unitOf('sccm/cm²').kind, 'standard-flow');
    // Twice over, the reference cancels.
    assert.equal(unitFactor(unitOf('slm/sccm'), warm), 1000);
    assert.equal(unitOf('slm/sccm').kind, 'plain');
  });
});

describe('conversion of any number', () => {
  it('comes back within a few units of the last place', () => {
    const names = ['mbar·L/s', 'Torr', 'psi', 'm³/h', 'sccm', 'eV', 'D', '°', 'BTU/(h·ft·°R)', 'lb/ft³', 'mm'];
    fc.assert(
      fc.property(fc.constantFrom(...names), fc.double({ min: -1e100, max: 1e100, noNaN: true }), (name, value) => {
        const unit = unitOf(name);
        const back = fromSI(toSI(value, unit), unit);
        // Values near the smallest doubles lose digits in any unit.
        assert.ok(Math.abs(back - value) <= 1e-15 * Math.abs(value) + 1e-280);
      }),
    );
  });
});
