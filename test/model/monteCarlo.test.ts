import assert from 'node:assert/strict';
import type { Leans } from '../../server/src/model/tolerance';
import { halfWidth } from '../../server/src/model/tolerance';
import { analyse } from '../support/analyse';
import { quantityAt } from '../support/values';

const TRIALS = 1000;

/**
 * Brute force (JCGM 101:2008, clause 7): every `VALUE UNIT ± HALF-WIDTH UNIT` of the document is drawn from a normal distribution
 * with the half-width as two standard deviations, and the document is evaluated as often. The scatter of the results must be
 * what linear propagation said. So many trials know it to 2.2 % (one standard deviation), hence the 7 %.
 */
function check(title: string, document: string, paths: readonly string[]): void {
  it(title, () => {
    const stated = analyse(document);
    const normal = normalNumbers(1);
    const drawn = paths.map(() => [] as number[]);
    for (let trial = 0; trial < TRIALS; trial += 1) {
      const analysis = analyse(drawInputs(document, normal));
      paths.forEach((path, index) => drawn[index]?.push(quantityAt(analysis, path).si));
    }
    paths.forEach((path, index) => {
      const linear = halfWidth(ofInputs(quantityAt(stated, path).leans));
      const scatter = 2 * deviation(drawn[index] ?? []);
      assert.ok(linear > 0, `${path} has no tolerance`);
      assert.ok(Math.abs(scatter / linear - 1) < 0.07, `${path}: ${linear} by propagation, ${scatter} by trials`);
    });
  });
}

describe('tolerances against Monte Carlo', () => {
  check('of a state', 'state feed of N2 { pressure = 100 Pa ± 4 Pa, temperature = 300 K ± 6 K }', [
    'feed.number_density',
    'feed.density',
    'feed.mean_free_path',
    'feed.mean_speed',
    'feed.viscosity',
    'feed.impingement_rate',
  ]);

  check(
    'of a state by its number density and density of the gas',
    'state feed of Ar { temperature = 300 K ± 6 K, number_density = 1e20 1/m³ ± 3e18 1/m³ }',
    ['feed.pressure', 'feed.mean_free_path', 'feed.collision_frequency'],
  );

  check(
    'of a mixture',
    `gas blend = He 40 % ± 2 % + N2 balance
     state feed of blend { pressure = 100 Pa ± 2 Pa, temperature = 300 K ± 3 K }`,
    [
      'blend.molar_mass',
      'feed.density',
      'feed.He.partial_pressure',
      'feed.N2.mass_fraction',
      'feed.mean_speed',
      'feed.viscosity',
    ],
  );

  check('of a mixture by flow', 'gas blend = Ar 50 sccm ± 2 sccm + O2 5 sccm ± 0.3 sccm', [
    'blend.O2.mole_fraction',
    'blend.Ar.mass_fraction',
    'blend.molar_mass',
  ]);

  check(
    'of two states that share their temperature',
    `let room = 300 K ± 10 K
     let p = 100 Pa ± 1 Pa
     state a of N2 { pressure = p, temperature = room }
     state b of He { pressure = 50 Pa ± 1 Pa, temperature = room }
     let ratio = a.number_density / b.number_density
     let paths = a.mean_free_path / b.mean_free_path
     let sum = a.mass_flux + b.mass_flux`,
    ['ratio', 'paths', 'sum'],
  );

  check(
    'of a site',
    `tube foreline { bore = 40 mm ± 1 mm, length = 1 m ± 0.02 m }
     state feed of N2 { pressure = 1 Pa ± 0.03 Pa, temperature = 300 K ± 3 K }
     site here = feed in foreline`,
    [
      'here.knudsen',
      'here.rarefaction',
      'here.molecules',
      'here.wall_collision_rate',
      'foreline.volume',
      'foreline.aspect_ratio',
    ],
  );

  check(
    'of expressions',
    `let a = 3 mm ± 0.05 mm
     let b = 4 mm ± 0.06 mm
     let c = sqrt(a ^ 2 + b ^ 2)
     let d = a * b / (a + b)
     let e = exp(a / b) + ln(b / a)
     let t = [2 mm: 1 s, 5 mm: 9 s]
     let f = t(a) + t(b)`,
    ['c', 'd', 'e', 'f'],
  );
});

const INPUT = /([\d.e+-]+) (\S+) ± ([\d.e+-]+) [^\s,]+/g;

function drawInputs(document: string, normal: () => number): string {
  return document.replaceAll(INPUT, (_, value: string, unit: string, half: string) => {
    return `${Number(value) + (Number(half) / 2) * normal()} ${unit}`;
  });
}

/** The leans on what the document states, without the errors of the correlations. */
function ofInputs(leans: Leans): Leans {
  return new Map([...leans].filter(([cause]) => cause.includes('#')));
}

function deviation(values: readonly number[]): number {
  const mean = values.reduce((sum, value) => sum + value, 0) / values.length;
  return Math.sqrt(values.reduce((sum, value) => sum + (value - mean) ** 2, 0) / (values.length - 1));
}

/** Normally distributed numbers, the same ones in every run: Box and Muller's transform of a multiplicative generator. */
function normalNumbers(seed: number): () => number {
  let state = seed;
  // Lehmer's generator with the multiplier of Park and Miller (1988), 48271 as they later advised; from memory.
  const uniform = () => {
    state = (state * 48_271) % 2_147_483_647;
    return state / 2_147_483_647;
  };
  return () => Math.sqrt(-2 * Math.log(uniform())) * Math.cos(2 * Math.PI * uniform());
}
