import assert from 'node:assert/strict';
import { speciesList } from '../../server/src/physics/species/list';
import { aStar, omega11, omega22 } from '../../server/src/physics/transport/collisionIntegrals';
import { measuredRange } from '../../server/src/physics/transport/measuredDiffusion';
import { figures, gas, mixture, part, valueOf, whole } from '../support/gases';
import type { ReferenceRow } from '../support/reference';
import { halfUnit, references } from '../support/reference';
import { viscosity } from '../../server/src/physics/transport/viscosity';

const micro = 1e6;
const eta = (name: string, T: number) => micro * valueOf(viscosity(gas(name), T));

/** The tolerance of a value that was measured by others: their last digit, and the error that we state. */
function withinStated(printed: string, relative: number) {
  return {
    tolerance: halfUnit(printed) + relative * Number(printed),
    because: 'the source is independent of our correlation, whose stated error must cover the difference',
  };
}

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

references(
  'viscosity against the handbook',
  handbookViscosities.flatMap(([name, row]) =>
    Object.entries(row).map(([T, printed]) => ({
      printed,
      got: () => eta(name, Number(T)),
      source: 'CRC Handbook of Chemistry and Physics, Viscosity of Gases, Huber & Harvey',
      where: `${name}, ${T} K`,
      within: withinStated(printed, gas(name).viscosity?.uncertainty ?? 0),
    })),
  ),
);

references('viscosity against the check values of the correlations', [
  ...[
    { name: 'N2', at100: '6.90349', at300: '17.8771' },
    { name: 'Ar', at100: '8.18940', at300: '22.7241' },
    { name: 'O2', at100: '7.70243', at300: '20.6307' },
    { name: 'air', at100: '7.09559', at300: '18.5230' },
  ].flatMap(({ name, at100, at300 }): ReferenceRow[] => {
    const source = 'Lemmon & Jacobsen 2004';
    return [
      { printed: at100, got: () => eta(name, 100), source, where: `table V, ${name} at 100 K, ρ = 0; from memory` },
      { printed: at300, got: () => eta(name, 300), source, where: `table V, ${name} at 300 K, ρ = 0; from memory` },
    ];
  }),
  {
    printed: '15.2887',
    got: () => eta('SF6', 300),
    source: 'Quiñones-Cisneros, Huber & Deiters 2012',
    where: 'check value at 300 K, ρ = 0; from memory',
    within: { tolerance: 1e-3, because: 'the five coefficients are printed to 1e-6 mPa s, and they cancel' },
  },
  {
    printed: '15.02',
    got: () => eta('CO2', 300),
    source: 'Fenghour, Wakeham & Vesovic 1998',
    where: 'table of check values, 300 K and 0.1 MPa; from memory',
    within: { tolerance: 0.015, because: 'the first density term, left out here, adds 0.007 µPa s at 1.773 kg/m³' },
  },
]);

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

references(
  'conductivity against the handbook',
  handbookConductivities.flatMap(([name, row, error]) =>
    Object.entries(row).map(([T, printed]) => ({
      printed,
      got: () => 1e3 * whole(figures(name, Number(T), 1e4), 'thermal_conductivity'),
      source: 'CRC Handbook of Chemistry and Physics, Thermal Conductivity of Gases',
      where: `${name}, ${T} K`,
      within: withinStated(printed, error),
    })),
  ),
);

/** Diffusivity of a trace, or of an even mixture, in cm²/s at one atmosphere: for two species it depends on neither. */
function pair(one: string, other: string, T: number): number {
  return 1e4 * part(figures(mixture({ [one]: 0.5, [other]: 0.5 }), T), one, 'diffusivity');
}

const crcDiffusion = 'CRC Handbook of Chemistry and Physics, Diffusion in Gases (after Marrero & Mason 1972)';
const temperatures = [273.15, 293.15, 373.15, 473.15, 573.15, 673.15];

