import type { ConductedHeat } from '../../physics/heat/conductHeat';
import type { HeatNotes } from '../../physics/heat/heatNotes';
import type { HeatProvenance } from '../../physics/heat/heatProvenance';
import { heatProvenance } from '../../physics/heat/heatProvenance';
import type { Note } from '../../physics/outcome';
import type { Provenance as EngineProvenance } from '../../physics/state/provenance';
import { formatNumber } from '../../quantities/format';
import { kindNamed } from '../../quantities/quantityKinds';
import { figure } from '../figures';
import { contradictoryInput } from '../problems/contradictoryInput';
import { quantity } from '../quantity';
import { citation, explainReason } from '../reasons';
import { regimeOf, regimes } from '../regime';
import { resultNamed } from '../results';
import type { Scope } from '../scope';
import type { Leans } from '../tolerance';
import { exact } from '../tolerance';
import type { Figure, Members, Provenance } from '../values';
import type { ConductionInputs } from './conductionInputs';
import { conductionInputs } from './conductionInputs';
import type { Given, Kind } from './kind';
import { ofQuantity } from './kind';
import { reportStateNote } from './reportStateNote';
import { numbersOf, runConduction } from './runConduction';

export const conduction: Kind = {
  word: 'conduction',
  title: 'a conduction',
  meaning: 'heat that goes through a gas from a hot wall to a cold one',
  role: 'conduct',
  heads: [{ relation: 'across', wants: 'record', words: ['gap', 'jacket'] }],
  keys: [
    ofQuantity('hot', 'temperature', 'the temperature of the hot wall', '60 °C', { symbol: 'T_h' }),
    ofQuantity('cold', 'temperature', 'the temperature of the cold wall', '20 °C', { symbol: 'T_c' }),
    {
      name: 'hot_wall',
      meaning: 'which wall of a jacket is the hot one; the inner one is assumed',
      example: 'outer',
      type: { kind: 'word', words: ['inner', 'outer'] },
    },
    {
      name: 'state',
      meaning: 'the state of the gas, instead of gas and pressure',
      example: 'state',
      type: { kind: 'record', words: ['state'] },
    },
    { name: 'gas', meaning: 'the gas between the walls', example: 'N2', type: { kind: 'gas' } },
    ofQuantity('pressure', 'pressure', 'its pressure', '1 mbar', { symbol: 'p' }),
    ofQuantity('accommodation', 'fraction', 'the energy accommodation of both walls; 1 is assumed', '0.9', {
      symbol: 'α',
      bound: 'fraction',
    }),
    ofQuantity('hot_accommodation', 'fraction', 'that of the hot wall', '0.9', { bound: 'fraction' }),
    ofQuantity('cold_accommodation', 'fraction', 'that of the cold wall', '0.9', { bound: 'fraction' }),
  ],
  needs: [
    { count: 1, of: ['hot'] },
    { count: 1, of: ['cold'] },
    { count: 1, of: ['state', 'pressure'] },
  ],
  hint: ['heat_flow', 'heat_flux'],
  later: [],
  snippet:
    'conduction ${1:name} across ${2:gap} {\n  hot = ${3:60 °C}\n  cold = ${4:20 °C}\n  gas = ${5:N2}\n  pressure = ${6:1 mbar}\n}',
  compute: (declared, scope) => {
    const inputs = conductionInputs(declared, scope);
    if (!inputs) return undefined;
    const { result, leans, notes } = runConduction(inputs);
    if (!result.ok) {
      scope.report(contradictoryInput.at(declared.place(), { why: explainReason(result.reason) }));
      return undefined;
    }
    reportNotes(notes, declared, scope);
    return {
      kind: 'record',
      word: 'conduction',
      inputs: declared.inputs,
      species: new Map(),
      gas: inputs.gas,
      members: membersOf(result.value, leans, inputs, scope),
    };
  },
};

