import assert from 'node:assert/strict';
import { k, N_A, R } from '../../server/src/physics/constants';
import { evaluateState } from '../../server/src/physics/state/evaluateState';
import { atmosphere, figures, mixture, part, request, whole } from '../support/gases';
import { references } from '../support/reference';

references('constants', [
  { printed: '1.380649e-23', got: () => k, source: 'CODATA 2018', where: 'Boltzmann constant, J/K, exact' },
  { printed: '6.02214076e23', got: () => N_A, source: 'CODATA 2018', where: 'Avogadro constant, 1/mol, exact' },
  {
    printed: '8.314462618',
    got: () => R,
    source: 'CODATA 2018',
    where: 'molar gas constant, J/(mol K), exact, cut off',
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
