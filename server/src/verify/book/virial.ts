import type { Page, Tolerance } from '../row';

const source = 'Dymond & Smith 1980, The Virial Coefficients of Pure Gases and Mixtures';

const roomTemperature = [
  ['N2', '-4.5'],
  ['O2', '-16'],
  ['Ar', '-15.5'],
  ['Kr', '-50'],
  ['Xe', '-129'],
  ['CO', '-8'],
  ['CO2', '-122.7'],
  ['CH4', '-42.2'],
  ['He', '11.8'],
  ['Ne', '11.3'],
  ['H2', '14.8'],
  ['D2', '14'],
  ['air', '-7.5'],
  ['SF6', '-275'],
] as const;

const within5: Tolerance = { tolerance: 5, because: 'the accuracy we state for common gases near room temperature' };

const roomPage: Page = {
  title: 'second virial coefficients at 300 K, cm³/mol',
  rows: roomTemperature.map(([gas, printed]) => {
    return { ...at(gas, 300), printed, source, where: `${gas}; from memory`, within: within5 };
  }),
};

/** Where B is large, its own error decides. */
const elsewhere = [
  ['N2', 100, '-160', 0.05],
  ['N2', 400, '9', 0.2],
  ['Ar', 100, '-183.5', 0.08],
  ['CO2', 220, '-247', 0.03],
  ['H2O', 373.15, '-452', 0.03],
  ['H2O', 500, '-175', 0.05],
  ['NH3', 300, '-261', 0.05],
  ['H2', 100, '-1.9', 1],
  ['CH4', 150, '-182', 0.03],
] as const;

const elsewherePage: Page = {
  title: 'second virial coefficients elsewhere, cm³/mol',
  rows: elsewhere.map(([gas, T, printed, relative]) => ({
    ...at(gas, T),
    printed,
    source,
    where: `${gas} at ${T} K; from memory`,
    within: {
      tolerance: Math.max(2, relative * Math.abs(Number(printed))),
      because: 'the evaluations differ by as much from each other',
    },
  })),
};

const pairs = [
  ['N2', 'O2', '-11', 3],
  ['N2', 'Ar', '-10', 3],
  ['N2', 'CO2', '-41', 6],
  ['N2', 'He', '21.5', 4],
  ['N2', 'H2', '12.5', 4],
  ['Ar', 'He', '17.5', 4],
  ['CH4', 'CO2', '-66', 12],
] as const;

const crossPage: Page = {
  title: 'cross virial coefficients at 300 K, cm³/mol',
  rows: pairs.map(([one, other, printed, tolerance]) => ({
    ...at({ [one]: 0.5, [other]: 0.5 }, 300),
    printedAs: 'cross-coefficient',
    printed,
    source,
    where: `${one} and ${other}; from memory`,
    within: { tolerance, because: 'the combining rules are known to be good to some 5 to 10 cm³/mol' },
  })),
};

export const virialPages: readonly Page[] = [roomPage, elsewherePage, crossPage];

function at(gas: string | Readonly<Record<string, number>>, temperature: number) {
  return { property: 'second_virial', gas, temperature, pressure: 1, unit: 'cm³/mol' };
}
