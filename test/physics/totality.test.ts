import assert from 'node:assert/strict';
import type { Composition } from '../../server/src/physics/composition';
import { pure } from '../../server/src/physics/composition';
import { speciesList } from '../../server/src/physics/species/list';
import type { Species } from '../../server/src/physics/species/species';
import { evaluateState } from '../../server/src/physics/state/evaluateState';
import { everyFigure, figures, gas, mixture, request, whole } from '../support/gases';

describe('totality', () => {
  const temperatures = [1e-6, 1e-3, 1, 3.9, 20, 77.3, 199.9, 273.15, 300, 1000, 6001, 2e4, 1e6];
  const pressures = [1e-300, 1e-200, 1e-30, 1e-9, 1, 101325, 1e9, 1e12];
  const complete = speciesList.filter(isComplete);
  const gases = [
    ...speciesList.map(({ formula }) => pure(gas(formula))),
    mixture(Object.fromEntries(complete.map(({ formula }) => [formula, 1 / complete.length]))),
    mixture({ H2: 1, SF6: 0 }),
    mixture({ He: 1 - 1e-12, SF6: 1e-12 }),
  ];

  it('every figure is a sound number or a reason, from 1 µK to 1 MK and from 1e-300 to 1e12 Pa', () => {
    for (const composition of gases) {
      for (const T of temperatures) {
        for (const p of pressures) {
          for (const { name, outcome } of everyFigure(figures(composition, T, p))) {
            if (outcome.ok) {
              const { value } = outcome.value;
              const lowest = name.endsWith('second_virial') ? -Infinity : 0;
              assert.ok(lowest <= value && Math.abs(value) < Infinity, `${name} at ${T} K, ${p} Pa: ${value}`);
            } else {
              const reasons = ['per-species', 'not-finite', ...absence(composition), ...beyond(name)];
              assert.ok(reasons.includes(outcome.reason.kind), JSON.stringify(outcome.reason));
            }
          }
        }
      }
    }
  });

  it('has every figure of every gas where gases are used', () => {
    for (const composition of gases) {
      for (const T of [4, 77, 300, 1200]) {
        for (const p of [1e-12, 1e-3, 1, 1e5]) {
          for (const { name, outcome } of everyFigure(figures(composition, T, p))) {
            const reasons = ['per-species', 'not-finite', ...absence(composition), ...beyond(name)];
            assert.ok(outcome.ok || reasons.includes(outcome.reason.kind), name);
            if (!outcome.ok && outcome.reason.kind === 'not-finite') {
              assert.match(name, /(monolayer_time|condensation_margin)$/);
            }
          }
        }
      }
    }
  });

  it('unsound requests end in reasons too', () => {
    const base = request('N2', 300, 1);
    const outcome = evaluateState({ ...base, collisionDiameter: 0 }).mixture.get('collision_diameter')!;
    assert.ok(!outcome.ok && outcome.reason.kind === 'not-positive');
    const bare = { formula: 'X', names: [], molarMass: gas('N2').molarMass, hazards: [] };
    const unknown = figures(pure(bare), 300, 1);
    for (const name of ['viscosity', 'mean_free_path', 'collision_diameter', 'diffusivity', 'sound_speed', 'prandtl']) {
      const missing = unknown.mixture.get(name)!;
      assert.ok(!missing.ok && missing.reason.kind === 'no-data', name);
    }
    assert.ok(0 < whole(unknown, 'mean_speed'));
    const spheres = evaluateState({ ...request(pure(bare), 300, 1), collisionDiameter: 3e-10 });
    assert.ok(0 < whole(spheres, 'mean_free_path_hard_sphere'));
  });
});

/** Whether nothing is missing that a figure could need. */
function isComplete({ viscosity, heatCapacity, lennardJones }: Species): boolean {
  return viscosity !== undefined && heatCapacity !== undefined && lennardJones !== undefined;
}

/** What is not known of a gas is absent, and only of such a gas. */
function absence({ species }: Composition): readonly string[] {
  return species.every(isComplete) ? [] : ['no-data', 'outside-range'];
}

/**
 * Condensation is known within the data of a vapour, and there is none above its critical point. The virial series stops where
 * the gas is dense, and begins with the critical point.
 */
function beyond(name: string): readonly string[] {
  if (/(saturation_pressure|condensation_margin|dew_point)$/.test(name)) {
    return ['above-critical', 'outside-range', 'no-data'];
  }
  return /(second_virial|compressibility_factor)$/.test(name) ? ['outside-range', 'no-data'] : [];
}

describe('notes', () => {
  const kinds = (name: string, T: number, p: number) => figures(name, T, p).notes.map(({ kind }) => kind);

  it('tell a gas that is cold, dense, or beyond its data, and nothing of one that is not', () => {
    assert.deepEqual(kinds('N2', 300, 1e5), []);
    assert.deepEqual(kinds('Ar', 300, 3e6), ['dense', 'not-ideal']);
    assert.deepEqual(kinds('CO2', 273.15, 1.7e5), ['not-ideal']);
    assert.deepEqual(kinds('H2O', 300, 4000), ['condensing']);
    assert.ok(kinds('He', 1, 2000).includes('quantum'));
    assert.ok(kinds('N2', 30, 1).includes('outside-range'));
    assert.deepEqual(kinds('N2', 150, 1), ['outside-range']);
  });

  it('go with the figures that rest on the data', () => {
    const cold = figures('N2', 150, 1);
    const notes = (name: string) => {
      const outcome = cold.mixture.get(name)!;
      return outcome.ok ? outcome.notes.length : -1;
    };
    assert.equal(notes('viscosity'), 0);
    assert.equal(notes('sound_speed'), 1);
    assert.equal(notes('prandtl'), 1);
    assert.equal(notes('mean_speed'), 0);
  });
});
