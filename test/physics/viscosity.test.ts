import assert from 'node:assert/strict';
import { speciesList } from '../../server/src/physics/species/list';
import { viscosity } from '../../server/src/physics/transport/viscosity';
import { figures, gas, mixture, valueOf, whole } from '../support/gases';
import type { ReferenceRow } from '../support/reference';
import { references, withinStated } from '../support/reference';

const micro = 1e6;
const eta = (name: string, T: number) => micro * valueOf(viscosity(gas(name), T));

/** CRC Handbook, "Viscosity of gases" (Huber & Harvey), µPa s at 100 kPa or in the dilute limit. */
const handbookViscosities: readonly (readonly [string, Readonly<Record<number, string>>])[] = [
  ['air', { 100: '7.1', 200: '13.3', 300: '18.5', 400: '23.1', 500: '27.1', 600: '30.8' }],
  ['Ar', { 100: '8.1', 200: '15.9', 300: '22.7', 400: '28.6', 500: '33.9', 600: '38.8' }],
  ['SF6', { 300: '15.3', 400: '19.7', 500: '23.8', 600: '27.6' }],
  ['H2', { 100: '4.1', 200: '6.8', 300: '8.9', 400: '10.9', 500: '12.8', 600: '14.5' }],
  ['D2', { 100: '5.9', 200: '9.6', 300: '12.6', 400: '15.4', 500: '17.9', 600: '20.3' }],
  ['H2O', { 300: '9.8', 400: '13.4', 500: '17.3', 600: '21.4' }],
  ['NH3', { 300: '10.2', 400: '14.0', 500: '17.9', 600: '21.7' }],
  ['He', { 100: '9.6', 200: '15.1', 300: '19.9', 400: '24.3', 500: '28.3', 600: '32.2' }],
  ['Kr', { 200: '17.4', 300: '25.5', 400: '32.9', 500: '39.6', 600: '45.8' }],
  ['N2', { 100: '7.0', 200: '12.9', 300: '17.9', 400: '22.2', 500: '26.1', 600: '29.6' }],
  ['Ne', { 200: '24.1', 300: '31.9', 400: '38.6', 500: '44.8', 600: '50.6' }],
  ['O2', { 100: '7.7', 200: '14.7', 300: '20.7', 400: '25.8', 500: '30.5', 600: '34.7' }],
  ['Xe', { 300: '23.2', 400: '30.5', 500: '37.2', 600: '43.5' }],
  ['CO', { 200: '12.9', 300: '17.8', 400: '22.1', 500: '25.8', 600: '29.1' }],
  ['CO2', { 200: '10.1', 300: '15.0', 400: '19.7', 500: '24.0', 600: '28.0' }],
  ['CH4', { 100: '3.9', 200: '7.7', 300: '11.1', 400: '14.2' }],
];

references(
  'viscosity against the handbook',
  handbookViscosities.flatMap(([name, row]) =>
    Object.entries(row).map(([T, printed]) => ({
      printed,
      got: () => eta(name, Number(T)),
      source: 'CRC Handbook of Chemistry and Physics, Viscosity of Gases, Huber & Harvey',
      where: `${name}, ${T} K`,
      within: withinStated(printed, gas(name).viscosity?.uncertainty ?? 0),
    })),
  ),
);

references('viscosity against the check values of the correlations', [
  ...[
    { name: 'N2', at100: '6.90349', at300: '17.8771' },
    { name: 'Ar', at100: '8.18940', at300: '22.7241' },
    { name: 'O2', at100: '7.70243', at300: '20.6307' },
    { name: 'air', at100: '7.09559', at300: '18.5230' },
  ].flatMap(({ name, at100, at300 }): ReferenceRow[] => {
    const source = 'Lemmon & Jacobsen 2004';
    return [
      { printed: at100, got: () => eta(name, 100), source, where: `table V, ${name} at 100 K, ρ = 0; from memory` },
      { printed: at300, got: () => eta(name, 300), source, where: `table V, ${name} at 300 K, ρ = 0; from memory` },
    ];
  }),
  {
    printed: '15.2887',
    got: () => eta('SF6', 300),
    source: 'Quiñones-Cisneros, Huber & Deiters 2012',
    where: 'check value at 300 K, ρ = 0; from memory',
    within: { tolerance: 1e-3, because: 'the five coefficients are printed to 1e-6 mPa s, and they cancel' },
  },
  {
    printed: '15.02',
    got: () => eta('CO2', 300),
    source: 'Fenghour, Wakeham & Vesovic 1998',
    where: 'table of check values, 300 K and 0.1 MPa; from memory',
    within: { tolerance: 0.015, because: 'the first density term, left out here, adds 0.007 µPa s at 1.773 kg/m³' },
  },
]);

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
