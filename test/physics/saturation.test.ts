import assert from 'node:assert/strict';
import { speciesList } from '../../server/src/physics/species/list';
import {
  condensedPhase,
  dewPoint,
  saturationPressure,
  saturationRange,
  wouldCondense,
} from '../../server/src/physics/thermo/saturation';
import { logSaturation, saturationTemperature } from '../../server/src/physics/thermo/saturationCurve';
import { figures, gas, mixture, near, part, valueOf, whole } from '../support/gases';
import { references } from '../support/reference';

const saturated = (name: string, T: number) => valueOf(saturationPressure(gas(name), T));

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

references(
  'boiling and sublimation points',
  boiling.map(([name, printed, tolerance = 0.01]) => ({
    printed,
    got: () => valueOf(dewPoint(gas(name), 101325)),
    source: 'CRC Handbook of Chemistry and Physics, 95th ed.',
    where: `${name}, at 101.325 kPa; from memory`,
    within: { tolerance, because: 'editions differ by a few millikelvin, and the equations by their stated error' },
  })),
);

/** IAPWS-95 (Wagner & Pruß 2002, table 13.1), saturation pressure of liquid water, kPa. */
references(
  'saturation pressure of water',
  (
    [
      [280, '0.99182'],
      [300, '3.5368'],
      [350, '41.682'],
      [400, '245.77'],
      [500, '2639.2'],
      [600, '12345'],
    ] as const
  ).map(([T, printed]) => ({
    printed,
    got: () => saturated('H2O', T) / 1e3,
    source: 'Wagner & Pruß 2002, table 13.1',
    where: `${T} K; from memory`,
    within: { tolerance: 3e-4 * Number(printed), because: 'the auxiliary equation follows IAPWS-95 within 0.025 %' },
  })),
);

/** Murphy & Koop 2005, table C1: vapour pressure of ice, Pa. */
references(
  'vapour pressure of ice',
  (
    [
      [150, '6.106e-6'],
      [180, '0.0053975'],
      [210, '0.70202'],
      [240, '27.272'],
      [273.15, '611.154'],
    ] as const
  ).map(([T, printed]) => ({
    printed,
    got: () => saturated('H2O', T),
    source: 'Murphy & Koop 2005, table C1',
    where: `${T} K; from memory`,
    within: { tolerance: 2e-4 * Number(printed), because: 'the coefficients are printed to seven digits' },
  })),
);

/** Other liquids and solids far from their boiling points, kPa. */
references(
  'saturation pressure elsewhere',
  (
    [
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
    ] as const
  ).map(([name, T, printed, relative, source]) => ({
    printed,
    got: () => saturated(name, T) / 1e3,
    source,
    where: `${name} at ${T} K`,
    within: { tolerance: relative * Number(printed), because: 'the stated error of the curve' },
  })),
);

