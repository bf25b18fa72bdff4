import type { Page, ReferenceRow } from '../row';
import { rounded } from '../row';

const source = 'CRC Handbook of Chemistry and Physics, Mean Free Path and Related Properties of Gases';

/** At 25 °C and 100 kPa: collision diameter in Å, mean free path in nm, mean speed in m/s, time between collisions in ps. */
const handbookPaths: readonly (readonly [string, string, string, string, string])[] = [
  ['NH3', '4.32', '49.7', '609', '82'],
  ['Ar', '3.58', '72.2', '397', '182'],
  ['CO2', '4.53', '45.1', '379', '119'],
  ['He', '2.15', '200', '1256', '159'],
  ['H2', '2.71', '126', '1769', '71'],
  ['Kr', '4.08', '55.8', '274', '203'],
  ['Ne', '2.54', '143', '559', '256'],
  ['N2', '3.70', '67.6', '475', '142'],
  ['O2', '3.55', '73.6', '444', '166'],
];

const roundedFormula = 'the table reckons with the printed formula 145.5 √(T/M), rounded to four digits';

const page: Page = {
  title: 'mean free paths against the handbook',
  rows: handbookPaths.flatMap(([gas, diameter, path, speed, time]): ReferenceRow[] => {
    const state = { gas, temperature: 298.15, pressure: 1e5, source, where: `${gas}, 25 °C, 100 kPa` };
    return [
      { ...state, property: 'collision_diameter', printed: diameter, unit: 'Å', within: 'stated' },
      { ...state, property: 'mean_free_path_hard_sphere', printed: path, unit: 'nm', within: 'stated' },
      {
        ...state,
        property: 'mean_speed',
        printed: speed,
        unit: 'm/s',
        within: rounded(speed, 3e-4, roundedFormula),
      },
      {
        ...state,
        property: 'collision_frequency',
        printedAs: 'reciprocal',
        printed: time,
        unit: 'ps',
        within: 'stated',
      },
    ];
  }),
};

export const meanFreePathPages: readonly Page[] = [page];
