import assert from 'node:assert/strict';
import { speciesList } from '../../server/src/physics/species/list';
import { viscosity } from '../../server/src/physics/transport/viscosity';
import { figures, gas, valueOf, whole } from '../support/gases';

const micro = 1e6;
const eta = (name: string, T: number) => micro * valueOf(viscosity(gas(name), T));

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
    for (const { formula, viscosity, heatCapacity, lennardJones, conductivity } of speciesList) {
      if (!viscosity || !heatCapacity || !lennardJones) continue;
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
