import { contradictoryInput } from '../problems/contradictoryInput';
import { explainReason } from '../reasons';
import type { Kind } from './kind';
import { length, ofQuantity } from './kind';
import { reportStateNotes } from './reportStateNotes';
import { runState } from './runState';
import { stateMembers } from './stateMembers';

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
  later: [],
  snippet: 'state ${1:name} of ${2:N2} {\n  pressure    = ${3:1e-3 mbar}\n  temperature = ${4:20 °C}\n}',
  compute: (given, scope) => {
    const gas = given.gas ?? given.from?.gas;
    if (!gas) return undefined;
    const { result, leans } = runState(given.inputs, gas, scope);
    if (!result.ok) {
      scope.report(contradictoryInput.at(given.place(), { why: explainReason(result.reason) }));
      return undefined;
    }
    reportStateNotes(result.value.notes, given, scope);
    const { members, species } = stateMembers(result.value, leans, given, scope);
    return { kind: 'record', word: 'state', members, species, inputs: given.inputs, gas };
  },
};
