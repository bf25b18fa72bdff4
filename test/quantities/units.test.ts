import assert from 'node:assert/strict';
import { fromSI, toSI, unitFactor } from '../../server/src/quantities/conversion';
import { parseUnit, unitOf } from '../../server/src/quantities/parseUnit';
import { prefixes } from '../../server/src/quantities/prefixes';
import { allSpellings } from '../../server/src/quantities/unitSpellings';
import { units } from '../../server/src/quantities/units';

describe('unit rows', () => {
  it('have no two spellings in common, prefixes included', () => {
    const seen = new Map<string, string>();
    const collisions = allSpellings.flatMap(({ text, canonical }) => {
      const other = seen.get(text);
      seen.set(text, canonical);
      return other === undefined ? [] : [`${text}: ${other} and ${canonical}`];
    });
    assert.deepEqual(collisions, []);
  });

  it('keep the spellings that a freer use of prefixes would take away', () => {
    const check = (text: string, rowSymbol: string, prefixName?: string) => {
      const [part] = unitOf(text).parts;
      assert.equal(part?.row.symbol, rowSymbol, text);
      assert.equal(part.prefix?.name, prefixName, text);
    };
    check('min', 'min');
    check('cd', 'cd');
    check('Pa', 'Pa');
    check('ft', 'ft');
    check('at', 'at');
    check('mil', 'mil');
    check('mol', 'mol');
    check('kat', 'kat');
    check('dyn', 'dyn');
    check('h', 'h');
    check('u', 'u');
    check('T', 'T');
    check('P', 'P');
    check('atm', 'atm');
    check('cc', 'cc');
    check('das', 's', 'deca');
    check('mm', 'm', 'milli');
    check('Mm', 'm', 'mega');
    check('Pm', 'm', 'peta');
    check('mP', 'P', 'milli');
    check('mPa', 'Pa', 'milli');
    check('um', 'm', 'micro');
    check('\u03BCm', 'm', 'micro');
    check('ml', 'L', 'milli');
  });

  it('tell their meaning, and a source or that there is none', () => {
    for (const row of units) {
      assert.ok(row.meaning.length >= 3, row.symbol);
      assert.ok(row.source.length > 8, row.symbol);
    }
  });

  it('have prefixes that exist', () => {
    const symbols = new Set(prefixes.map((prefix) => prefix.symbol));
    for (const { symbol, prefixes: allowed } of units) {
      if (typeof allowed !== 'string')
        assert.ok(
          allowed.every((each) => symbols.has(each)),
          symbol,
        );
    }
  });

  it('read and write back, in every spelling', () => {
    for (const { text, canonical } of allSpellings) {
      const unit = unitOf(text);
      assert.equal(unit.text, canonical);
      const again = unitOf(unit.text);
      assert.deepEqual(
        [again.text, again.factor, again.zero, again.kind],
        [canonical, unit.factor, unit.zero, unit.kind],
      );
      assert.equal(again.dimension, unit.dimension);
    }
  });

  it('convert there and back', () => {
    for (const { text } of allSpellings) {
      for (const value of [1, 273.15, 1.2345e-3, 9.87e4]) {
        const unit = unitOf(text);
        const back = fromSI(toSI(value, unit), unit);
        const tolerance = unit.kind === 'offset' ? 3e-13 : 1e-15 * value * 4;
        assert.ok(Math.abs(back - value) <= tolerance, `${value} ${text} comes back as ${back}`);
      }
    }
  });

  it('have an ASCII spelling each', () => {
    const ascii = new Set(allSpellings.filter(({ text }) => /^[\x20-\x7e]+$/.test(text)).map((each) => each.canonical));
    const without = allSpellings.filter(({ canonical }) => !ascii.has(canonical)).map((each) => each.canonical);
    assert.deepEqual(without, []);
  });

  it('never read a word that is only a suggestion', () => {
    for (const word of units.flatMap((row) => row.words)) assert.ok(!parseUnit(word).ok, word);
  });
});

describe('SI prefixes', () => {
  // SI Brochure, 9th edition, table 7, with the four of the 27th CGPM (2022), resolution 3.
  const check = (symbol: string, exponent: number) =>
    assert.equal(unitFactor(unitOf(`${symbol}m`)), Number(`1e${exponent}`), symbol);

  it('have the powers of the SI Brochure', () => {
    const up = ['da', 'h', 'k', 'M', 'G', 'T', 'P', 'E', 'Z', 'Y', 'R', 'Q'];
    const down = ['d', 'c', 'm', 'µ', 'n', 'p', 'f', 'a', 'z', 'y', 'r', 'q'];
    const exponents = [1, 2, 3, 6, 9, 12, 15, 18, 21, 24, 27, 30];
    exponents.forEach((exponent, i) => {
      check(up[i]!, exponent);
      check(down[i]!, -exponent);
    });
    assert.equal(prefixes.length, up.length + down.length);
  });
});
