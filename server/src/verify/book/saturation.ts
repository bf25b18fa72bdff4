import type { Page, ReferenceRow } from '../row';
import { share } from '../row';

/**
 * Normal boiling points (sublimation points of CO2 and SF6), K: the temperature at 101.325 kPa.
 * CRC Handbook and the equations of state named in the species' files; from memory.
 */
const boiling: readonly (readonly [string, string, number?])[] = [
  ['N2', '77.355', 0.003],
  ['O2', '90.188', 0.003],
  ['Ar', '87.302', 0.003],
  ['Kr', '119.735', 0.01],
  ['Xe', '165.05', 0.02],
  ['Ne', '27.10', 0.02],
  ['He', '4.222', 0.001],
  ['H2', '20.37', 0.01],
  ['D2', '23.66', 0.02],
  ['CO', '81.64', 0.02],
  ['CH4', '111.667', 0.005],
  ['NH3', '239.82', 0.03],
  ['CO2', '194.686', 0.01],
  ['SF6', '209.35', 0.3],
  ['H2O', '373.124', 0.002],
  ['air', '81.72', 0.03],
];

const boilingPage: Page = {
  title: 'boiling and sublimation points',
  rows: boiling.map(([gas, printed, tolerance = 0.01]) => ({
    property: 'dew_point',
    gas,
    // The dew point belongs to the pressure; the gas may be as warm as it likes.
    temperature: 400,
    pressure: 101325,
    printed,
    unit: 'K',
    source: 'CRC Handbook of Chemistry and Physics, 95th ed.',
    where: `${gas}, at 101.325 kPa; from memory`,
    within: { tolerance, because: 'editions differ by a few millikelvin, and the equations by their stated error' },
  })),
};

/** Normal boiling points of liquids and liquefied gases, K. The Handbook; from memory. */
const boilingVapours: readonly (readonly [string, string, number?])[] = [
  ['C2H4', '169.38'],
  ['C2H6', '184.57'],
  ['C3H6', '225.5'],
  ['C3H8', '231.04'],
  ['nC4H10', '272.66'],
  ['iC4H10', '261.4'],
  ['C6H6', '353.24'],
  ['C7H8', '383.78'],
  ['CH3OH', '337.8'],
  ['C2H5OH', '351.44'],
  ['iC3H7OH', '355.4'],
  ['CH3COCH3', '329.2'],
  ['Cl2', '239.11'],
  ['CCl4', '349.9'],
  ['SO2', '263.1', 0.3],
  ['H2S', '212.8', 0.5],
  ['HCl', '188.1', 0.4],
  ['Hg', '629.77', 0.05],
  ['D2O', '374.55', 0.05],
];

const boilingVapoursPage: Page = {
  title: 'boiling points of vapours',
  rows: boilingVapours.map(([gas, printed, tolerance = 0.25]) => ({
    property: 'dew_point',
    gas,
    temperature: 400,
    pressure: 101325,
    printed,
    unit: 'K',
    source: 'CRC Handbook of Chemistry and Physics, 95th ed.',
    where: `${gas}, at 101.325 kPa; from memory`,
    within: { tolerance, because: 'two per cent of pressure are half a kelvin; the equations do better there' },
  })),
};

/** Vapour pressures at 25 °C, kPa, far from the boiling points. The Handbook; from memory. */
const atRoom: readonly (readonly [string, string, number?])[] = [
  ['C6H6', '12.7'],
  ['C7H8', '3.79'],
  ['CH3OH', '16.9'],
  ['C2H5OH', '7.87'],
  ['iC3H7OH', '6.02'],
  ['CH3COCH3', '30.8'],
  ['CCl4', '15.2'],
  ['C3H8', '953'],
  ['nC4H10', '243'],
  ['iC4H10', '351'],
  ['C3H6', '1156'],
  ['D2O', '2.734'],
  ['Hg', '0.000261'],
];

