import type { Page, ReferenceRow } from '../row';

/* Dilute gas: the pressure does not matter. */

const handbook = 'CRC Handbook of Chemistry and Physics, Viscosity of Gases, Huber & Harvey';

/** CRC Handbook, "Viscosity of gases" (Huber & Harvey), µPa s at 100 kPa or in the dilute limit. */
const handbookViscosities: readonly (readonly [string, Readonly<Record<number, string>>])[] = [
  ['air', { 100: '7.1', 200: '13.3', 300: '18.5', 400: '23.1', 500: '27.1', 600: '30.8' }],
  ['Ar', { 100: '8.1', 200: '15.9', 300: '22.7', 400: '28.6', 500: '33.9', 600: '38.8' }],
  ['SF6', { 300: '15.3', 400: '19.7', 500: '23.8', 600: '27.6' }],
  ['H2', { 100: '4.1', 200: '6.8', 300: '8.9', 400: '10.9', 500: '12.8', 600: '14.5' }],
  ['D2', { 100: '5.9', 200: '9.6', 300: '12.6', 400: '15.4', 500: '17.9', 600: '20.3' }],
  ['H2O', { 300: '9.8', 400: '13.4', 500: '17.3', 600: '21.4' }],
  ['NH3', { 300: '10.2', 400: '14.0', 500: '17.9', 600: '21.7' }],
  ['He', { 100: '9.6', 200: '15.1', 300: '19.9', 400: '24.3', 500: '28.3', 600: '32.2' }],
  ['Kr', { 200: '17.4', 300: '25.5', 400: '32.9', 500: '39.6', 600: '45.8' }],
  ['N2', { 100: '7.0', 200: '12.9', 300: '17.9', 400: '22.2', 500: '26.1', 600: '29.6' }],
  ['Ne', { 200: '24.1', 300: '31.9', 400: '38.6', 500: '44.8', 600: '50.6' }],
  ['O2', { 100: '7.7', 200: '14.7', 300: '20.7', 400: '25.8', 500: '30.5', 600: '34.7' }],
  ['Xe', { 300: '23.2', 400: '30.5', 500: '37.2', 600: '43.5' }],
  ['CO', { 200: '12.9', 300: '17.8', 400: '22.1', 500: '25.8', 600: '29.1' }],
  ['CO2', { 200: '10.1', 300: '15.0', 400: '19.7', 500: '24.0', 600: '28.0' }],
  ['CH4', { 100: '3.9', 200: '7.7', 300: '11.1', 400: '14.2' }],
];

const handbookPage: Page = {
  title: 'viscosity against the handbook',
  rows: handbookViscosities.flatMap(([gas, row]) =>
    Object.entries(row).map(([T, printed]): ReferenceRow => {
      return { ...at(gas, Number(T)), printed, source: handbook, where: `${gas}, ${T} K`, within: 'stated' };
    }),
  ),
};

const lemmon = [
  { gas: 'N2', at100: '6.90349', at300: '17.8771' },
  { gas: 'Ar', at100: '8.18940', at300: '22.7241' },
  { gas: 'O2', at100: '7.70243', at300: '20.6307' },
  { gas: 'air', at100: '7.09559', at300: '18.5230' },
].flatMap(({ gas, at100, at300 }): ReferenceRow[] => {
  const source = 'Lemmon & Jacobsen 2004';
  return [
    { ...at(gas, 100), printed: at100, source, where: `table V, ${gas} at 100 K, ρ = 0; from memory` },
    { ...at(gas, 300), printed: at300, source, where: `table V, ${gas} at 300 K, ρ = 0; from memory` },
  ];
});

const checkPage: Page = {
  title: 'viscosity against the check values of the correlations',
  rows: [
    ...lemmon,
    {
      ...at('SF6', 300),
      printed: '15.2887',
      source: 'Quiñones-Cisneros, Huber & Deiters 2012',
      where: 'check value at 300 K, ρ = 0; from memory',
      within: { tolerance: 1e-3, because: 'the five coefficients are printed to 1e-6 mPa s, and they cancel' },
    },
    {
      ...at('CO2', 300),
      printed: '15.02',
      source: 'Fenghour, Wakeham & Vesovic 1998',
      where: 'table of check values, 300 K and 0.1 MPa; from memory',
      within: { tolerance: 0.015, because: 'the first density term, left out here, adds 0.007 µPa s at 1.773 kg/m³' },
    },
  ],
};

