import assert from 'node:assert/strict';
import { compositionOfMoles } from '../../server/src/physics/composition';
import { speciesList } from '../../server/src/physics/species/list';
import { stateProperties } from '../../server/src/physics/state/properties';
import { everyFigure, figures, gas, mixture, near, part, valueOf, whole } from '../support/gases';

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
    for (const { formula, viscosity } of speciesList) {
      if (viscosity === undefined) continue;
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
