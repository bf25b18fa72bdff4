import assert from 'node:assert/strict';
import { execFileSync } from 'node:child_process';
import { mkdtempSync, rmSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { kelvin, pascal } from '../../server/src/physics/brands';
import type { Composition } from '../../server/src/physics/composition';
import { speciesByName } from '../../server/src/physics/species/list';
import type { Species } from '../../server/src/physics/species/species';
import { solveState } from '../../server/src/physics/state/closure';
import type { StateFigures } from '../../server/src/physics/state/evaluateState';
import { evaluateState } from '../../server/src/physics/state/evaluateState';
import { addPureFigures, pureNames, siteDensity, viscosityOfMixture } from './numericCore';

/**
 * The same states by the same formulas in C, compiled by `cc -O2` in this run, and by us: as plain numbers, and with everything
 * that `evaluateState` gives besides (all 40 figures, their methods, sources, ranges and notes). The sums must agree.
 */
export function againstC(): void {
  const folder = mkdtempSync(path.join(os.tmpdir(), 'tenuity-bench-'));
  const program = path.join(folder, 'state');
  try {
    if (!compiles(program)) {
      console.log('\n!!! NO C COMPILER (cc): THE COMPARISON WITH C DID NOT RUN !!!');
      return;
    }
    console.log('\nstates a second, against the same formulas in C (cc -O2)\n');
    comparePure(program);
    compareMixture(program);
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
}

interface Timed {
  /** Of the processor: other programs do not count, the collection of garbage does. */
  readonly seconds: number;
  readonly sums: readonly number[];
}

const SMALL = 20_000;
const LARGE = 1_000_000;

function comparePure(program: string): void {
  const nitrogen = gas('N2');
  const composition = { species: [nitrogen], moleFractions: [1] };
  const reference = best(() => inC(program, 'pure', LARGE));
  const numbers = best(() => {
    const sums = new Float64Array(pureNames.length);
    return timed(LARGE, sums, (i) => addPureFigures(nitrogen, temperature(i), pressure(i), sums));
  });
  const sums = new Float64Array(pureNames.length);
  const whole = best(() => {
    sums.fill(0);
    return timed(SMALL, sums, (i) => {
      const { mixture } = figuresAt(composition, i);
      pureNames.forEach((name, at) => (sums[at] = (sums[at] ?? 0) + valueOf(mixture, name)));
    });
  });
  agree(numbers, reference);
  agree(whole, inC(program, 'pure', SMALL));
  print('nitrogen, 19 figures', { reference, numbers, whole });
}

function compareMixture(program: string): void {
  const species = ['N2', 'O2', 'Ar', 'Kr', 'Xe'].map(gas);
  const composition = { species, moleFractions: [0.4, 0.3, 0.1, 0.1, 0.1] };
  const molarMass = species.map((one) => one.molarMass.value);
  const count = LARGE / 10;
  const reference = best(() => inC(program, 'mixture', count));
  const sum = new Float64Array(1);
  const add = (value: number) => (sum[0] = (sum[0] ?? 0) + value);
  const numbers = best(() => {
    sum.fill(0);
    return timed(count, sum, (i) => {
      add(viscosityOfMixture(species, composition.moleFractions, molarMass, temperature(i)));
    });
  });
  const whole = best(() => {
    sum.fill(0);
    return timed(SMALL / 10, sum, (i) => add(valueOf(figuresAt(composition, i).mixture, 'viscosity')));
  });
  agree(numbers, reference);
  agree(whole, inC(program, 'mixture', SMALL / 10));
  print('viscosity of five species', { reference, numbers, whole });
}

/** The states of the C program. */
function temperature(i: number): number {
  return 280 + (1700 * ((i * 7919) % 100003)) / 100003;
}

function pressure(i: number): number {
  return 1 + (i % 1000);
}

function figuresAt(composition: Composition, i: number): StateFigures {
  const point = solveState(composition, { temperature: kelvin(temperature(i)), pressure: pascal(pressure(i)) });
  if (!point.ok) throw new Error('the state cannot be solved');
  return evaluateState({ composition, point: point.value, siteDensity });
}

function timed(count: number, sums: Float64Array, state: (i: number) => void): Timed & { readonly count: number } {
  const start = process.cpuUsage();
  for (let i = 0; i < count; i += 1) state(i);
  const { user, system } = process.cpuUsage(start);
  return { seconds: 1e-6 * (user + system), sums: [...sums], count };
}

function inC(program: string, what: 'pure' | 'mixture', count: number): Timed & { readonly count: number } {
  const [seconds = NaN, ...sums] = execFileSync(program, [what, String(count)], { encoding: 'utf8' })
    .trim()
    .split('\n')
    .map(Number);
  return { seconds, sums, count };
}

/** The quickest of some runs is the one that the machine disturbed least; the first warms up. */
function best<T extends Timed>(run: () => T): T {
  return [run(), run(), run(), run()].reduce((a, b) => (b.seconds < a.seconds ? b : a));
}

function agree(ours: Timed, reference: Timed): void {
  assert.equal(ours.sums.length, reference.sums.length);
  ours.sums.forEach((sum, at) => {
    const other = reference.sums[at] ?? NaN;
    assert.ok(Math.abs(sum / other - 1) < 1e-10, `figure ${at}: ${sum} of ours, ${other} of C`);
  });
}

type Rated = Timed & { readonly count: number };

function print(
  title: string,
  rated: { readonly reference: Rated; readonly numbers: Rated; readonly whole: Rated },
): void {
  const rate = ({ count, seconds }: Rated) => count / seconds;
  const row = (name: string, one: Rated) => {
    const share = rate(one) / rate(rated.reference);
    const cells = [Math.round(rate(one)).toLocaleString('en').padStart(12), share.toPrecision(3).padStart(9)];
    console.log(`${name.padEnd(46)} ${cells.join(' ')}`);
  };
  row(`${title}: C`, rated.reference);
  row(`${title}: numbers`, rated.numbers);
  row(`${title}: evaluateState`, rated.whole);
}

function valueOf(members: StateFigures['mixture'], name: string): number {
  const outcome = members.get(name);
  return outcome?.ok ? outcome.value.value : NaN;
}

function gas(name: string): Species {
  const species = speciesByName(name);
  if (species === undefined) throw new Error(`no gas is named ${name}`);
  return species;
}

function compiles(program: string): boolean {
  try {
    execFileSync('cc', ['-O2', '-o', program, path.join('test', 'bench', 'c', 'state.c'), '-lm']);
    return true;
  } catch (error) {
    if (error instanceof Error && 'code' in error && error.code === 'ENOENT') return false;
    throw error;
  }
}
