import type { Page, ReferenceRow } from '../row';
import { rounded, share } from '../row';

const handbook = 'CRC Handbook of Chemistry and Physics, Thermal Conductivity of Gases';

/**
 * CRC Handbook, "Thermal conductivity of gases", mW/(m K), an edition before 2010. Two things in it have been superseded by
 * the reference correlations and are left out: nitrogen at 200 K (2.5 % above Lemmon & Jacobsen 2004) and methane but at
 * 300 K (Friend, Ely & Ingham 1989 is 4 % below it at 200 K and 5 % above it at 600 K).
 */
const handbookConductivities: readonly (readonly [string, Readonly<Record<number, string>>, number])[] = [
  ['air', { 200: '18.4', 300: '26.2', 400: '33.3', 500: '39.7', 600: '45.7' }, 0.02],
  ['Ar', { 200: '12.4', 300: '17.9', 400: '22.6', 500: '26.8', 600: '30.6' }, 0.015],
  ['H2', { 200: '131.7', 300: '186.9', 400: '230.4' }, 0.03],
  ['SF6', { 300: '13.0', 400: '20.6', 500: '27.5', 600: '33.8' }, 0.1],
  ['H2O', { 300: '18.7', 400: '27.1', 500: '35.7', 600: '47.1' }, 0.03],
  ['NH3', { 300: '24.4', 400: '37.4', 500: '51.6', 600: '66.8' }, 0.03],
  ['He', { 200: '119.3', 300: '156.7', 400: '190.6', 500: '222.3', 600: '252.4' }, 0.025],
  ['Kr', { 200: '6.4', 300: '9.5', 400: '12.3', 500: '14.8', 600: '17.1' }, 0.015],
  ['N2', { 300: '26.0', 400: '32.3', 500: '38.3', 600: '44.0' }, 0.02],
  ['Ne', { 200: '37.6', 300: '49.8', 400: '60.3', 500: '69.9', 600: '78.7' }, 0.015],
  ['O2', { 200: '18.4', 300: '26.3', 400: '33.7', 500: '41.0', 600: '48.1' }, 0.02],
  ['Xe', { 300: '5.5', 400: '7.3', 500: '8.9', 600: '10.4' }, 0.02],
  ['CO', { 300: '25.0', 400: '32.3', 500: '39.2', 600: '45.7' }, 0.1],
  ['CO2', { 200: '9.6', 300: '16.8', 400: '25.1', 500: '33.5', 600: '41.6' }, 0.02],
  ['CH4', { 300: '34.1' }, 0.03],
];

const handbookPage: Page = {
  title: 'conductivity against the handbook',
  rows: handbookConductivities.flatMap(([gas, row, error]) =>
    Object.entries(row).map(([T, printed]): ReferenceRow => ({
      property: 'thermal_conductivity',
      gas,
      temperature: Number(T),
      pressure: 1e4,
      printed,
      unit: 'mW/(m·K)',
      source: handbook,
      where: `${gas}, ${T} K`,
      within: rounded(printed, error, independent),
    })),
  ),
};

const independent = 'the source is independent of our correlation, whose stated error must cover the difference';

/** Measurements at 0 °C, as collected by Hirschfelder, Curtiss & Bird 1954, section 8.4; from memory. */
const mixtures = [
  ['He', 0.27, 'Ar', '730e-7'],
  ['He', 0.4539, 'Ar', '1061e-7'],
  ['H2', 0.39, 'N2', '1366e-7'],
] as const;

const mixturePage: Page = {
  title: 'conductivity of mixtures at 0 °C',
  rows: mixtures.map(([one, x, other, printed]) => ({
    property: 'thermal_conductivity',
    gas: { [one]: x, [other]: 1 - x },
    temperature: 273.15,
    pressure: 1e4,
    printed,
    unit: 'cal/(cm·s·K)',
    source: 'Hirschfelder, Curtiss & Bird 1954, section 8.4, after Wachsmuth 1908 and Ibbs & Hirst 1929',
    where: `${one} ${x} in ${other}; from memory`,
    within: share(printed, 0.05, 'hot-wire measurements of that time, and our own 5 %'),
  })),
};

export const conductivityPages: readonly Page[] = [handbookPage, mixturePage];
