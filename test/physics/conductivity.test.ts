import assert from 'node:assert/strict';
import { speciesList } from '../../server/src/physics/species/list';
import { viscosity } from '../../server/src/physics/transport/viscosity';
import { figures, gas, valueOf, whole } from '../support/gases';
import { references, withinStated } from '../support/reference';

const micro = 1e6;
const eta = (name: string, T: number) => micro * valueOf(viscosity(gas(name), T));

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
