import assert from 'node:assert/strict';
import { pure } from '../../server/src/physics/composition';
import { k, N_A, R } from '../../server/src/physics/constants';
import { evaluateState } from '../../server/src/physics/state/evaluateState';
import type { StateFigures } from '../../server/src/physics/state/evaluateState';
import { atmosphere, figures, gas, mixture, part, request, whole } from '../support/gases';
import { halfUnit, references } from '../support/reference';

references('constants', [
  { printed: '1.380649e-23', got: () => k, source: 'CODATA 2018', where: 'Boltzmann constant, J/K, exact' },
  { printed: '6.02214076e23', got: () => N_A, source: 'CODATA 2018', where: 'Avogadro constant, 1/mol, exact' },
  {
    printed: '8.314462618',
    got: () => R,
    source: 'CODATA 2018',
    where: 'molar gas constant, J/(mol K), exact, cut off',
  },
  {
    printed: '2.686780111e25',
    got: () => whole(figures('N2', 273.15, atmosphere), 'number_density'),
    source: 'CODATA 2018',
    where: 'Loschmidt constant (273.15 K, 101.325 kPa), 1/m³, exact, cut off',
    within: { tolerance: 1e16, because: 'the list cuts the exact value off instead of rounding it' },
  },
]);

/** The standard reckons with one molecule of 28.9644 g/mol and 3.65 Å. */
function standardAir(temperature: number, pressure: number): StateFigures {
  const air = { ...gas('air'), molarMass: { ...gas('air').molarMass, value: 28.9644e-3 } };
  const composition = pure(air);
  return evaluateState({ ...request(composition, temperature, pressure), collisionDiameter: 3.65e-10 });
}

const oldConstants = (printed: string) => ({
  tolerance: halfUnit(printed) + 6e-5 * Number(printed),
  because:
    'the standard has the constants of 1969 (k is 2e-5 smaller), and prints temperature and pressure to five digits',
});

/** Geometric altitude in km, T in K, p in Pa, n in 1/m³, mean speed in m/s, collision frequency in 1/s, mean free path in m. */
const standardAtmosphere: readonly (readonly [number, number, number, string, string, string, string, string])[] = [
  [0, 288.15, 101325, '2.5470e25', '458.94', '6.9189e9', '6.6332e-8', 'table II'],
  [20, 216.65, 5.5293e3, '1.8486e24', '397.95', '4.3543e8', '9.1393e-7', 'table II; from memory'],
  [50, 270.65, 79.779, '2.1351e22', '444.79', '5.6211e6', '7.9130e-5', 'table II; from memory'],
];

references(
  'U.S. Standard Atmosphere',
  standardAtmosphere.flatMap(([altitude, T, p, density, speed, frequency, path, place]) => {
    const state = () => standardAir(T, p);
    return [
      { printed: density, got: () => whole(state(), 'number_density') },
      { printed: speed, got: () => whole(state(), 'mean_speed') },
      { printed: frequency, got: () => whole(state(), 'collision_frequency') },
      { printed: path, got: () => whole(state(), 'mean_free_path_hard_sphere') },
    ].map((row) => ({
      ...row,
      source: 'U.S. Standard Atmosphere 1976',
      where: `${place}, ${altitude} km`,
      within: oldConstants(row.printed),
    }));
  }),
);

references('U.S. Standard Atmosphere, whole gas', [
  {
    printed: '340.29',
    got: () => whole(standardAir(288.15, atmosphere), 'sound_speed'),
    source: 'U.S. Standard Atmosphere 1976',
    where: 'table III, 0 km',
    within: { tolerance: 0.1, because: 'the standard takes γ = 1.4; the heat capacity of air makes it 1.4004' },
  },
  {
    printed: '1.2250',
    got: () => whole(standardAir(288.15, atmosphere), 'density'),
    source: 'U.S. Standard Atmosphere 1976',
    where: 'table I, 0 km',
  },
  {
    printed: '1.7894e-5',
    got: () => whole(standardAir(288.15, atmosphere), 'viscosity'),
    source: 'U.S. Standard Atmosphere 1976',
    where: 'table III, 0 km, by Sutherland’s formula',
    within: { tolerance: 1.8e-7, because: 'an older formula; the viscosity of air states 1 %' },
  },
  {
    printed: '2.5326e-2',
    got: () => whole(standardAir(288.15, atmosphere), 'thermal_conductivity'),
    source: 'U.S. Standard Atmosphere 1976',
    where: 'table III, 0 km; from memory',
    within: { tolerance: 5e-4, because: 'an older formula; the conductivity of air states 2 %' },
  },
]);

/** The rate at 1 Pa, or 1 Torr, 1 K and 1 g/mol: that of nitrogen, scaled. */
function ratePerPascal(): number {
  const M = 1e3 * gas('N2').molarMass.value;
  return whole(figures('N2', 300, 1), 'impingement_rate') * Math.sqrt(M * 300);
}

references('Hertz–Knudsen rate', [
  {
    printed: '2.635e24',
    got: ratePerPascal,
    source: 'handbooks of vacuum technique',
    where: '2.635e24 p/√(MT) per m² and s, p in Pa, M in g/mol; from memory',
  },
  {
    printed: '3.513e22',
    got: () => (ratePerPascal() * (atmosphere / 760)) / 1e4,
    source: 'handbooks of vacuum technique',
    where: '3.513e22 p/√(MT) per cm² and s, p in Torr, M in g/mol; from memory',
  },
  {
    printed: '145.5',
    got: () => whole(figures('N2', 300, 1), 'mean_speed') * Math.sqrt((1e3 * gas('N2').molarMass.value) / 300),
    source: 'CRC Handbook of Chemistry and Physics, Mean Free Path and Related Properties of Gases',
    where: 'mean speed 145.5 √(T/M) m/s',
  },
]);

