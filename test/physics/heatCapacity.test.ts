import assert from 'node:assert/strict';
import { R } from '../../server/src/physics/constants';
import { speciesList } from '../../server/src/physics/species/list';
import { heatCapacityRange, molarHeatCapacity } from '../../server/src/physics/thermo/heatCapacity';
import { figures, gas, whole } from '../support/gases';
import { halfUnit, references } from '../support/reference';

const cp = (name: string, T: number) => molarHeatCapacity(gas(name).heatCapacity!.value, T);

/** J/(mol K) at 298.15 K and at 1000 K. Methane at 1000 K is left out: the table has been superseded there, by 2.6 %. */
const tables: readonly (readonly [string, string, string?])[] = [
  ['N2', '29.124', '32.697'],
  ['O2', '29.376', '34.870'],
  ['CO2', '37.129', '54.308'],
  ['H2O', '33.590', '41.268'],
  ['CO', '29.142', '33.183'],
  ['CH4', '35.639'],
  ['NH3', '35.652', '56.491'],
  ['H2', '28.836', '30.205'],
  ['D2', '29.194', '31.641'],
  ['He', '20.786', '20.786'],
  ['Ar', '20.786', '20.786'],
  ['SF6', '96.96'],
];

references(
  'heat capacity at constant pressure',
  tables.flatMap(([name, ...columns]) =>
    columns.flatMap((printed, at) => {
      if (printed === undefined) return [];
      const T = at === 0 ? 298.15 : 1000;
      const error = gas(name).heatCapacity?.uncertainty ?? 0;
      return {
        printed,
        got: () => cp(name, T),
        source: 'NIST-JANAF Thermochemical Tables, 4th ed.',
        where: `${name}, ${T} K; from memory`,
        within: {
          tolerance: halfUnit(printed) + error * Number(printed),
          because: 'the tables are independent of our fits, whose stated error must cover the difference',
        },
      };
    }),
  ),
);

references('heat capacity ratio and sound', [
  {
    printed: '1.667',
    got: () => whole(figures('Ar', 300), 'heat_capacity_ratio'),
    source: 'common practice, no source',
    where: 'one atom: 5/3',
  },
  {
    printed: '1.400',
    got: () => whole(figures('N2', 300), 'heat_capacity_ratio'),
    source: 'common practice, no source',
    where: 'two atoms near room temperature: 7/5',
  },
  {
    printed: '331.3',
    got: () => whole(figures('air', 273.15), 'sound_speed'),
    source: 'handbooks of acoustics',
    where: 'dry air at 0 °C; from memory',
    within: { tolerance: 0.3, because: 'measured in air as it is, with carbon dioxide and at one atmosphere' },
  },
]);

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