/** The columns end at 673.15 K; a shorter row starts later. */
function diffusionRows(one: string, other: string, text: string): ReferenceRow[] {
  const printed = text.split(' ');
  const columns = temperatures.slice(temperatures.length - printed.length);
  return columns.map((T, at) => ({
    printed: printed[at]!,
    got: () => pair(one, other, T),
    source: crcDiffusion,
    where: `${one}–${other}, ${T} K`,
  }));
}

references('measured diffusion against the handbook', [
  ...diffusionRows('CH4', 'air', '0.210 0.321 0.485 0.678 0.899'),
  ...diffusionRows('CO', 'air', '0.208 0.315 0.475 0.662 0.875'),
  ...diffusionRows('CO2', 'air', '0.160 0.252 0.390 0.549 0.728'),
  ...diffusionRows('H2', 'air', '0.668 0.756 1.153 1.747 2.444 3.238'),
  ...diffusionRows('He', 'air', '0.617 0.697 1.057 1.594 2.221 2.933'),
  ...diffusionRows('Ar', 'CH4', '0.306 0.467 0.657 0.876'),
  ...diffusionRows('Ar', 'CO', '0.168 0.190 0.290 0.439 0.615 0.815'),
  ...diffusionRows('Ar', 'CO2', '0.129 0.148 0.235 0.365 0.517 0.689'),
  ...diffusionRows('Ar', 'N2', '0.168 0.190 0.290 0.439 0.615 0.815'),
  ...diffusionRows('Ar', 'O2', '0.166 0.187 0.285 0.430 0.600 0.793'),
  ...diffusionRows('CH4', 'H2', '0.708 1.084 1.648 2.311 3.070'),
  ...diffusionRows('CH4', 'He', '0.650 0.992 1.502 2.101 2.784'),
  ...diffusionRows('CH4', 'N2', '0.208 0.317 0.480 0.671 0.890'),
  ...diffusionRows('CH4', 'O2', '0.220 0.341 0.523 0.736 0.978'),
]);

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

references(
  'diffusion of other pairs',
  estimates.map(([one, other, T, printed, relative, source, because]) => ({
    printed,
    got: () => pair(one, other, T),
    source,
    where: `${one}–${other}, ${T} K`,
    within: { tolerance: halfUnit(printed) + relative * Number(printed), because },
  })),
);

references('collision integrals', [
  // The table has since been found to be off below T* = 1, so its colder rows are left out.
  ...[
    { T: 1, o22: '1.587', o11: '1.439' },
    { T: 2, o22: '1.175', o11: '1.075' },
    { T: 10, o22: '0.8242', o11: '0.7424' },
    { T: 100, o22: '0.5882', o11: '0.5170' },
  ].flatMap(({ T, o22, o11 }) =>
    [
      { printed: o22, got: () => omega22(T) },
      { printed: o11, got: () => omega11(T) },
    ].map((row) => ({
      ...row,
      source: 'Hirschfelder, Curtiss & Bird 1954',
      where: `table I-M, T* = ${T}; from memory`,
      within: { tolerance: 0.005 * Number(row.printed), because: 'fit and table differ by up to half a per cent' },
    })),
  ),
]);