const crc = 'CRC Handbook of Chemistry and Physics, Viscosity of Gases';
const perry = 'Perry’s Chemical Engineers’ Handbook, table 2-364, after the International Critical Tables';
const srd134 = 'NIST Standard Reference Database 134, Gases Used in the Semiconductor Industry';
const webbook = 'NIST Chemistry WebBook, Thermophysical Properties of Fluid Systems';

/** µPa s by temperature in K, printed in µPa s or brought there from 10⁻⁷ P. */
const processViscosities: readonly (readonly [string, string, Readonly<Record<number, string>>])[] = [
  ['D2O', crc, { 300: '10.1', 400: '13.8', 500: '17.9', 600: '22.1' }],
  ['H2S', crc, { 200: '8.1', 300: '12.2', 400: '16.4', 500: '20.3', 600: '24.0' }],
  ['BF3', crc, { 200: '12.3', 300: '17.1', 400: '21.7', 500: '26.1', 600: '30.2' }],
  ['HCl', crc, { 300: '14.6', 400: '19.7', 500: '24.3' }],
  ['NO', crc, { 200: '13.8', 300: '19.2', 400: '23.8', 500: '28.0', 600: '31.9' }],
  ['N2O', crc, { 200: '10.0', 300: '15.0', 400: '19.4', 500: '23.6', 600: '27.4' }],
  ['SO2', crc, { 200: '8.6', 300: '12.9', 400: '17.5', 500: '21.7' }],
  ['CHCl3', crc, { 300: '10.2', 400: '13.7', 500: '16.9', 600: '20.1' }],
  ['CH3OH', crc, { 400: '13.2', 500: '16.5', 600: '19.6' }],
  ['C2H5OH', crc, { 400: '11.6', 500: '14.5', 600: '17.0' }],
  ['C2H2', crc, { 300: '10.4', 400: '13.5', 500: '16.5' }],
  ['C2H4', crc, { 200: '7.0', 300: '10.4', 400: '13.6', 500: '16.5', 600: '19.1' }],
  ['C2H6', crc, { 200: '6.4', 300: '9.5', 400: '12.3', 500: '14.9', 600: '17.3' }],
  ['C3H8', crc, { 300: '8.3', 400: '10.9', 500: '13.4', 600: '15.8' }],
  ['nC4H10', crc, { 300: '7.5', 400: '10.0', 500: '12.3', 600: '14.6' }],
  ['iC4H10', crc, { 300: '7.6', 400: '10.0', 500: '12.3', 600: '14.6' }],
  ['Cl2', srd134, { 240: '10.8', 300: '13.5', 350: '15.7' }],
  ['BCl3', srd134, { 300: '12.3', 400: '15.5', 500: '18.7' }],
  ['HBr', perry, { 293.15: '18.43' }],
  ['Br2', perry, { 293.15: '14.95' }],
  ['CCl4', perry, { 293.15: '9.66' }],
  ['CH3COCH3', perry, { 293.15: '7.35' }],
  ['C6H6', perry, { 293.15: '7.46' }],
  ['COS', perry, { 293.15: '12.20' }],
  ['HI', perry, { 293.15: '18.30' }],
  ['HCN', perry, { 293.15: '7.37' }],
  ['I2', perry, { 373.15: '17.30' }],
  ['Hg', perry, { 473.15: '45.00' }],
  ['CH3Cl', perry, { 293.15: '10.62' }],
  ['CH2Cl2', perry, { 293.15: '9.89' }],
  ['AsH3', perry, { 293.15: '15.76' }],
  ['CF4', `${webbook}; from memory`, { 300: '17.4' }],
  ['CHF3', `${webbook}; from memory`, { 300: '14.9' }],
  ['CH2F2', `${webbook}; from memory`, { 300: '12.7' }],
  ['CH3F', `${webbook}; from memory`, { 300: '11.2' }],
  ['C3H6', `${webbook}; from memory`, { 300: '8.7' }],
  ['F2', `${webbook}; from memory`, { 300: '23.3' }],
  ['C2F6', `${webbook}; from memory`, { 300: '14.4' }],
  ['cC4F8', `${webbook}; from memory`, { 300: '11.7' }],
];

const processPage: Page = {
  title: 'viscosity of the process gases against the handbooks',
  rows: processViscosities.flatMap(([gas, source, row]) =>
    Object.entries(row).map(([T, printed]): ReferenceRow => {
      return { ...at(gas, Number(T)), printed, source, where: `${gas}, ${T} K`, within: 'stated' };
    }),
  ),
};

export const viscosityPages: readonly Page[] = [handbookPage, checkPage, processPage];

function at(gas: string, temperature: number) {
  return { property: 'viscosity', gas, temperature, pressure: 1e5, unit: 'µPa·s' };
}
