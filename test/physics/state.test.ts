import assert from 'node:assert/strict';
import { kelvin, kilogramPerCubicMetre, pascal, perCubicMetre } from '../../server/src/physics/brands';
import {
  compositionOfMasses,
  compositionOfMoles,
  massFractions,
  meanMolarMass,
  pure,
} from '../../server/src/physics/composition';
import { measuredDiffusionSource } from '../../server/src/physics/transport/measuredDiffusion';
import { sources } from '../../server/src/physics/sources';
import { speciesByName, speciesList } from '../../server/src/physics/species/list';
import { solveState } from '../../server/src/physics/state/closure';
import { evaluateState } from '../../server/src/physics/state/evaluateState';
import { statePropertyNamed, stateProperties } from '../../server/src/physics/state/properties';
import { everyFigure, figures, gas, mixture, part, request, siteDensity, valueOf, whole } from '../support/gases';

const near = (a: number, b: number, relative: number, what = '') =>
  assert.ok(a === b || Math.abs(a / b - 1) <= relative, `${what} ${a}, ${b}`);

describe('closure', () => {
  const air = pure(gas('air'));
  const point = valueOf(solveState(air, { temperature: kelvin(250), pressure: pascal(7) }));
  const density = kilogramPerCubicMetre(whole(figures('air', 250, 7), 'density'));

  it('gives the same state from every pair that fixes it', () => {
    const pairs = [
      { pressure: point.pressure, numberDensity: point.numberDensity },
      { temperature: point.temperature, numberDensity: point.numberDensity },
      { pressure: point.pressure, density },
      { temperature: point.temperature, density },
    ];
    for (const pair of pairs) {
      const solved = valueOf(solveState(air, pair));
      near(solved.temperature, 250, 1e-14);
      near(solved.pressure, 7, 1e-14);
      near(solved.numberDensity, point.numberDensity, 1e-14);
    }
  });

  const check = (inputs: Parameters<typeof solveState>[1], kind: string) => {
    const outcome = solveState(air, inputs);
    assert.ok(!outcome.ok, JSON.stringify(outcome));
    assert.equal(outcome.reason.kind, kind);
  };

  it('says why there is no state', () => {
    check({}, 'insufficient');
    check({ pressure: pascal(1) }, 'insufficient');
    check({ numberDensity: perCubicMetre(1e20), density: kilogramPerCubicMetre(1) }, 'insufficient');
    check({ pressure: pascal(1), temperature: kelvin(300), numberDensity: perCubicMetre(1) }, 'surplus');
    check({ pressure: pascal(-1), temperature: kelvin(300) }, 'not-positive');
    check({ pressure: pascal(1), temperature: kelvin(0) }, 'not-positive');
    check({ pressure: pascal(NaN), temperature: kelvin(300) }, 'not-finite');
    check({ pressure: pascal(Infinity), temperature: kelvin(300) }, 'not-finite');
    check({ pressure: pascal(1e300), temperature: kelvin(1e-300) }, 'not-finite');
  });
});

describe('composition', () => {
  const species = ['He', 'SF6', 'N2'].map(gas);

  it('turns mole into mass fractions and back', () => {
    const moles = valueOf(compositionOfMoles(species, [0.2, 0.3, 0.5]));
    const back = valueOf(compositionOfMasses(species, massFractions(moles)));
    back.moleFractions.forEach((x, i) => near(x, moles.moleFractions[i]!, 1e-14));
    near(meanMolarMass(moles), 0.2 * 4.002602e-3 + 0.3 * 146.05e-3 + 0.5 * 28.014e-3, 1e-14);
  });

  it('of dry air adds up, in sum and in molar mass', () => {
    const parts = gas('air').blend!.value;
    near(
      Object.values(parts).reduce((a, b) => a + b, 0),
      1,
      1e-12,
    );
    near(meanMolarMass(mixture(parts)), gas('air').molarMass.value, 2e-4);
  });

  it('refuses fractions that do not add up, or are below nought', () => {
    const kind = (fractions: number[]) => {
      const outcome = compositionOfMoles(species, fractions);
      return outcome.ok ? 'ok' : outcome.reason.kind;
    };
    assert.equal(kind([0.2, 0.3, 0.4]), 'fraction-sum');
    assert.equal(kind([0.2, 0.8]), 'fraction-sum');
    assert.equal(kind([-0.2, 0.7, 0.5]), 'not-positive');
    assert.equal(kind([NaN, 0.5, 0.5]), 'not-positive');
    const empty = compositionOfMoles([], []);
    assert.ok(!empty.ok && empty.reason.kind === 'empty-composition');
  });
});

