import type { Kind } from './kind';
import { ofQuantity } from './kind';

export const flow: Kind = {
  word: 'flow',
  title: 'a flow',
  meaning: 'gas that goes through a passage',
  role: 'conduct',
  heads: [{ relation: 'through', wants: 'route' }],
  keys: [
    {
      name: 'upstream',
      meaning: 'the state, or the pressure, where the gas enters',
      example: '1 mbar',
      type: { kind: 'record', words: ['state'], orQuantity: 'pressure' },
    },
    {
      name: 'downstream',
      meaning: 'the state, or the pressure, where it leaves',
      example: '1e-3 mbar',
      type: { kind: 'record', words: ['state'], orQuantity: 'pressure' },
    },
    {
      name: 'throughput',
      symbol: 'q',
      meaning: 'the flow itself: pressure times volume per time, or an amount of gas per time',
      example: '1 mbar·L/s',
      type: { kind: 'quantity', quantity: 'throughput', bound: 'any', orAmountFlow: true },
    },
    ofQuantity(
      'downstream_temperature',
      'temperature',
      'the temperature where the gas leaves; that of the upstream state is assumed',
      '20 °C',
    ),
    {
      name: 'regime',
      meaning: 'the regime that the author expects',
      example: 'molecular',
      type: { kind: 'word', words: ['viscous', 'slip', 'transitional', 'molecular'] },
    },
  ],
  needs: [{ count: 2, of: ['upstream', 'downstream', 'throughput'] }],
  hint: ['throughput', 'conductance'],
  later: [
    'conductance',
    'throughput',
    'molar_flow',
    'mass_flow',
    'molecule_flow',
    'standard_flow',
    'upstream_pressure',
    'downstream_pressure',
    'pressure_ratio',
    'regime',
    'knudsen',
    'reynolds',
    'mach',
    'choked',
  ],
  snippet: 'flow ${1:name} through ${2:passage} {\n  upstream   = ${3:state}\n  downstream = ${4:1e-3 mbar}\n}',
};
