import type { Page } from '../row';

/** A gas of 1 g/mol at 1 K, for which the printed formulas leave their factors alone. */
const unitGas = { gas: 'N2', temperature: 1, reckonedWith: { molarMass: 1e-3 } };

const ratePage: Page = {
  title: 'Hertz–Knudsen rate and mean speed',
  rows: [
    {
      ...unitGas,
      property: 'impingement_rate',
      pressure: 1,
      printed: '2.635e24',
      unit: '1/(m²·s)',
      source: 'handbooks of vacuum technique',
      where: '2.635e24 p/√(MT) per m² and s, p in Pa, M in g/mol; from memory',
    },
    {
      ...unitGas,
      property: 'impingement_rate',
      pressure: 101325 / 760,
      printed: '3.513e22',
      unit: '1/(cm²·s)',
      source: 'handbooks of vacuum technique',
      where: '3.513e22 p/√(MT) per cm² and s, p in Torr, M in g/mol; from memory',
    },
    {
      ...unitGas,
      property: 'mean_speed',
      pressure: 1,
      printed: '145.5',
      unit: 'm/s',
      source: 'CRC Handbook of Chemistry and Physics, Mean Free Path and Related Properties of Gases',
      where: 'mean speed 145.5 √(T/M) m/s',
    },
  ],
};

const loschmidtPage: Page = {
  title: 'Loschmidt constant',
  rows: [
    {
      property: 'number_density',
      gas: 'N2',
      temperature: 273.15,
      pressure: 101325,
      printed: '2.686780111e25',
      unit: '1/m³',
      source: 'CODATA 2018',
      where: 'Loschmidt constant (273.15 K, 101.325 kPa), 1/m³, exact, cut off',
      within: { tolerance: 1e16, because: 'the list cuts the exact value off instead of rounding it' },
    },
  ],
};

export const kineticPages: readonly Page[] = [ratePage, loschmidtPage];
