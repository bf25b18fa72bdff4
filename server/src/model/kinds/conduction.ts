import type { Kind } from './kind';
import { ofQuantity } from './kind';

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
      name: 'state',
      meaning: 'the state of the gas, instead of gas and pressure',
      example: 'state',
      type: { kind: 'record', words: ['state'] },
    },
    { name: 'gas', meaning: 'the gas between the walls', example: 'N2', type: { kind: 'gas' } },
    ofQuantity('pressure', 'pressure', 'its pressure', '1 mbar', { symbol: 'p' }),
    ofQuantity('accommodation', 'fraction', 'the energy accommodation of both walls; 1 is assumed', '0.9', {
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
  later: ['heat_flux', 'heat_flow', 'conductivity', 'regime'],
  snippet:
    'conduction ${1:name} across ${2:gap} {\n  hot = ${3:60 °C}\n  cold = ${4:20 °C}\n  gas = ${5:N2}\n  pressure = ${6:1 mbar}\n}',
};
