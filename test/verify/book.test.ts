import assert from 'node:assert/strict';
import { speciesByName } from '../../server/src/physics/species/list';
import { aims } from '../../server/src/verify/aims';
import { book } from '../../server/src/verify/book';
import type { Comparison } from '../../server/src/verify/compare';
import { compare, compareBook } from '../../server/src/verify/compare';
import type { ReferenceRow } from '../../server/src/verify/row';
import { summarise } from '../../server/src/verify/summary';

describe('the reference book', () => {
  for (const { title, rows } of book) {
    describe(title, () => {
      for (const row of rows) {
        it(`${row.property} ${row.printed} ${row.unit} (${row.source}, ${row.where})`, () => {
          const { verdict, ours, tolerance } = compare(row);
          assert.equal(verdict, 'within', `${ours} differs from ${row.printed} by more than ${tolerance}`);
        });
      }
    });
  }
});

describe('the pages of the reference book', () => {
  const rows = book.flatMap((page) => page.rows);

  it('name their sources and places, and gases that there are', () => {
    assert.ok(rows.length >= 549);
    for (const { printed, source, where, gas } of rows) {
      assert.ok(Number.isFinite(Number(printed)) && source !== '' && where !== '', where);
      for (const name of typeof gas === 'string' ? [gas] : Object.keys(gas)) assert.ok(speciesByName(name), name);
    }
    assert.equal(new Set(book.map(({ title }) => title)).size, book.length);
  });

  it('hold each value once', () => {
    const keys = rows.map(({ property, of = '', source, where, printedAs = '' }) => {
      return [property, of, source, where, printedAs].join('|');
    });
    assert.deepEqual(
      keys.filter((key, at) => keys.indexOf(key) !== at),
      [],
    );
  });
});

describe('a comparison', () => {
  const row: ReferenceRow = {
    property: 'viscosity',
    gas: 'N2',
    temperature: 300,
    pressure: 1e5,
    printed: '17.8771',
    unit: 'µPa·s',
    source: 'Lemmon & Jacobsen 2004',
    where: 'table V',
  };

  it('is within half a unit of the last digit, and no further', () => {
    assert.equal(compare(row).verdict, 'within');
    assert.equal(compare({ ...row, printed: '17.8773' }).verdict, 'beyond');
    assert.equal(compare({ ...row, printed: '17.87' }).verdict, 'beyond');
    assert.equal(compare({ ...row, printed: '17.87', within: { tolerance: 0.01, because: 'test' } }).verdict, 'within');
  });

  it('knows the error that we state: 1 % of the viscosity of nitrogen, half of it in the diameter', () => {
    assert.ok(Math.abs(compare(row).statedShare - 0.01) < 1e-9);
    const diameter = compare({ ...row, property: 'collision_diameter', unit: 'Å', printed: '3.7' });
    assert.ok(Math.abs(diameter.statedShare - 0.005) < 1e-6);
    assert.equal(compare({ ...row, printed: '18.05', within: 'stated' }).verdict, 'within');
    assert.equal(compare({ ...row, printed: '18.10', within: 'stated' }).verdict, 'beyond');
    assert.equal(compare({ ...row, property: 'mean_speed', unit: 'm/s', printed: '476' }).statedShare, 0);
  });

  it('is beyond where there is no value', () => {
    assert.equal(compare({ ...row, gas: 'unobtainium' }).verdict, 'beyond');
    assert.equal(compare({ ...row, property: 'saturation_pressure', unit: 'Pa' }).verdict, 'beyond');
    assert.equal(compare({ ...row, temperature: -1 }).verdict, 'beyond');
  });

  it('reads reciprocals and what pairs do to each other', () => {
    const time = compare({
      ...row,
      property: 'collision_frequency',
      printedAs: 'reciprocal',
      unit: 'ps',
      printed: '1',
    });
    const frequency = compare({ ...row, property: 'collision_frequency', unit: '1/s', printed: '1' });
    assert.ok(Math.abs(time.ours * frequency.ours - 1e12) < 1);
    const itself = { ...row, gas: { N2: 0.5, O2: 0.5 }, property: 'second_virial', unit: 'cm³/mol' };
    const cross = compare({ ...itself, printedAs: 'cross-coefficient' }).ours;
    const ofOne = (of: string) => compare({ ...itself, of }).ours;
    assert.ok(Math.abs(compare(itself).ours - (ofOne('N2') + 2 * cross + ofOne('O2')) / 4) < 1e-12);
  });
});

describe('the deviations', () => {
  const comparisons = compareBook(book);
  const summaries = summarise(comparisons);

  it('count every row once', () => {
    const total = (counts: readonly number[]) => counts.reduce((sum, count) => sum + count, 0);
    assert.equal(total(summaries.map(({ all }) => all.rows)), comparisons.length);
    for (const { property, all, gases } of summaries)
      assert.equal(total(gases.map(({ deviations }) => deviations.rows)), all.rows, property);
  });

  it('have the middle and the largest of the magnitudes', () => {
    const [first] = comparisons as [Comparison];
    const shifted = [-3, 1, 2, -10].map((share) => ({ ...first, difference: (first.printed * share) / 100 }));
    const [{ all }] = summarise(shifted) as [ReturnType<typeof summarise>[number]];
    assert.ok(Math.abs(all.median - 0.025) < 1e-12 && Math.abs(all.worst - 0.1) < 1e-12);
  });

  it('reach the accuracy that was set for each property', () => {
    for (const { property, all } of summaries) {
      const aim = aims.get(property);
      if (aim === undefined) continue;
      assert.ok(all.median <= aim.median, `${property}: median ${all.median}`);
      assert.ok(all.worst <= (aim.worst ?? Infinity), `${property}: worst ${all.worst}`);
    }
    for (const property of aims.keys())
      assert.ok(
        summaries.some((each) => each.property === property),
        property,
      );
  });

  it('are covered by the errors that we state, in 95 % of the rows of each property', () => {
    for (const { property, all } of summaries) {
      const { count, of } = all.covered;
      assert.ok(of === 0 || count / of >= 0.95, `${property}: ${count} of ${of}`);
    }
  });
});
