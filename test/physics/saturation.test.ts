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

const saturated = (name: string, T: number) => valueOf(saturationPressure(gas(name), T));

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
