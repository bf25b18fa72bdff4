import assert from 'node:assert/strict';
import { toSI, unitFactor } from '../../server/src/quantities/conversion';
import { unitOf } from '../../server/src/quantities/parseUnit';

describe('unit definitions', () => {
  // The number as printed, the unit, and where it is printed. Exact ones must be the nearest double.
  const exact = (unit: string, printed: string, source: string) =>
    it(`1 ${unit} is ${printed} (${source})`, () => assert.equal(unitFactor(unitOf(unit)), Number(printed)));

  exact('atm', '101325', '10th CGPM 1954, resolution 4');
  exact('bar', '1e5', 'NIST SP 811, B.8');
  exact('in', '0.0254', 'international yard and pound agreement 1959');
  exact('ft', '0.3048', 'international yard and pound agreement 1959');
  exact('mil', '2.54e-5', 'NIST SP 811, B.8, from memory');
  exact('lb', '0.45359237', 'international yard and pound agreement 1959; NIST SP 811, footnote 22');
  exact('eV', '1.602176634e-19', 'CODATA 2018');
  exact('u', '1.66053906660e-27', 'CODATA 2018');
  exact('cal', '4.184', 'NIST SP 811, B.8, calorie (th)');
  exact('BTU', '1055.05585262', 'NIST SP 811, footnote 9, Btu (IT)');
  exact('erg', '1e-7', 'NIST SP 811, B.8');
  exact('dyn', '1e-5', 'NIST SP 811, B.8, from memory');
  exact('dyn/cm²', '0.1', 'NIST SP 811, B.8, from memory');
  exact('P', '0.1', 'NIST SP 811, B.8, from memory');
  exact('cP', '1e-3', 'NIST SP 811, B.8, from memory');
  exact('Å', '1e-10', 'NIST SP 811, B.8, from memory');
  exact('at', '98066.5', 'NIST SP 811, B.8, from memory');
  exact('L', '1e-3', 'SI Brochure 9th ed., table 8');
  exact('min', '60', 'SI Brochure 9th ed., table 8');
  exact('h', '3600', 'SI Brochure 9th ed., table 8');
  exact('d', '86400', 'SI Brochure 9th ed., table 8');
  exact('mmHg', '133.322387415', 'NIST SP 811, B.8: 13.5951 g/cm³ at standard gravity');
  exact('°', '0.017453292519943295', 'SI Brochure 9th ed., table 8: π/180');

  // Printed with rounding: within half a unit of the last digit.
  const rounded = (unit: string, printed: string, source: string) =>
    it(`1 ${unit} is ${printed} (${source})`, () => {
      const [mantissa = '', exponent = '0'] = printed.split('e');
      const places = mantissa.split('.')[1]?.length ?? 0;
      const half = 0.5 * Number(`1e${Number(exponent) - places}`);
      assert.ok(Math.abs(unitFactor(unitOf(unit)) - Number(printed)) <= half, String(unitFactor(unitOf(unit))));
    });

  rounded('Torr', '1.333224e2', 'NIST SP 811, B.8');
  rounded('psi', '6.894757e3', 'NIST SP 811, B.8');
  rounded('inHg', '3.386389e3', 'NIST SP 811, B.8, conventional, from memory');
  rounded('D', '3.33564e-30', 'the usual rounding of 1e-18 statC·cm, from memory');

  it('makes 760 Torr one atmosphere (BIPM: the torr is 101325/760 Pa)', () => {
    assert.equal(toSI(760, unitOf('Torr')), 101325);
  });

  it('makes a round number of what is round', () => {
    const check = (value: number, unit: string, si: number) => assert.equal(toSI(value, unitOf(unit)), si);
    check(3e-3, 'mbar', 0.3);
    check(5, 'mm', 0.005);
    check(40, 'mm', 0.04);
    check(0.1, 'mm', 1e-4);
    check(90, 'µm', 9e-5);
    check(17.5, 'µPa·s', 17.5e-6);
    check(14, 'L', 0.014);
    check(20, 'L/s', 0.02);
    check(95, '%', 0.95);
    check(250, 'ppm', 250e-6);
    check(2e-8, 'mbar·L/(s·cm²)', 2e-5);
    check(28.0134, 'g/mol', 0.0280134);
    check(1, 'lb/lbmol', 0.001);
    check(36, 'km/h', 10);
  });
});
