import assert from 'node:assert/strict';
import type { Analysis } from '../../server/src/model/analysis';
import { budget, halfWidth } from '../../server/src/model/tolerance';
import type { Figure } from '../../server/src/model/values';
import { analyse } from '../support/analyse';
import { quantityAt, valueOf } from '../support/values';

const places = `
  state thin of N2 { pressure = 3e-3 mbar ± 10 %, temperature = 20 °C }
  state room of air { pressure = 1 atm, temperature = 20 °C, speed = 1 m/s }
  state blend of He 50 % + Xe 50 % { pressure = 1e-9 mbar, temperature = 20 °C }
  tube pipe { bore = 40 mm, length = 1 m }
  tube worn { bore = 40 mm, length = 1 m, accommodation = 90 % ± 5 % }
  tube mirror { bore = 40 mm, length = 1 m, accommodation = 0.01 % }
  slit gap_between { height = 1 mm, width = 50 mm, length = 20 mm }
  orifice hole { bore = 5 mm }
  particle dust { diameter = 1 µm ± 2 %, density = 2500 kg/m³ }
  site in_pipe = thin in pipe
  site in_worn = thin in worn
  site in_mirror = thin in mirror
  site in_gap = thin in gap_between
  site in_hole = thin in hole
  site blend_in_pipe = blend in pipe
  site around_dust = room around dust
  site dust_in_vacuum = thin around dust
`;

describe('a site', () => {
  const analysis = analyse(places);

  it('flows between the molecular and the viscous conductance’s sum and parts', () => {
    const [p, eta, c] = ['pressure', 'viscosity', 'mean_speed'].map((name) => quantityAt(analysis, `thin.${name}`).si);
    const a = 0.02;
    const viscous = (Math.PI * a ** 4 * p!) / (8 * eta!);
    const molecular = ((2 * Math.PI) / 3) * a ** 3 * c!;
    const conductance = quantityAt(analysis, 'in_pipe.conductance').si;
    assert.ok(conductance > 0.9 * viscous && conductance < viscous + molecular);
  });

  it('in a mixture conducts as all its molecules do, each at its own speed', () => {
    const expected = quantityAt(analysis, 'blend.mean_speed').si * 0.02 ** 2 * (Math.PI / 4);
    near(
      quantityAt(analysis, 'blend_in_pipe.conductance').si,
      expected * transmission(analysis, 'blend_in_pipe', 'pipe'),
      1e-5,
    );
  });

  it('carries what its inputs and its methods leave open', () => {
    const { si, leans } = quantityAt(analysis, 'in_worn.poiseuille_coefficient');
    // With 90 % ± 5 % the free-molecular flow varies by 10.1 %, and the rarefaction tempers it.
    assert.ok(halfWidth(leans) / si > 0.05 && halfWidth(leans) / si < 0.101);
    const causes = budget(leans).map(({ cause }) => cause);
    assert.ok(causes[0]?.endsWith('#worn.accommodation'), causes.join());
    assert.ok(causes.some((cause) => cause.endsWith('#thin.pressure')));
    assert.ok(causes.includes('kinetic_model'));
    const dust = budget(quantityAt(analysis, 'around_dust.settling_speed').leans).map(({ cause }) => cause);
    for (const cause of ['slip_correction', 'viscosity:air', 'file:///test.gas#dust.diameter']) {
      assert.ok(dust.includes(cause), cause);
    }
  });

  it('says what it assumes', () => {
    assert.match(assumptions(analysis, 'in_pipe', 'poiseuille_coefficient'), /diffusely \(no accommodation given\)/);
    assert.doesNotMatch(assumptions(analysis, 'in_worn', 'poiseuille_coefficient'), /diffusely/);
    assert.match(assumptions(analysis, 'blend_in_pipe', 'conductance'), /mean molar mass/);
    assert.match(assumptions(analysis, 'around_dust', 'settling_speed'), /standard gravity/);
  });

  it('says why it has no figure', () => {
    assert.match(why(analysis, 'in_mirror', 'conductance'), /^accommodation is 1.000e-4, outside 0.001000 to 1.000/);
    assert.match(why(analysis, 'in_hole', 'poiseuille_coefficient'), /too short/);
    assert.match(why(analysis, 'dust_in_vacuum', 'stopping_distance'), /no speed/);
  });

  it('knows of a particle what the formulas say', () => {
    const [eta, rho, lambda] = ['viscosity', 'density', 'mean_free_path'].map(
      (name) => quantityAt(analysis, `room.${name}`).si,
    );
    const kn = (2 * lambda!) / 1e-6;
    const slip = 1 + kn * (1.142 + 0.558 * Math.exp(-0.999 / kn));
    const time = (2500 * 1e-12 * slip) / (18 * eta!);
    near(quantityAt(analysis, 'around_dust.knudsen').si, kn / 2, 1e-12);
    near(quantityAt(analysis, 'around_dust.slip_factor').si, slip, 1e-12);
    near(quantityAt(analysis, 'around_dust.relaxation_time').si, time, 1e-12);
    near(quantityAt(analysis, 'around_dust.settling_speed').si, time * 9.80665 * (1 - rho! / 2500), 1e-12);
    near(quantityAt(analysis, 'around_dust.stopping_distance').si, time, 1e-12);
  });

  it('has its Knudsen number and regime first', () => {
    for (const name of ['in_pipe', 'in_gap', 'around_dust']) {
      const value = valueOf(analysis, name);
      assert.ok(value.kind === 'record');
      assert.deepEqual([...value.members.keys()].slice(0, 3), ['knudsen', 'rarefaction', 'regime']);
    }
  });
});

/** Of the passage with its ends, or of a long one where that is not computed. */
function transmission(analysis: Analysis, site: string, passage: string): number {
  const withEnds = figureOf(analysis, passage, 'transmission_probability');
  if (withEnds?.kind === 'figure' && withEnds.value.kind === 'quantity') return withEnds.value.si;
  assert.match(assumptions(analysis, site, 'conductance'), /ends that do not matter/);
  return (8 * 0.02) / 3;
}

function figureOf(analysis: Analysis, name: string, member: string): Figure | undefined {
  const value = valueOf(analysis, name);
  return value.kind === 'record' ? value.members.get(member) : undefined;
}

function assumptions(analysis: Analysis, name: string, member: string): string {
  const found = figureOf(analysis, name, member);
  assert.ok(found?.kind === 'figure');
  return found.provenance.assumptions.join('; ');
}

function why(analysis: Analysis, name: string, member: string): string {
  const found = figureOf(analysis, name, member);
  assert.ok(found?.kind === 'absent');
  return found.why;
}

function near(value: number, expected: number, relative: number): void {
  assert.ok(Math.abs(value - expected) <= relative * Math.abs(expected), `${value} differs from ${expected}`);
}
