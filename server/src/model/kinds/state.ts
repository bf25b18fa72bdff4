import type { Composition } from '../../physics/composition';
import type { Note, Outcome } from '../../physics/outcome';
import { kelvin, kilogramPerCubicMetre, pascal, perCubicMetre } from '../../physics/brands';
import type { Figure as EngineFigure, StateFigures } from '../../physics/state/evaluateState';
import { evaluateState } from '../../physics/state/evaluateState';
import { solveState } from '../../physics/state/closure';
import { formatNumber } from '../../quantities/format';
import { unitOf } from '../../quantities/parseUnit';
import { divide } from '../arithmetic';
import { figure } from '../figures';
import { quantityInput } from '../inputs';
import { contradictoryInput } from '../problems/contradictoryInput';
import { outsideRange } from '../problems/outsideRange';
import { tooCold } from '../problems/tooCold';
import { tooDense } from '../problems/tooDense';
import type { Propagated } from '../propagate';
import { propagate } from '../propagate';
import { quantity, show } from '../quantity';
import { citation, dataTitle, explainReason } from '../reasons';
import { resultNamed } from '../results';
import type { Scope } from '../scope';
import type { Leans } from '../tolerance';
import { exact } from '../tolerance';
import type { Figure, Gas, Members, Quantity } from '../values';
import { kindNamed } from '../../quantities/quantityKinds';
import type { Given, Kind } from './kind';
import { length, ofQuantity } from './kind';

export const state: Kind = {
  word: 'state',
  title: 'a state',
  meaning: 'a gas at two of pressure, temperature, number density and density',
  role: 'state',
  heads: [
    { relation: 'of', wants: 'gas' },
    { relation: 'from', wants: 'record', words: ['state'] },
  ],
  keys: [
    ofQuantity('pressure', 'pressure', 'the absolute pressure', '1e-3 mbar', { symbol: 'p' }),
    ofQuantity('temperature', 'temperature', 'the temperature of the gas', '20 °C', { symbol: 'T' }),
    ofQuantity('number_density', 'number_density', 'molecules per volume', '1e19 1/m³', { symbol: 'n' }),
    ofQuantity('density', 'density', 'mass per volume', '1e-6 kg/m³', { symbol: 'ρ' }),
    ofQuantity('speed', 'speed', 'the speed of the stream', '10 m/s', { symbol: 'u', bound: 'not-negative' }),
    length(
      'collision_diameter',
      'a hard-sphere diameter to use instead of the one that follows from the viscosity',
      '3.7 Å',
      { symbol: 'd' },
    ),
  ],
  needs: [{ count: 2, of: ['pressure', 'temperature', 'number_density', 'density'] }],
  hint: ['mean_free_path', 'number_density'],
  later: ['compressibility_factor', 'second_virial'],
  snippet: 'state ${1:name} of ${2:N2} {\n  pressure    = ${3:1e-3 mbar}\n  temperature = ${4:20 °C}\n}',
  compute: (given, scope) => {
    const gas = given.gas ?? given.from?.gas;
    if (!gas) return undefined;
    const { result, leans } = run(given, gas, scope);
    if (!result.ok) {
      scope.report(contradictoryInput.at(given.place(), { why: explainReason(result.reason) }));
      return undefined;
    }
    for (const note of result.value.notes) reportNote(note, given, scope);
    const assumptions = assumptionsOf(given, scope);
    const members = new Map([...membersOf(result.value.mixture, '', leans, assumptions), ...streamOf(given)]);
    const species = new Map(
      [...result.value.species].map(([formula, each]) => [formula, membersOf(each, `${formula}.`, leans, assumptions)]),
    );
    addMach(members);
    return { kind: 'record', word: 'state', members, species, inputs: given.inputs, gas };
  },
};

const POINT = ['pressure', 'temperature', 'number_density', 'density'] as const;

/** Runs the engine on the inputs, with every uncertain input and every model error carried through. */
function run(given: Given, gas: Gas, scope: Scope): Propagated<Outcome<StateFigures>> {
  const siteDensity = scope.condition('site_density');
  const point = POINT.map((name) => quantityInput(given.inputs, name));
  const diameter = quantityInput(given.inputs, 'collision_diameter');
  const absent = { si: NaN, leans: exact };
  return propagate<Outcome<StateFigures>>({
    inputs: [...point.map((value) => value ?? absent), diameter ?? absent, siteDensity, ...gas.fractions],
    run: ([p, T, n, rho, d, sites, ...fractions], factors) => {
      const composition = fractions.some((fraction, index) => fraction !== gas.composition.moleFractions[index])
        ? { ...gas.composition, moleFractions: fractions }
        : gas.composition;
      return stateAt(composition, { p, T, n, rho, d, sites }, factors);
    },
    errorsOf: (result) => (result.ok ? result.value.modelErrors : []),
    valuesOf: (result) => (result.ok ? numbersOf(result.value) : new Map()),
  });
}

interface Numbers {
  readonly p: number | undefined;
  readonly T: number | undefined;
  readonly n: number | undefined;
  readonly rho: number | undefined;
  readonly d: number | undefined;
  readonly sites: number | undefined;
}

