import assert from 'node:assert/strict';
import { evaluateState } from '../../server/src/physics/state/evaluateState';
import { everyFigure, mixture, near, part, request, whole } from '../support/gases';

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