/** What is wrong with the gas at a wall is said at the temperature of that wall, and of the two at the cold one. */
function reportNotes({ cold, hot }: HeatNotes, declared: Given, scope: Scope): void {
  const at = (wall: 'hot' | 'cold'): Given => ({
    ...declared,
    place: (key) => declared.place(key === 'temperature' ? wall : key),
  });
  for (const note of cold) reportStateNote(note, at('cold'), scope);
  const said = new Set(cold.map(subjectOf));
  for (const note of hot) if (!said.has(subjectOf(note))) reportStateNote(note, at('hot'), scope);
}

/** A range may be left at either end, so its subject is the temperature as well. */
function subjectOf(note: Note): string {
  return note.kind === 'outside-range'
    ? `${note.kind} ${note.property} ${note.species} ${note.value}`
    : `${note.kind} ${'species' in note ? note.species : ''}`;
}

function membersOf(
  heat: ConductedHeat,
  leans: ReadonlyMap<string, Leans>,
  inputs: ConductionInputs,
  scope: Scope,
): Members {
  const provenances = provenancesOf(inputs);
  const members = new Map<string, Figure>();
  for (const [name, value] of numbersOf(heat)) {
    const kind = kindNamed(resultNamed(name)?.quantityKind ?? 'number');
    if (!kind) continue;
    const shown = { ...quantity(value, kind.dimension, leans.get(name) ?? exact), quantityKind: kind.name };
    members.set(name, figure(shown, provenances[GROUPS[name] ?? 'heat']));
  }
  for (const [name, each] of regimeMembers(heat, scope)) members.set(name, each);
  return members;
}

/** How each result comes about, where it is not as the heat itself. */
const GROUPS: Readonly<{ [name: string]: keyof HeatProvenance }> = {
  jump_length_hot: 'jumps',
  jump_length_cold: 'jumps',
  free_molecular_heat_flow: 'freeFlight',
  continuum_heat_flow: 'continuum',
  knudsen: 'knudsen',
};

function provenancesOf({ gas, assumptions }: ConductionInputs): {
  readonly [group in keyof HeatProvenance]: Provenance;
} {
  const { heat, jumps, freeFlight, continuum, knudsen } = heatProvenance(gas.composition);
  const { walls, pressure } = assumptions;
  const reflecting = [...walls, pressure, 'walls send molecules back in all directions'];
  const small = 'between the limits, temperature differences small against the mean';
  return {
    heat: told(heat, [...reflecting, 'no convection', 'no radiation, no heat through supports'], small),
    jumps: told(jumps, reflecting),
    freeFlight: told(freeFlight, [...walls, pressure]),
    continuum: told(continuum, ['no convection']),
    knudsen: told(knudsen, [pressure]),
  };
}

function told(
  { method, sources, range }: EngineProvenance,
  assumptions: readonly string[],
  limits?: string,
): Provenance {
  const kelvins = range ? [`${formatNumber(range.low, 4)} to ${formatNumber(range.high, 4)} K`] : [];
  const ranges = [...kelvins, ...(limits === undefined ? [] : [limits])];
  return {
    method,
    sources: sources.map(citation),
    assumptions,
    ...(ranges.length > 0 ? { range: ranges.join('; ') } : {}),
  };
}

function regimeMembers({ knudsen }: ConductedHeat, scope: Scope): readonly (readonly [string, Figure])[] {
  if (!knudsen.ok) {
    const absent: Figure = { kind: 'absent', why: explainReason(knudsen.reason) };
    return [
      ['knudsen', absent],
      ['regime', absent],
    ];
  }
  const limits = scope.regimeLimits();
  const text = regimeOf(knudsen.value, limits);
  const { slip, transitional, molecular } = limits;
  const method = `by the Knudsen number: viscous < ${slip} ≤ slip < ${transitional} ≤ transitional < ${molecular} ≤ molecular`;
  return [['regime', figure({ kind: 'word', text, of: regimes }, { method, sources: [], assumptions: [] })]];
}