describe('pure viscosity', () => {
  it('of dry air follows from its three parts', () => {
    const parts = mixture({ N2: 0.7812, O2: 0.2096, Ar: 0.0092 });
    for (const T of [150, 200, 250, 300, 400, 600, 1000]) {
      const blended = whole(figures(parts, T), 'viscosity') * micro;
      // Both correlations state 1 %.
      assert.ok(Math.abs(blended / eta('air', T) - 1) < 0.01, `${T} K: ${blended}, ${eta('air', T)}`);
    }
  });

  it('rises with temperature, without a step at the ends of the ranges', () => {
    for (const species of speciesList) {
      const { low, high } = species.viscosity!.value;
      let before = 0;
      for (let T = 1; T < 20000; T *= 1.01) {
        const value = valueOf(viscosity(species, T));
        assert.ok(before < value, `${species.formula} at ${T} K`);
        before = value;
      }
      for (const end of [low, high, 100, 200, 1000]) {
        const below = valueOf(viscosity(species, end * (1 - 1e-9)));
        const above = valueOf(viscosity(species, end * (1 + 1e-9)));
        assert.ok(Math.abs(above / below - 1) < 2e-3, `${species.formula} at ${end} K: ${below}, ${above}`);
      }
    }
  });

  it('says when it leaves its range, on both sides, and not within', () => {
    for (const species of speciesList) {
      const { low, high } = species.viscosity!.value;
      const kinds = (T: number) => {
        const outcome = viscosity(species, T);
        assert.ok(outcome.ok);
        return outcome.notes.map((note) => note.kind);
      };
      assert.deepEqual(kinds(low), []);
      assert.deepEqual(kinds(high), []);
      assert.deepEqual(kinds(low * 0.999), ['outside-range']);
      assert.deepEqual(kinds(high * 1.001), ['outside-range']);
    }
  });

  it('needs data, and does not invent them', () => {
    const { formula, names, molarMass, hazards, viscosity: data } = gas('N2');
    const bare = { formula, names, molarMass, hazards };
    assert.deepEqual(viscosity(bare, 300), {
      ok: false,
      reason: { kind: 'no-data', species: 'N2', property: 'viscosity' },
    });
    assert.ok(data);
    const outcome = viscosity({ ...bare, viscosity: data }, 20);
    assert.ok(!outcome.ok && outcome.reason.kind === 'outside-range');
  });
});

describe('conductivity', () => {
  it('of methane agrees with the equation of Friend, Ely & Ingham 1989 (constants from memory)', () => {
    for (const T of [200, 300, 400, 500, 600]) {
      const state = figures('CH4', T, 1e3);
      const internal = 1.45885 - (0.4377162 * 174) / T;
      const heat = whole(state, 'molar_heat_capacity_cp') / 8.314462618;
      const expected = 0.51826e-3 * eta('CH4', T) * (3.75 + internal * (heat - 2.5));
      const ours = whole(state, 'thermal_conductivity');
      assert.ok(Math.abs(ours / expected - 1) < 0.035, `${T} K: ${ours}, ${expected}`);
    }
  });

  it('rises with temperature, without a step at the ends of the ranges', () => {
    for (const { formula, conductivity } of speciesList) {
      let before = 0;
      for (let T = 20; T < 5000; T *= 1.02) {
        const value = whole(figures(formula, T, 1), 'thermal_conductivity');
        assert.ok(before < value, `${formula} at ${T} K`);
        before = value;
      }
      if (conductivity === undefined) continue;
      for (const end of [conductivity.value.low, conductivity.value.high]) {
        const at = (T: number) => whole(figures(formula, T, 1), 'thermal_conductivity');
        assert.ok(Math.abs(at(end * (1 + 1e-9)) / at(end * (1 - 1e-9)) - 1) < 1e-7, `${formula} at ${end} K`);
      }
    }
  });
});

describe('diffusion', () => {
  it('has no step where the measured range ends', () => {
    for (const [one, other] of [
      ['CO2', 'N2'],
      ['H2O', 'air'],
      ['H2', 'CH4'],
    ] as const) {
      for (const end of [measuredRange.low, measuredRange.high]) {
        const ratio = pair(one, other, end * (1 + 1e-9)) / pair(one, other, end * (1 - 1e-9));
        assert.ok(Math.abs(ratio - 1) < 1e-7, `${one}–${other} at ${end} K`);
      }
    }
  });

  it('of isotopes lies between their self-diffusions, and of a gas in itself is the self-diffusion', () => {
    const light = whole(figures('H2', 300), 'diffusivity') * 1e4;
    const heavy = whole(figures('D2', 300), 'diffusivity') * 1e4;
    const mutual = pair('H2', 'D2', 300);
    assert.ok(heavy < mutual && mutual < light);
    assert.ok(Math.abs(aStar(300 / 59.7) / 1.1 - 1) < 0.02);
  });
});