describe('saturation', () => {
  const withCurves = speciesList.filter(({ saturation }) => saturation !== undefined);

  it('rises with temperature, and the dew point undoes it', () => {
    for (const species of withCurves) {
      const { low, high } = saturationRange(species)!;
      let before = 0;
      for (let step = 0; step <= 300; step++) {
        const T = low * (high / low) ** (step / 300);
        const p = valueOf(saturationPressure(species, Math.min(T, high)));
        assert.ok(before < p, `${species.formula} at ${T} K: ${p} after ${before}`);
        before = p;
        if (step % 20 === 7) near(valueOf(dewPoint(species, p)), T, 1e-10, species.formula);
      }
    }
  });

  it('is continuous, and no curve was moved by more than its stated error to make it so', () => {
    for (const species of withCurves) {
      const { formula, saturation = [] } = species;
      saturation.slice(1).forEach(({ value: upper }, i) => {
        const { value: lower, uncertainty = 0 } = saturation[i]!;
        assert.equal(upper.low, lower.high, formula);
        near(saturated(formula, upper.low * (1 - 1e-12)), saturated(formula, upper.low), 1e-9, formula);
        const published = Math.exp(logSaturation(lower, lower.low));
        near(saturated(formula, lower.low) / published, 1, uncertainty, `${formula} from ${lower.low} K`);
      });
    }
  });

  it('falls as steeply as the heat of sublimation or vaporisation says, Clausius and Clapeyron', () => {
    const heat = (name: string, T: number) => {
      const rise = Math.log(saturated(name, T * 1.0005) / saturated(name, T * 0.9995));
      return (8.314462618 * T * rise) / 1.001e-3 / 1.00000025;
    };
    // J/mol; CRC Handbook, enthalpy of fusion and vaporisation; from memory. The vapour is taken as ideal.
    near(heat('H2O', 273), 51059 - 5, 0.01, 'ice');
    near(heat('N2', 55), 6900, 0.05, 'solid nitrogen');
    near(heat('Ar', 70), 7800, 0.05, 'solid argon');
    near(heat('CO2', 170), 26300, 0.03, 'solid carbon dioxide');
    near(heat('NH3', 180), 31200, 0.05, 'solid ammonia');
  });

  it('ends in reasons beyond the data and above the critical point', () => {
    const reason = (name: string, T: number) => {
      const outcome = saturationPressure(gas(name), T);
      return outcome.ok ? 'value' : outcome.reason.kind;
    };
    assert.equal(reason('N2', 126.2), 'above-critical');
    assert.equal(reason('N2', 15), 'outside-range');
    assert.equal(reason('Ne', 42), 'outside-range');
    assert.equal(reason('He', 300), 'above-critical');
    assert.equal(reason('H2O', 647.096), 'value');
    const bare = { ...gas('N2'), saturation: [] };
    const missing = saturationPressure(bare, 77);
    assert.ok(!missing.ok && missing.reason.kind === 'no-data');
    assert.ok(!dewPoint(bare, 1).ok);
    const dense = dewPoint(gas('CO2'), 1e7);
    assert.ok(!dense.ok && dense.reason.kind === 'above-critical');
    assert.ok(!dewPoint(gas('CO2'), 0).ok);
  });

  it('tells what would condense, even where it is colder than the data reach', () => {
    assert.ok(wouldCondense(gas('H2O'), 293.15, 2340));
    assert.ok(!wouldCondense(gas('H2O'), 293.15, 2338));
    assert.ok(wouldCondense(gas('N2'), 4, 1e-3));
    assert.ok(!wouldCondense(gas('N2'), 300, 1e9));
    assert.equal(condensedPhase(gas('H2O'), 270), 'solid');
    assert.equal(condensedPhase(gas('H2O'), 280), 'liquid');
  });
});

describe('the forms of a saturation curve', () => {
  it('take the equation of Antoine', () => {
    // Water from 1 to 100 °C, mmHg and °C: A = 8.07131, B = 1730.63, C = 233.426; common practice, no source.
    const antoine = {
      kind: 'antoine',
      phase: 'liquid',
      low: 274.15,
      high: 373.15,
      pressure: 133.322,
      a: 8.07131,
      b: 1730.63,
      c: 233.426 - 273.15,
    } as const;
    for (const T of [280, 300, 340, 373])
      near(Math.exp(logSaturation(antoine, T)), saturated('H2O', T), 0.01, `${T} K`);
    near(saturationTemperature(antoine, Math.log(101325)), 373.15, 1e-4);
  });
});

describe('condensation figures', () => {
  it('of a damp gas: margin and dew point follow from the partial pressure', () => {
    const damp = figures(mixture({ N2: 0.99, H2O: 0.01 }), 293.15, 1e5);
    near(part(damp, 'H2O', 'saturation_pressure'), 2339.2, 1e-4);
    near(part(damp, 'H2O', 'condensation_margin'), 2.3392, 1e-4);
    // Murphy & Koop 2005, table C1, and IAPWS-95 between 280 and 281 K; from memory.
    assert.ok(Math.abs(part(damp, 'H2O', 'dew_point') - 280.12) < 0.02);
    const whole2 = damp.mixture.get('dew_point')!;
    assert.ok(!whole2.ok && whole2.reason.kind === 'per-species');
    near(whole(figures('H2O', 293.15, 1000), 'dew_point'), part(damp, 'H2O', 'dew_point'), 1e-12);
  });

  it('give the margin one just at the dew point', () => {
    for (const name of ['N2', 'CO2', 'He', 'Xe']) {
      const state = figures(name, 300, 2e4);
      const T = whole(state, 'dew_point');
      near(whole(figures(name, T, 2e4), 'condensation_margin'), 1, 1e-9, name);
    }
  });
});
