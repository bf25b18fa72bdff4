import { figures, gas, whole } from '../support/gases';
import { halfUnit, references, withinStated } from '../support/reference';

const celsius25 = 298.15;
const crcPaths = 'CRC Handbook of Chemistry and Physics, Mean Free Path and Related Properties of Gases';

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

references(
  'mean free paths against the handbook',
  handbookPaths.flatMap(([name, diameter, path, speed, time]) => {
    const state = () => figures(name, celsius25, 1e5);
    const error = gas(name).viscosity?.uncertainty ?? 0;
    const where = `${name}, 25 °C, 100 kPa`;
    return [
      {
        printed: diameter,
        got: () => 1e10 * whole(state(), 'collision_diameter'),
        within: withinStated(diameter, error / 2),
      },
      {
        printed: path,
        got: () => 1e9 * whole(state(), 'mean_free_path_hard_sphere'),
        within: withinStated(path, error),
      },
      {
        printed: speed,
        got: () => whole(state(), 'mean_speed'),
        within: {
          tolerance: halfUnit(speed) + 3e-4 * Number(speed),
          because: 'the table reckons with the printed formula 145.5 √(T/M), rounded to four digits',
        },
      },
      { printed: time, got: () => 1e12 / whole(state(), 'collision_frequency'), within: withinStated(time, error) },
    ].map((row) => ({ ...row, source: crcPaths, where }));
  }),
);
