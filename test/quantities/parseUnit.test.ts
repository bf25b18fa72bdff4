import assert from 'node:assert/strict';
import fc from 'fast-check';
import { coherentUnitText } from '../../server/src/quantities/dimension';
import type { UnitFault } from '../../server/src/quantities/parseUnit';
import { parseUnit, unitOf } from '../../server/src/quantities/parseUnit';
import { allSpellings } from '../../server/src/quantities/unitSpellings';

describe('unit text', () => {
  const check = (text: string, canonical: string, dimension: string) => {
    const unit = unitOf(text);
    assert.equal(unit.text, canonical, text);
    assert.equal(coherentUnitText(unit.dimension), dimension, text);
  };

  it('reads what the trade writes, and writes it one way', () => {
    check('mbar·L/s', 'mbar·L/s', 'kg·m²·s⁻³');
    check('mbar*l/s', 'mbar·L/s', 'kg·m²·s⁻³');
    check('mbar·L/s/cm²', 'mbar·L/(s·cm²)', 'kg·s⁻³');
    check('mbar·L/(s·cm2)', 'mbar·L/(s·cm²)', 'kg·s⁻³');
    check('W/(m*K)', 'W/(m·K)', 'kg·m·s⁻³·K⁻¹');
    check('uPa*s', 'µPa·s', 'kg·m⁻¹·s⁻¹');
    check('ohm', 'Ω', 'kg·m²·s⁻³·A⁻²');
    check('kohm', 'kΩ', 'kg·m²·s⁻³·A⁻²');
    check('degC', '°C', 'K');
    check('deg', '°', '1');
    check('g/mol', 'g/mol', 'kg·mol⁻¹');
    check('%', '%', '1');
    check('1', '1', '1');
  });

  it('reads exponents in every form', () => {
    check('cm3', 'cm³', 'm³');
    check('cm^3', 'cm³', 'm³');
    check('cm³', 'cm³', 'm³');
    check('s^-1', 's⁻¹', 's⁻¹');
    check('s⁻¹', 's⁻¹', 's⁻¹');
    check('1/s', '1/s', 's⁻¹');
    check('m^-12', 'm⁻¹²', 'm⁻¹²');
    check('m⁻¹²', 'm⁻¹²', 'm⁻¹²');
    check('m^(1/2)', 'm^(1/2)', 'm^(1/2)');
    check('m^(-2/3)', 'm^(-2/3)', 'm^(-2/3)');
    check('m1', 'm', 'm');
  });

  it('reads products from the left', () => {
    check('m/s·kg', 'm·kg/s', 'kg·m·s⁻¹');
    check('m/s/kg', 'm/(s·kg)', 'kg⁻¹·m·s⁻¹');
    check('m/(s/kg)', 'm·kg/s', 'kg·m·s⁻¹');
    check('(m/s)²', 'm²/s²', 'm²·s⁻²');
    check('1/(m²·s)', '1/(m²·s)', 'm⁻²·s⁻¹');
    check('W·m⁻¹·K⁻¹', 'W·m⁻¹·K⁻¹', 'kg·m·s⁻³·K⁻¹');
  });

  it('reads back every dimension as written in base units', () => {
    for (const { text } of allSpellings) {
      const { dimension } = unitOf(text);
      assert.equal(unitOf(coherentUnitText(dimension)).dimension, dimension);
      assert.equal(unitOf(coherentUnitText(dimension)).factor, 1);
    }
  });

  it('gives the same object for the same text', () => assert.equal(parseUnit('mbar·L/s'), parseUnit('mbar·L/s')));

  it('knows where each factor stands', () => {
    const places = unitOf('mbar·L/(s·cm²)').parts.map(({ start, end, power }) => [start, end, power]);
    assert.deepEqual(places, [
      [0, 4, 1],
      [5, 6, 1],
      [8, 9, -1],
      [10, 12, -2],
    ]);
  });
});

