import assert from 'node:assert/strict';
import type { Composition } from '../../server/src/physics/composition';
import { pure } from '../../server/src/physics/composition';
import { k, N_A, R } from '../../server/src/physics/constants';
import { interpolated } from '../../server/src/physics/interpolated';
import type { Statement } from '../../server/src/physics/species/statedSpecies';
import { statedSpecies } from '../../server/src/physics/species/statedSpecies';
import { dewPoint, saturationPressure } from '../../server/src/physics/thermo/saturation';
import { figures, gas, near, part, valueOf, whole } from '../support/gases';

const debye = 3.33564e-30;
const ball: Statement = { name: 'ball', molarMass: 0.04, diameter: 3.6e-10 };

const alone = (statement: Statement): Composition => pure(statedSpecies(statement));
const equal = (...statements: Statement[]): Composition => ({
  species: statements.map(statedSpecies),
  moleFractions: statements.map(() => 1 / statements.length),
});

describe('a species that a file states', () => {
  it('of hard spheres is exactly what Chapman & Cowling 1970, sections 10.21 and 14.2, give for them', () => {
    const state = figures(alone(ball), 300, 100);
    const mass = 0.04 / N_A;
    const n = 100 / (k * 300);
    near(whole(state, 'viscosity'), (5 / 16) * (Math.sqrt((mass * k * 300) / Math.PI) / 3.6e-10 ** 2), 1e-12);
    near(whole(state, 'diffusivity'), (3 / 8) * (Math.sqrt((k * 300) / (Math.PI * mass)) / (n * 3.6e-10 ** 2)), 1e-12);
    near(whole(state, 'collision_diameter'), 3.6e-10, 1e-12);
  });

  it('of two kinds of hard spheres diffuses by 3/(8 n d²) √(kT/2πμ), Chapman & Cowling 1970, eq. 14.1,2', () => {
    const other: Statement = { name: 'other', molarMass: 0.01, diameter: 2.4e-10 };
    const state = figures(equal(ball, other), 300, 100);
    const reduced = (0.04 * 0.01) / 0.05 / N_A;
    const expected = ((3 / 8) * Math.sqrt((k * 300) / (2 * Math.PI * reduced))) / ((100 / (k * 300)) * 3e-10 ** 2);
    near(part(state, 'ball', 'diffusivity'), expected, 1e-12);
    near(part(state, 'other', 'diffusivity'), expected, 1e-12);
  });

  it('mixes with its like as one gas, by potential, by diameter, or by its viscosity alone', () => {
    const potential = { name: 'a', molarMass: 0.04, lennardJones: { diameter: 3.5e-10, wellDepth: 200 } };
    for (const one of [potential, ball, { name: 'a', molarMass: 0.04, viscosity: 2e-5 }]) {
      const full = { ...one, heatCapacity: 40 };
      const mixed = figures(equal({ ...full, name: 'a' }, { ...full, name: 'b' }), 350, 100);
      const single = figures(alone(full), 350, 100);
      near(whole(mixed, 'viscosity'), whole(single, 'viscosity'), 1e-9);
      near(whole(mixed, 'thermal_conductivity'), whole(single, 'thermal_conductivity'), 0.01);
      near(part(mixed, 'a', 'diffusivity'), whole(single, 'diffusivity'), 1e-9);
    }
  });

  it('with a dipole follows Stockmayer’s potential: methanol by Monchick & Mason 1961, δ = 0.5, from memory', () => {
    const lennardJones = { diameter: 3.69e-10, wellDepth: 417 };
    const methanol = { name: 'M', molarMass: 32.042e-3, lennardJones, dipoleMoment: 1.7 * debye };
    for (const T of [300, 400, 600]) {
      const built = whole(figures('CH3OH', T, 1), 'viscosity');
      near(whole(figures(alone(methanol), T, 1), 'viscosity'), built, 2e-4);
    }
  });

  it('with everything has every figure that a built-in one has', () => {
    const complete: Statement = {
      name: 'X',
      molarMass: 0.1,
      lennardJones: { diameter: 5e-10, wellDepth: 300 },
      heatCapacity: [
        { at: 250, value: 90 },
        { at: 400, value: 120 },
      ],
      vapourPressure: [
        { at: 250, value: 1e3 },
        { at: 350, value: 1e5 },
      ],
      critical: { temperature: 500, pressure: 4e6, acentric: 0.3 },
    };
    const own = figures(alone(complete), 300, 2000).mixture;
    for (const [name, outcome] of figures('H2O', 300, 2000).mixture) {
      if (outcome.ok) assert.ok(own.get(name)?.ok, name);
    }
  });

  it('of one atom conducts as one atom does, 15/4 R/M η', () => {
    const state = figures(alone({ ...ball, heatCapacity: 2.5 * R }), 300, 100);
    near(whole(state, 'thermal_conductivity'), ((3.75 * R) / 0.04) * whole(state, 'viscosity'), 1e-12);
  });

  it('takes nothing from a built-in gas of its name', () => {
    const { notes, mixture } = figures(alone({ ...ball, name: 'He' }), 4, 100);
    assert.deepEqual(
      ['second_virial', 'saturation_pressure', 'heat_capacity_cp'].map((name) => mixture.get(name)?.ok),
      [false, false, false],
    );
    assert.deepEqual(notes, []);
    const mixed = figures(
      { species: [statedSpecies({ ...ball, name: 'CO2' }), gas('N2')], moleFractions: [0.5, 0.5] },
      300,
      1,
    );
    const named = figures({ species: [statedSpecies(ball), gas('N2')], moleFractions: [0.5, 0.5] }, 300, 1);
    assert.equal(part(mixed, 'CO2', 'diffusivity'), part(named, 'ball', 'diffusivity'));
  });

  it('finds the dew point of its saturation pressure, within its table and nowhere else', () => {
    const points = [300, 320, 350].map((at) => ({ at, value: 1e4 * Math.exp(4000 * (1 / 320 - 1 / at)) }));
    const vapour = statedSpecies({ ...ball, vapourPressure: points });
    for (const T of [300, 311, 320, 333, 350]) {
      const p = valueOf(saturationPressure(vapour, T));
      near(p, 1e4 * Math.exp(4000 * (1 / 320 - 1 / T)), 1e-12);
      near(valueOf(dewPoint(vapour, p)), T, 1e-12);
    }
    assert.ok(!saturationPressure(vapour, 299.9).ok && !saturationPressure(vapour, 350.1).ok);
  });

  it('has the hazard classes that its text lists, and no others', () => {
    const classes = (hazards: string) => statedSpecies({ ...ball, hazards }).hazards.map(({ value }) => value);
    assert.deepEqual(classes('Flammable gas; acute toxicity, inhalation'), [
      'flammable gas',
      'acute toxicity, inhalation',
    ]);
    assert.deepEqual(classes('non-flammable gas'), []);
    assert.deepEqual(classes('none known'), []);
  });
});

describe('a table of points', () => {
  it('is a power law over a decade, else a straight line, and stands still beyond its ends', () => {
    const power = [1, 10, 100].map((at) => ({ at, value: at ** 1.5 }));
    near(interpolated(power, 3), 3 ** 1.5, 1e-12);
    const line = [1, 2, 4].map((at) => ({ at, value: 5 + at }));
    near(interpolated(line, 3), 8, 1e-12);
    assert.equal(interpolated(line, 0), 6);
    assert.equal(interpolated(line, 9), 9);
  });
});
