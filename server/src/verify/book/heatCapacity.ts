import type { Page, ReferenceRow } from '../row';

/* The tables are independent of our fits, whose stated error must cover the difference. */

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

const tablePage: Page = {
  title: 'heat capacity at constant pressure',
  rows: tables.flatMap(([gas, ...columns]) =>
    columns.flatMap((printed, column): ReferenceRow[] => {
      if (printed === undefined) return [];
      const T = column === 0 ? 298.15 : 1000;
      const where = `${gas}, ${T} K; from memory`;
      return [{ ...at(gas, T), printed, source: 'NIST-JANAF Thermochemical Tables, 4th ed.', where, within: 'stated' }];
    }),
  ),
};

const janaf = 'NIST-JANAF Thermochemical Tables, 4th ed.; from memory';
const crcThermo =
  'CRC Handbook of Chemistry and Physics, Standard Thermodynamic Properties of Chemical Substances; from memory';
const poling = 'Poling, Prausnitz & O’Connell 2001, appendix A, Cp at 298 K; from memory';
const srd134 = 'NIST Standard Reference Database 134, Gases Used in the Semiconductor Industry';

/** J/(mol K) at 298.15 K. */
const processHeatCapacities: readonly (readonly [string, string, string])[] = [
  ['O3', '39.24', janaf],
  ['D2O', '34.255', janaf],
  ['C2H2', '44.095', janaf],
  ['C2H4', '42.886', janaf],
  ['C2H6', '52.5', poling],
  ['C3H6', '64.3', poling],
  ['C3H8', '73.6', poling],
  ['nC4H10', '98.5', poling],
  ['iC4H10', '96.6', poling],
  ['C6H6', '82.4', poling],
  ['CH3OH', '44.1', poling],
  ['C2H5OH', '65.6', poling],
  ['CH3COCH3', '74.5', poling],
  ['CH3Cl', '40.731', janaf],
  ['CH2Cl2', '51.137', janaf],
  ['CHCl3', '65.38', janaf],
  ['NO', '29.845', janaf],
  ['N2O', '38.617', janaf],
  ['NO2', '36.974', janaf],
  ['SO2', '39.878', janaf],
  ['H2S', '34.192', janaf],
  ['CF4', '61.050', janaf],
  ['CHF3', '51.069', janaf],
  ['CH2F2', '42.869', janaf],
  ['CH3F', '37.490', janaf],
  ['COS', '41.505', janaf],
  ['HCl', '29.136', janaf],
  ['HF', '29.138', janaf],
  ['HI', '29.156', janaf],
  ['HCN', '35.857', janaf],
  ['F2', '31.302', janaf],
  ['I2', '36.887', janaf],
  ['Hg', '20.786', janaf],
  ['BF3', '50.463', janaf],
  ['HBr', '29.141', janaf],
  ['Cl2', '33.949', janaf],
  ['Br2', '36.053', janaf],
  ['BCl3', '62.5', `${srd134}, from 7.49 R at 295 K and 7.53 R at 300 K`],
  ['NF3', '53.392', janaf],
  ['SiH4', '42.83', janaf],
  ['SiF4', '73.6', crcThermo],
  ['SiCl4', '90.3', crcThermo],
  ['SiH2Cl2', '62.2', 'rigid rotor with the harmonic fundamentals 2224, 954, 527, 188, 710, 2237, 602, 876, 590 cm⁻¹'],
  ['PH3', '37.1', crcThermo],
  ['B2H6', '56.7', crcThermo],
  ['C2F6', '106.7', crcThermo],
  ['CCl4', '83.3', crcThermo],
  ['C7H8', '103.6', crcThermo],
  ['iC3H7OH', '89.3', crcThermo],
  ['CH3OCH3', '65.57', poling],
];

const processPage: Page = {
  title: 'heat capacity of the process gases against the tables',
  rows: processHeatCapacities.map(([gas, printed, source]) => {
    return { ...at(gas, 298.15), printed, source, where: `${gas}, 298.15 K`, within: 'stated' };
  }),
};

const soundPage: Page = {
  title: 'heat capacity ratio and sound',
  rows: [
    {
      property: 'heat_capacity_ratio',
      gas: 'Ar',
      temperature: 300,
      pressure: 101325,
      printed: '1.667',
      unit: '1',
      source: 'common practice, no source',
      where: 'one atom: 5/3',
    },
    {
      property: 'heat_capacity_ratio',
      gas: 'N2',
      temperature: 300,
      pressure: 101325,
      printed: '1.400',
      unit: '1',
      source: 'common practice, no source',
      where: 'two atoms near room temperature: 7/5',
    },
    {
      property: 'sound_speed',
      gas: 'air',
      temperature: 273.15,
      pressure: 101325,
      printed: '331.3',
      unit: 'm/s',
      source: 'handbooks of acoustics',
      where: 'dry air at 0 °C; from memory',
      within: { tolerance: 0.3, because: 'measured in air as it is, with carbon dioxide and at one atmosphere' },
    },
  ],
};

export const heatCapacityPages: readonly Page[] = [tablePage, processPage, soundPage];

function at(gas: string, temperature: number) {
  return { property: 'molar_heat_capacity_cp', gas, temperature, pressure: 101325, unit: 'J/(mol·K)' };
}
