import assert from 'node:assert/strict';
import { speciesList } from '../../server/src/physics/species/list';
import { fittedVirial, measuredVirial } from '../../server/src/physics/thermo/measuredVirial';
import { correspondingOf, tsonopoulosVirial } from '../../server/src/physics/thermo/tsonopoulos';
import { secondVirial } from '../../server/src/physics/thermo/virial';
import { figures, gas, mixture, near, part, valueOf, whole } from '../support/gases';

/** cm³/mol. */
const B = (parts: Readonly<Record<string, number>>, T: number) =>
  1e6 * valueOf(secondVirial(mixture(parts), T)).coefficient;

describe('second virial coefficients', () => {
  const known = speciesList.filter((species) => correspondingOf(species, 300) !== undefined);

  it('are continuous at the ends of the fits', () => {
    for (const { formula } of speciesList) {
      const fit = measuredVirial(formula);
      for (const end of fit ? [fit.low, fit.high] : []) {
        near(
          B({ [formula]: 1 }, end * (1 + 1e-9)),
          B({ [formula]: 1 }, end * (1 - 1e-9)),
          1e-6,
          `${formula} at ${end} K`,
        );
      }
    }
  });

  it('as fitted agree with corresponding states where both are good', () => {
    for (const name of ['N2', 'O2', 'Ar', 'Kr', 'Xe', 'CO', 'CO2', 'CH4', 'H2', 'Ne', 'SF6']) {
      for (const T of [260, 300, 350, 400]) {
        const fit = 1e6 * fittedVirial(measuredVirial(name)!, T);
        const corresponding = 1e6 * tsonopoulosVirial(correspondingOf(gas(name), T)!, T);
        const allowed = Math.max(5, 0.05 * Math.abs(fit));
        assert.ok(Math.abs(fit - corresponding) < allowed, `${name} at ${T} K: ${fit}, ${corresponding}`);
      }
    }
  });

  it('of a mixture reduce to the pure ones', () => {
    for (const { formula } of known) {
      const other = formula === 'Xe' ? 'Kr' : 'Xe';
      near(B({ [formula]: 1, [other]: 0 }, 310), B({ [formula]: 1 }, 310), 1e-12, formula);
    }
  });

  it('of a gas mixed with itself under another name stay as they are', () => {
    for (const name of ['SO2', 'N2O', 'C2H6', 'CH3OH']) {
      const twice = { ...gas(name), formula: 'other' };
      const composition = { species: [gas(name), twice], moleFractions: [0.3, 0.7] };
      near(1e6 * valueOf(secondVirial(composition, 310)).coefficient, B({ [name]: 1 }, 310), 1e-9, name);
    }
  });

  it('of air are those of its parts', () => {
    const parts = { N2: 0.7812, O2: 0.2096, Ar: 0.0092 };
    for (const T of [150, 300, 600]) near(B({ air: 1 }, T), B(parts, T), 1e-9);
    near(B({ air: 0.5, N2: 0.5 }, 300), B({ N2: 0.8906, O2: 0.1048, Ar: 0.0046 }, 300), 1e-9);
  });

  it('rise from below zero to above it as it gets warm, and stay finite', () => {
    for (const { formula } of known) {
      for (let T = 1e-3; T < 1e6; T *= 1.7) {
        const value = B({ [formula]: 1 }, T);
        assert.ok(Number.isFinite(value), `${formula} at ${T} K`);
      }
      assert.ok(B({ [formula]: 1 }, 150) < B({ [formula]: 1 }, 300), formula);
    }
  });

  it('are missing where no critical point is known', () => {
    const bare = { formula: 'X', names: [], molarMass: gas('N2').molarMass, hazards: [] };
    const missing = secondVirial({ species: [bare], moleFractions: [1] }, 300);
    assert.ok(!missing.ok && missing.reason.kind === 'no-data');
  });
});

describe('compressibility', () => {
  it('is 1 + Bp/(RT), and tends to one as the pressure falls', () => {
    // CO2 at 300 K and 1 atm: 0.9950; Span & Wagner 1996; from memory.
    assert.ok(Math.abs(whole(figures('CO2', 300, 101325), 'compressibility_factor') - 0.995) < 2e-4);
    near(whole(figures('N2', 300, 1e-3), 'compressibility_factor'), 1, 1e-10);
    const state = figures(mixture({ N2: 0.5, CO2: 0.5 }), 300, 1e5);
    const expected = 1 + (whole(state, 'second_virial') * 1e5) / (8.31446261815324 * 300);
    near(whole(state, 'compressibility_factor'), expected, 1e-12);
    near(part(state, 'CO2', 'second_virial'), whole(figures('CO2', 300, 1e5), 'second_virial'), 1e-12);
  });

  it('ends in a reason where the series has lost its meaning', () => {
    const outcome = figures('N2', 300, 1e9).mixture.get('compressibility_factor')!;
    assert.ok(!outcome.ok && outcome.reason.kind === 'outside-range');
  });
});