function stateAt(
  composition: Composition,
  { p, T, n, rho, d, sites }: Numbers,
  factors: ReadonlyMap<string, number>,
): Outcome<StateFigures> {
  const point = solveState(composition, {
    ...(isGiven(p) ? { pressure: pascal(p) } : {}),
    ...(isGiven(T) ? { temperature: kelvin(T) } : {}),
    ...(isGiven(n) ? { numberDensity: perCubicMetre(n) } : {}),
    ...(isGiven(rho) ? { density: kilogramPerCubicMetre(rho) } : {}),
  });
  if (!point.ok) return point;
  const request = {
    composition,
    point: point.value,
    siteDensity: sites ?? NaN,
    ...(isGiven(d) ? { collisionDiameter: d } : {}),
  };
  return { ok: true, value: evaluateState(request, { factors }), notes: [] };
}

function isGiven(value: number | undefined): value is number {
  return value !== undefined && !Number.isNaN(value);
}

function numbersOf({ mixture, species }: StateFigures): ReadonlyMap<string, number> {
  const numbers = new Map<string, number>();
  const collect = (prefix: string, figures: ReadonlyMap<string, Outcome<EngineFigure>>) => {
    for (const [name, outcome] of figures) if (outcome.ok) numbers.set(prefix + name, outcome.value.value);
  };
  collect('', mixture);
  for (const [formula, figures] of species) collect(`${formula}.`, figures);
  return numbers;
}

function membersOf(
  figures: ReadonlyMap<string, Outcome<EngineFigure>>,
  prefix: string,
  leans: ReadonlyMap<string, Leans>,
  assumptions: (name: string) => readonly string[],
): Members {
  return new Map(
    [...figures].map(([name, outcome]) => [
      name,
      memberOf(name, outcome, leans.get(prefix + name) ?? exact, assumptions(name)),
    ]),
  );
}

function memberOf(name: string, outcome: Outcome<EngineFigure>, leans: Leans, assumptions: readonly string[]): Figure {
  if (!outcome.ok) return { kind: 'absent', why: explainReason(outcome.reason) };
  const { value, method, sources, range } = outcome.value;
  const kind = kindNamed(resultNamed(name)?.quantityKind ?? 'number');
  if (!kind) return { kind: 'absent', why: `${name} is of no known kind` };
  return figure(
    { ...quantity(value, kind.dimension, leans), quantityKind: kind.name },
    {
      method,
      sources: sources.map(citation),
      ...(range ? { range: `${formatNumber(range.low, 4)} to ${formatNumber(range.high, 4)} K` } : {}),
      assumptions,
    },
  );
}

/** What a figure takes for granted. */
function assumptionsOf(given: Given, scope: Scope): (name: string) => readonly string[] {
  const sites = `a monolayer of ${show(scope.condition('site_density'), { unit: unitOf('1/m²'), digits: 3 })}, every molecule staying`;
  const stated = given.inputs.has('collision_diameter') ? ['the collision diameter that the file states'] : [];
  return (name) => {
    if (name === 'monolayer_time') return [sites];
    return name === 'mean_free_path_hard_sphere' || name === 'collision_frequency' ? stated : [];
  };
}

function streamOf({ inputs }: Given): Members {
  const speed = quantityInput(inputs, 'speed');
  return speed
    ? new Map([['speed', figure(plain(speed, 'speed'), { method: 'as given', sources: [], assumptions: [] })]])
    : new Map();
}

function addMach(members: Map<string, Figure>): void {
  const speed = members.get('speed');
  const sound = members.get('sound_speed');
  if (speed?.kind !== 'figure' || sound?.kind !== 'figure') return;
  if (speed.value.kind !== 'quantity' || sound.value.kind !== 'quantity') return;
  members.set(
    'mach',
    figure(plain(divide(speed.value, sound.value), 'number'), {
      ...sound.provenance,
      method: `stream speed over sound speed; ${sound.provenance.method}`,
    }),
  );
}

function plain({ unit: _unit, ...value }: Quantity, quantityKind: string): Quantity {
  return { ...value, quantityKind };
}

function reportNote(note: Note, given: Given, scope: Scope): void {
  const kelvins = (value: number) => `${formatNumber(value, 4)} K`;
  switch (note.kind) {
    case 'outside-range': {
      const what = `the ${dataTitle(note.property)} of ${note.species}`;
      scope.report(
        outsideRange.at(given.place('temperature'), {
          what,
          value: kelvins(note.value),
          low: kelvins(note.low),
          high: kelvins(note.high),
        }),
      );
      return;
    }
    case 'quantum':
      scope.report(
        tooCold.at(given.place('temperature'), { species: note.species, degeneracy: formatNumber(note.degeneracy, 2) }),
      );
      return;
    case 'dense': {
      const nanometres = (value: number) => `${formatNumber(value * 1e9, 3)} nm`;
      scope.report(
        tooDense.at(given.place('pressure'), {
          spacing: nanometres(note.spacing),
          diameter: nanometres(note.diameter),
        }),
      );
    }
  }
}