describe('common practice, no source', () => {
  const small = (T: number) => evaluateState({ ...request('N2', T, atmosphere), collisionDiameter: 2.7e-10 });

  it('air near room temperature moves at about 506.5 m/s, root mean square', () => {
    const speeds = [297, 298.15, 300].map((T) => whole(figures('air', T), 'rms_speed'));
    assert.ok(speeds.every((speed) => Math.abs(speed / 506.5 - 1) < 0.005));
    assert.ok(speeds[0]! < 506.5 && 506.5 < speeds[2]!);
  });

  it('molecules of 2.7 Å at 300 K and one atmosphere are 34.45 Å apart and fly 1262 Å, 36.6 times as far', () => {
    const spacing = 1e10 * whole(small(300), 'mean_spacing');
    const path = 1e10 * whole(small(300), 'mean_free_path_hard_sphere');
    assert.ok(Math.abs(spacing - 34.45) < 0.005, String(spacing));
    assert.ok(Math.abs(path - 1262) < 0.5, String(path));
    assert.ok(Math.abs(path / spacing - 36.6) < 0.05);
  });

  it('a molecule at room temperature and one atmosphere collides some 1e10 times a second', () => {
    for (const name of ['N2', 'O2', 'He', 'H2', 'air']) {
      const frequency = whole(figures(name, 298.15), 'collision_frequency');
      assert.ok(Math.abs(Math.log10(frequency) - 10) < 0.5, `${name}: ${frequency}`);
    }
  });

  it('at 1 µTorr a monolayer of 1e19 sites a square metre takes some seconds', () => {
    const time = whole(figures('N2', 295, 1e-6 * (atmosphere / 760)), 'monolayer_time');
    assert.ok(1 < time && time < 4, String(time));
  });
});

describe('mixtures', () => {
  const mixed = figures(mixture({ He: 0.3, N2: 0.5, SF6: 0.2 }), 320, 2000);
  const shares = { He: 0.3, N2: 0.5, SF6: 0.2 };
  const mean = (property: string) =>
    Object.entries(shares).reduce((sum, [name, x]) => sum + x * part(mixed, name, property), 0);
  const sum = (property: string) => Object.keys(shares).reduce((total, name) => total + part(mixed, name, property), 0);
  const equal = (a: number, b: number) => assert.ok(Math.abs(a / b - 1) < 1e-12, `${a}, ${b}`);

  it('have the mean over molecules of speed, path, frequency and molar mass', () => {
    for (const name of ['mean_speed', 'most_probable_speed', 'mean_free_path_hard_sphere', 'collision_frequency']) {
      equal(whole(mixed, name), mean(name));
    }
    equal(whole(mixed, 'molar_mass'), mean('molar_mass'));
    equal(whole(mixed, 'molar_heat_capacity_cp'), mean('molar_heat_capacity_cp'));
  });

  it('have the sum over species of density, rate, flux, pressure and share', () => {
    for (const name of ['number_density', 'density', 'impingement_rate', 'mass_flux'])
      equal(whole(mixed, name), sum(name));
    equal(whole(mixed, 'pressure'), sum('partial_pressure'));
    equal(1, sum('mole_fraction'));
    equal(1, sum('mass_fraction'));
  });

  it('have the root mean square over mass', () => {
    const square = Object.keys(shares).reduce(
      (total, name) => total + part(mixed, name, 'mass_fraction') * part(mixed, name, 'rms_speed') ** 2,
      0,
    );
    equal(whole(mixed, 'rms_speed'), Math.sqrt(square));
  });

  it('have the heat capacity that is the mean over mass', () => {
    const heat = Object.keys(shares).reduce(
      (total, name) => total + part(mixed, name, 'mass_fraction') * part(mixed, name, 'heat_capacity_cp'),
      0,
    );
    equal(whole(mixed, 'heat_capacity_cp'), heat);
  });

  it('tie their numbers together: Pr = ν/α, Le = α/D, Sc = ν/D, D Sc the same for all', () => {
    equal(whole(mixed, 'prandtl'), whole(mixed, 'kinematic_viscosity') / whole(mixed, 'thermal_diffusivity'));
    for (const name of Object.keys(shares)) {
      equal(part(mixed, name, 'lewis'), part(mixed, name, 'schmidt') / whole(mixed, 'prandtl'));
      equal(part(mixed, name, 'schmidt') * part(mixed, name, 'diffusivity'), whole(mixed, 'kinematic_viscosity'));
    }
  });

  it('collide symmetrically: nᵢ times the rate of i hitting j is nⱼ times the rate of j hitting i', () => {
    const two = figures(mixture({ He: 0.25, Xe: 0.75 }), 300, 100);
    const rate = (one: string, other: string) => {
      const d = (part(two, one, 'collision_diameter') + part(two, other, 'collision_diameter')) / 2;
      const ratio = part(two, one, 'molar_mass') / part(two, other, 'molar_mass');
      return part(two, other, 'number_density') * Math.PI * d * d * Math.sqrt(1 + ratio) * part(two, one, 'mean_speed');
    };
    equal(part(two, 'He', 'number_density') * rate('He', 'Xe'), part(two, 'Xe', 'number_density') * rate('Xe', 'He'));
    equal(part(two, 'He', 'collision_frequency'), rate('He', 'He') + rate('He', 'Xe'));
  });

  it('leave what belongs to one species to the species', () => {
    for (const name of ['diffusivity', 'collision_diameter', 'thermal_wavelength', 'mole_fraction']) {
      assert.deepEqual(mixed.mixture.get(name), { ok: false, reason: { kind: 'per-species', property: name } });
    }
  });
});
