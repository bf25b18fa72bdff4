import assert from 'node:assert/strict';
import { speciesList } from '../../server/src/physics/species/list';
import { viscosity } from '../../server/src/physics/transport/viscosity';
import { figures, gas, mixture, valueOf, whole } from '../support/gases';

const micro = 1e6;
const eta = (name: string, T: number) => micro * valueOf(viscosity(gas(name), T));

describe('pure viscosity', () => {
  // Beyond its range a correlation is continued by the potential, where there is one.
  const known = speciesList.filter(({ viscosity, lennardJones }) => viscosity && lennardJones);

  it('of dry air follows from its three parts', () => {
    const parts = mixture({ N2: 0.7812, O2: 0.2096, Ar: 0.0092 });
    for (const T of [150, 200, 250, 300, 400, 600, 1000]) {
      const blended = whole(figures(parts, T), 'viscosity') * micro;
      // Both correlations state 1 %.
      assert.ok(Math.abs(blended / eta('air', T) - 1) < 0.01, `${T} K: ${blended}, ${eta('air', T)}`);
    }
  });

  it('rises with temperature, without a step at the ends of the ranges', () => {
    for (const species of known) {
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
    for (const species of known) {
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
