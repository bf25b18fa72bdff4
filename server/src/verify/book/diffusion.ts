import type { Page, ReferenceRow } from '../row';
import { rounded } from '../row';

/* Diffusivity in an even mixture at one atmosphere: for two species it does not depend on the shares. */

const crcDiffusion = 'CRC Handbook of Chemistry and Physics, Diffusion in Gases (after Marrero & Mason 1972)';
const temperatures = [273.15, 293.15, 373.15, 473.15, 573.15, 673.15];

const measuredPage: Page = {
  title: 'measured diffusion against the handbook',
  rows: [
    ...columns('CH4', 'air', '0.210 0.321 0.485 0.678 0.899'),
    ...columns('CO', 'air', '0.208 0.315 0.475 0.662 0.875'),
    ...columns('CO2', 'air', '0.160 0.252 0.390 0.549 0.728'),
    ...columns('H2', 'air', '0.668 0.756 1.153 1.747 2.444 3.238'),
    ...columns('He', 'air', '0.617 0.697 1.057 1.594 2.221 2.933'),
    ...columns('Ar', 'CH4', '0.306 0.467 0.657 0.876'),
    ...columns('Ar', 'CO', '0.168 0.190 0.290 0.439 0.615 0.815'),
    ...columns('Ar', 'CO2', '0.129 0.148 0.235 0.365 0.517 0.689'),
    ...columns('Ar', 'N2', '0.168 0.190 0.290 0.439 0.615 0.815'),
    ...columns('Ar', 'O2', '0.166 0.187 0.285 0.430 0.600 0.793'),
    ...columns('CH4', 'H2', '0.708 1.084 1.648 2.311 3.070'),
    ...columns('CH4', 'He', '0.650 0.992 1.502 2.101 2.784'),
    ...columns('CH4', 'N2', '0.208 0.317 0.480 0.671 0.890'),
    ...columns('CH4', 'O2', '0.220 0.341 0.523 0.736 0.978'),
  ],
};

const bsl = 'Bird, Stewart & Lightfoot, Transport Phenomena';
const estimatedBecause = 'an estimate from potentials, said to be good to 10 %, or 25 % with a polar molecule';
const estimates: readonly (readonly [string, string, number, string, number, string, string])[] = [
  ['CO2', 'N2', 273.2, '0.144', 0.04, bsl, 'measured'],
  ['CO2', 'N2', 288.2, '0.158', 0.04, bsl, 'measured'],
  ['CO2', 'N2', 298.2, '0.165', 0.04, bsl, 'measured'],
  ['N2', 'O2', 273.2, '0.181', 0.04, bsl, 'measured'],
  ['H2O', 'N2', 308, '0.259', 0.04, bsl, 'measured'],
  ['H2O', 'O2', 352, '0.357', 0.04, bsl, 'measured'],
  ['H2O', 'air', 293.15, '0.242', 0, crcDiffusion, 'measured'],
  ['H2O', 'air', 373.15, '0.399', 0.04, crcDiffusion, 'measured'],
  ['H2', 'N2', 273.2, '0.674', 0.1, bsl, estimatedBecause],
  ['H2', 'SF6', 298.2, '0.420', 0.1, bsl, estimatedBecause],
  ['NH3', 'N2', 298, '0.233', 0.25, bsl, estimatedBecause],
  ['SF6', 'air', 373.15, '0.150', 0.1, crcDiffusion, estimatedBecause],
  ['SF6', 'air', 673.15, '0.438', 0.1, crcDiffusion, estimatedBecause],
  ['Ar', 'H2', 293.15, '0.794', 0.1, crcDiffusion, estimatedBecause],
  ['Ar', 'He', 200, '0.381', 0.1, crcDiffusion, estimatedBecause],
  ['Ar', 'He', 293.15, '0.726', 0.1, crcDiffusion, estimatedBecause],
  ['Ar', 'He', 673.15, '2.911', 0.1, crcDiffusion, estimatedBecause],
  ['Ar', 'Kr', 293.15, '0.134', 0.1, crcDiffusion, estimatedBecause],
  ['Ar', 'Ne', 293.15, '0.313', 0.1, crcDiffusion, estimatedBecause],
  ['Ar', 'SF6', 373.15, '0.128', 0.1, crcDiffusion, estimatedBecause],
  ['Ar', 'Xe', 293.15, '0.108', 0.1, crcDiffusion, estimatedBecause],
  ['Ar', 'Xe', 673.15, '0.498', 0.1, crcDiffusion, estimatedBecause],
  ['CH4', 'SF6', 373.15, '0.167', 0.1, crcDiffusion, estimatedBecause],
];

const otherPage: Page = {
  title: 'diffusion of other pairs',
  rows: estimates.map(([one, other, T, printed, relative, source, because]) => ({
    ...pair(one, other, T),
    printed,
    source,
    within: rounded(printed, relative, because),
  })),
};

export const diffusionPages: readonly Page[] = [measuredPage, otherPage];

/** The columns end at 673.15 K; a shorter row starts later. */
function columns(one: string, other: string, text: string): ReferenceRow[] {
  const printed = text.split(' ');
  const used = temperatures.slice(temperatures.length - printed.length);
  return printed.map((value, column) => ({
    ...pair(one, other, used[column] ?? NaN),
    printed: value,
    source: crcDiffusion,
  }));
}

function pair(one: string, other: string, temperature: number) {
  return {
    property: 'diffusivity',
    gas: { [one]: 0.5, [other]: 0.5 },
    of: one,
    temperature,
    pressure: 101325,
    unit: 'cm²/s',
    where: `${one}–${other}, ${temperature} K`,
  };
}