describe('limits and identities', () => {
  it('a mixture with nothing of the other is the pure gas', () => {
    for (const one of speciesList) {
      const alone = figures(one.formula, 350, 500);
      for (const other of ['He', 'SF6', 'H2O'].filter((name) => name !== one.formula)) {
        const mixed = figures(mixture({ [one.formula]: 1, [other]: 0 }), 350, 500);
        for (const { name } of stateProperties) {
          const outcome = alone.mixture.get(name)!;
          if (!outcome.ok || mixed.mixture.get(name)?.ok === false) continue;
          near(whole(mixed, name), outcome.value.value, 1e-12, `${one.formula} in ${other}: ${name}`);
        }
      }
    }
  });

  it('a gas mixed with its like stays as it is', () => {
    const alias = { ...gas('Ar'), formula: 'Ar′' };
    const both = valueOf(compositionOfMoles([gas('Ar'), alias], [0.3, 0.7]));
    const mixed = figures(both, 300, 500);
    const alone = figures('Ar', 300, 500);
    for (const name of [
      'viscosity',
      'thermal_conductivity',
      'mean_free_path',
      'mean_free_path_hard_sphere',
      'prandtl',
    ]) {
      near(whole(mixed, name), whole(alone, name), 1e-12, name);
    }
    near(part(mixed, 'Ar', 'diffusivity'), whole(alone, 'diffusivity'), 1e-12);
  });

  it('the order of the species does not matter', () => {
    const parts = { N2: 0.4, O2: 0.2, H2: 0.2, H2O: 0.1, Xe: 0.1 };
    const forth = figures(mixture(parts), 300, 10);
    const back = figures(mixture(Object.fromEntries(Object.entries(parts).reverse())), 300, 10);
    for (const { name, outcome } of everyFigure(forth)) {
      const other = everyFigure(back).find((figure) => figure.name === name)!.outcome;
      if (outcome.ok) near(outcome.value.value, valueOf(other).value, 1e-11, name);
      else assert.ok(!other.ok);
    }
  });

  it('path times density does not depend on density', () => {
    for (const name of ['mean_free_path', 'mean_free_path_hard_sphere']) {
      const product = (p: number) => {
        const state = figures(mixture({ He: 0.5, Kr: 0.5 }), 300, p);
        return whole(state, name) * whole(state, 'number_density');
      };
      for (const p of [1e-10, 1e-3, 1e5]) near(product(p), product(1), 1e-12, name);
    }
  });

  it('the two paths of one gas keep the ratio of first-order theory, 5π/16', () => {
    for (const { formula } of speciesList) {
      const state = figures(formula, 300, 100);
      near(whole(state, 'mean_free_path') / whole(state, 'mean_free_path_hard_sphere'), (5 * Math.PI) / 16, 1e-12);
    }
  });

  it('two species diffuse at one rate, whatever the shares', () => {
    for (const x of [0, 0.1, 0.5, 0.9, 1]) {
      const state = figures(mixture({ He: x, Xe: 1 - x }), 300, 100);
      near(part(state, 'He', 'diffusivity'), part(state, 'Xe', 'diffusivity'), 1e-14);
      near(
        part(state, 'He', 'diffusivity'),
        part(figures(mixture({ He: 0.3, Xe: 0.7 }), 300, 100), 'He', 'diffusivity'),
        1e-12,
      );
    }
  });

  it('the viscosity of a mixture of helium and argon passes through a maximum, as is known', () => {
    const at = (x: number) => whole(figures(mixture({ He: x, Ar: 1 - x }), 293), 'viscosity');
    assert.ok(at(0) < at(0.4) && at(1) < at(0.4));
  });
});

describe('trials', () => {
  const composition = mixture({ N2: 0.5, He: 0.2, CO2: 0.1, D2: 0.1, H2O: 0.1 });
  const base = request(composition, 310, 20);
  const plain = evaluateState(base);
  const at = (key: string, factor: number) => evaluateState(base, { factors: new Map([[key, factor]]) });

  it('scale each figure in proportion at their origin', () => {
    const check = (key: string, property: string, exponent: number) =>
      near(whole(at(key, 1.1), property), whole(plain, property) * 1.1 ** exponent, 1e-12, `${key} on ${property}`);
    check('mixture_viscosity', 'viscosity', 1);
    check('mixture_viscosity', 'mean_free_path', 1);
    check('mixture_viscosity', 'mean_free_path_hard_sphere', 0);
    check('mixture_conductivity', 'prandtl', -1);
    check('viscosity:N2', 'density', 0);
    near(part(at('viscosity:N2', 1.1), 'N2', 'viscosity'), part(plain, 'N2', 'viscosity') * 1.1, 1e-12);
    near(
      part(at('viscosity:N2', 1.1), 'N2', 'collision_diameter'),
      part(plain, 'N2', 'collision_diameter') / Math.sqrt(1.1),
      1e-12,
    );
    near(
      part(at('heat_capacity:N2', 1.1), 'N2', 'heat_capacity_cp'),
      part(plain, 'N2', 'heat_capacity_cp') * 1.1,
      1e-12,
    );
    near(part(at('eucken', 1.1), 'D2', 'thermal_conductivity'), part(plain, 'D2', 'thermal_conductivity') * 1.1, 1e-12);
    near(part(at('eucken', 1.1), 'N2', 'thermal_conductivity'), part(plain, 'N2', 'thermal_conductivity'), 1e-12);
  });

  it('move the viscosity of the mixture by first-degree homogeneity: all its species together as one factor', () => {
    const factors = new Map(composition.species.map(({ formula }) => [`viscosity:${formula}`, 1.05]));
    near(whole(evaluateState(base, { factors }), 'viscosity'), whole(plain, 'viscosity') * 1.05, 1e-12);
  });

  it('are differences that settle to a derivative', () => {
    for (const { key } of plain.modelErrors) {
      for (const property of ['viscosity', 'thermal_conductivity', 'mean_free_path', 'sound_speed']) {
        const slope = (step: number) => (whole(at(key, 1 + step), property) / whole(plain, property) - 1) / step;
        assert.ok(
          Math.abs(slope(1e-4) - slope(-1e-4)) < 1e-3 * Math.max(1, Math.abs(slope(1e-4))),
          `${key} on ${property}`,
        );
      }
    }
  });

  it('each move something, and every error has a size', () => {
    for (const { key, relative } of plain.modelErrors) {
      assert.ok(0 < relative && relative < 1, key);
      const moved = everyFigure(at(key, 1 + relative)).some(({ outcome }, i) => {
        const before = everyFigure(plain)[i]!.outcome;
        return outcome.ok && before.ok && outcome.value.value !== before.value.value;
      });
      assert.ok(moved, key);
    }
  });
});