const atRoomPage: Page = {
  title: 'vapour pressures at room temperature',
  rows: atRoom.map(([gas, printed, relative = 0.02]) => ({
    ...at(gas, 298.15, 'kPa'),
    printed,
    source: 'CRC Handbook of Chemistry and Physics, 95th ed.',
    where: `${gas}, 25 °C; from memory`,
    within: share(printed, relative, 'the error that the program states'),
  })),
};

/** IAPWS-95 (Wagner & Pruß 2002, table 13.1), saturation pressure of liquid water, kPa. */
const water = [
  [280, '0.99182'],
  [300, '3.5368'],
  [350, '41.682'],
  [400, '245.77'],
  [500, '2639.2'],
  [600, '12345'],
] as const;

const waterPage: Page = {
  title: 'saturation pressure of water',
  rows: water.map(([T, printed]) => ({
    ...at('H2O', T, 'kPa'),
    printed,
    source: 'Wagner & Pruß 2002, table 13.1',
    where: `${T} K; from memory`,
    within: share(printed, 3e-4, 'the auxiliary equation follows IAPWS-95 within 0.025 %'),
  })),
};

/** Murphy & Koop 2005, table C1: vapour pressure of ice, Pa. */
const ice = [
  [150, '6.106e-6'],
  [180, '0.0053975'],
  [210, '0.70202'],
  [240, '27.272'],
  [273.15, '611.154'],
] as const;

const icePage: Page = {
  title: 'vapour pressure of ice',
  rows: ice.map(([T, printed]) => ({
    ...at('H2O', T, 'Pa'),
    printed,
    source: 'Murphy & Koop 2005, table C1',
    where: `${T} K; from memory`,
    within: share(printed, 2e-4, 'the coefficients are printed to seven digits'),
  })),
};

/** Other liquids and solids far from their boiling points, kPa. */
const elsewhere = [
  ['N2', 100, '778.3', 0.004, 'Span 2000, table of saturation; from memory'],
  ['N2', 63.151, '12.52', 0.004, 'Span 2000, triple point; from memory'],
  ['O2', 54.361, '0.1463', 0.005, 'Stewart 1991, triple point; from memory'],
  ['Ar', 83.8058, '68.89', 0.003, 'Tegeler 1999, triple point; from memory'],
  ['CO2', 273.15, '3485', 0.002, 'Span & Wagner 1996, table 34; from memory'],
  ['CO2', 216.592, '517.95', 0.001, 'Span & Wagner 1996, triple point; from memory'],
  ['Xe', 161.405, '81.77', 0.005, 'Lemmon & Span 2006, triple point; from memory'],
  ['Kr', 77.35, '0.233', 0.05, 'common practice of krypton adsorption, 1.7 to 1.8 Torr over the solid, no source'],
  ['NH3', 300, '1061.7', 0.005, 'Tillner-Roth 1993; from memory'],
  ['CH4', 90.694, '11.70', 0.003, 'Setzmann & Wagner 1991, triple point; from memory'],
  ['He', 2.1768, '5.0418', 0.002, 'Preston-Thomas 1990, lambda point; from memory'],
  ['Ne', 24.556, '43.37', 0.005, 'triple point, CRC Handbook; from memory'],
] as const;

const elsewherePage: Page = {
  title: 'saturation pressure elsewhere',
  rows: elsewhere.map(([gas, T, printed, relative, source]): ReferenceRow => ({
    ...at(gas, T, 'kPa'),
    printed,
    source,
    where: `${gas} at ${T} K`,
    within: share(printed, relative, 'the stated error of the curve'),
  })),
};

export const saturationPages: readonly Page[] = [
  boilingPage,
  boilingVapoursPage,
  atRoomPage,
  waterPage,
  icePage,
  elsewherePage,
];

function at(gas: string, temperature: number, unit: string) {
  return { property: 'saturation_pressure', gas, temperature, pressure: 1, unit };
}