describe('unit faults', () => {
  const check = (text: string, expected: Partial<Record<string, unknown>>) => {
    const result = parseUnit(text);
    assert.ok(!result.ok, text);
    const fault: Partial<Record<string, unknown>> = { ...result.fault };
    for (const [key, value] of Object.entries(expected)) assert.deepEqual(fault[key], value, `${text}: ${key}`);
  };
  const unknown = (text: string, ...nearest: string[]) => check(text, { kind: 'unknown', nearest });
  const malformed = (text: string, start: number, end: number) => check(text, { kind: 'malformed', start, end });

  it('suggest what differs in case only, then what people call the unit', () => {
    unknown('torr', 'Torr');
    unknown('MBAR', 'mbar');
    unknown('PSI', 'psi');
    unknown('SCCM', 'sccm');
    unknown('sec', 's');
    unknown('micron', 'µm', 'mTorr');
    unknown('lpm', 'L/min', 'slm');
    unknown('degK', 'K');
    unknown('℃', '°C');
    unknown('furlong');
  });

  it('suggest only units that are units', () => {
    const words = ['kpa', 'Sccm', 'mtor', 'mBar', 'liter', 'cfm', 'TorrL', 'deg_C', 'nM', 'Kelvin', 'amu', 'ul'];
    for (const word of words) {
      const result = parseUnit(word);
      if (result.ok || result.fault.kind !== 'unknown') continue;
      assert.ok(result.fault.nearest.length <= 3);
      for (const text of result.fault.nearest) assert.ok(parseUnit(text).ok, `${word}: ${text}`);
    }
  });

  it('name the factor and its place', () => {
    check('mbar·X/s', { kind: 'unknown', name: 'X', start: 5, end: 6 });
    check('W/(m·degC)', { kind: 'offset-in-product', name: 'degC', start: 5, end: 9 });
    check('°F²', { kind: 'offset-in-product', name: '°F', start: 0, end: 2 });
    check('psig·L/s', { kind: 'gauge-in-product', name: 'psig', start: 0, end: 4 });
  });

  it('point at what cannot be read', () => {
    malformed('', 0, 0);
    malformed('s-1', 1, 2);
    malformed('m/', 2, 2);
    malformed('m//s', 2, 3);
    malformed('(m', 2, 2);
    malformed('m)', 1, 2);
    malformed('m s', 1, 2);
    malformed('m^', 1, 2);
    malformed('m^0', 1, 3);
    malformed('m2²', 2, 3);
    malformed('2m', 0, 1);
    malformed('m/2', 2, 3);
    malformed('m^1.5', 3, 4);
    malformed('Qm^24', 0, 5);
    malformed('('.repeat(50) + 'm' + ')'.repeat(50), 8, 9);
  });
});

describe('any text', () => {
  const inside = (text: string, fault: UnitFault) =>
    assert.ok(fault.start >= 0 && fault.start <= fault.end && fault.end <= text.length);

  it('is a unit or a fault that lies inside it', () => {
    const nearlyUnit = fc
      .array(
        fc.constantFrom(
          'mbar',
          'L',
          's',
          'cm',
          '°C',
          'psig',
          'µ',
          '·',
          '*',
          '/',
          '(',
          ')',
          '^',
          '-',
          '1',
          '2',
          '²',
          '⁻¹',
          ' ',
          'x',
          '^(1/2)',
        ),
        { maxLength: 14 },
      )
      .map((pieces) => pieces.join(''));
    fc.assert(
      fc.property(fc.oneof(nearlyUnit, fc.string({ unit: 'binary' }), fc.string({ maxLength: 400 })), (text) => {
        const result = parseUnit(text);
        if (result.ok) assert.ok(Number.isFinite(result.unit.factor) && result.unit.factor > 0);
        else inside(text, result.fault);
      }),
      { numRuns: 3000 },
    );
  });

  it('that is a unit reads back as the same one from its canonical spelling', () => {
    const factor = fc.tuple(
      fc.constantFrom(...allSpellings.filter(({ row }) => row.kind === 'plain' || row.kind === 'standard-flow')),
      fc.constantFrom('', '', '', '2', '^-1', '³', '⁻²', '^(1/2)'),
    );
    const product = fc
      .tuple(factor, fc.array(fc.tuple(fc.constantFrom('·', '*', '/', '/('), factor), { maxLength: 4 }))
      .map(([[first, power], rest]) => {
        const closing = ')'.repeat(rest.filter(([mark]) => mark === '/(').length);
        return first.text + power + rest.map(([mark, [next, raised]]) => mark + next.text + raised).join('') + closing;
      });
    fc.assert(
      fc.property(product, (text) => {
        const result = parseUnit(text);
        // A tower of powers can leave the range of doubles, which is a fault.
        fc.pre(result.ok);
        assert.ok(result.ok);
        const again = unitOf(result.unit.text);
        assert.equal(again.text, result.unit.text);
        assert.equal(again.dimension, result.unit.dimension);
        assert.ok(Math.abs(again.factor / result.unit.factor - 1) < 1e-13);
      }),
      { numRuns: 2000 },
    );
  });
});