describe('totality', () => {
  const temperatures = [1e-6, 1e-3, 1, 3.9, 20, 77.3, 199.9, 273.15, 300, 1000, 6001, 2e4, 1e6];
  const pressures = [1e-300, 1e-200, 1e-30, 1e-9, 1, 101325, 1e9, 1e12];
  const gases = [
    ...speciesList.map(({ formula }) => pure(gas(formula))),
    mixture(Object.fromEntries(speciesList.map(({ formula }) => [formula, 1 / speciesList.length]))),
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
              assert.ok(0 <= value && value < Infinity, `${name} at ${T} K, ${p} Pa: ${value}`);
            } else {
              assert.ok(['per-species', 'not-finite'].includes(outcome.reason.kind), JSON.stringify(outcome.reason));
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
            assert.ok(
              outcome.ok || outcome.reason.kind === 'per-species' || outcome.reason.kind === 'not-finite',
              name,
            );
            if (!outcome.ok && outcome.reason.kind === 'not-finite') assert.ok(name.endsWith('monolayer_time'), name);
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

describe('notes', () => {
  const kinds = (name: string, T: number, p: number) => figures(name, T, p).notes.map(({ kind }) => kind);

  it('tell a gas that is cold, dense, or beyond its data, and nothing of one that is not', () => {
    assert.deepEqual(kinds('N2', 300, 1e5), []);
    assert.deepEqual(kinds('Ar', 300, 3e6), ['dense']);
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

describe('lists', () => {
  it('hold every output of a state, once', () => {
    const names = stateProperties.map(({ name }) => name);
    assert.equal(new Set(names).size, names.length);
    assert.equal(names.length, 35);
    for (const name of names) assert.equal(statePropertyNamed(name)?.name, name);
    for (const row of stateProperties) assert.equal(row.perSpecies, row.computeFor !== undefined, row.name);
  });

  it('know every gas by its formula and its names', () => {
    assert.equal(speciesList.length, 16);
    for (const species of speciesList) {
      for (const name of [species.formula, ...species.names]) assert.equal(speciesByName(name), species);
    }
    assert.equal(speciesByName('unobtainium'), undefined);
  });

  it('cite nothing in vain', () => {
    const data = JSON.stringify([speciesList, stateProperties, measuredDiffusionSource]);
    const methods = figures(mixture({ N2: 0.5, Ar: 0.5 }), 300, 1);
    const cited = data + JSON.stringify(everyFigure(methods));
    for (const [id, { authors, year }] of Object.entries(sources)) {
      const surname = authors.split(/[,;]/)[0]!;
      const mentioned = new RegExp(`${surname}[^'"]{0,10}${year}`, 'u').test(cited);
      assert.ok(cited.includes(`"${id}"`) || mentioned, id);
    }
  });

  it('give every figure its method and sources', () => {
    const state = figures(mixture({ N2: 0.5, He: 0.5 }), 300, 1);
    for (const { name, outcome } of everyFigure(state)) {
      if (!outcome.ok) continue;
      assert.ok(outcome.value.method.length > 0, name);
    }
    assert.deepEqual(valueOf(state.species.get('N2')?.get('viscosity')).sources, ['Lemmon & Jacobsen 2004']);
    assert.deepEqual(valueOf(state.mixture.get('viscosity')).range, { quantity: 'temperature', low: 70, high: 2000 });
    assert.equal(siteDensity, state.mixture.size > 0 ? 1e19 : 0);
  });
});
