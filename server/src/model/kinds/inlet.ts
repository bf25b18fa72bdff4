import { constantNamed } from '../../quantities/constants';
import { dimension } from '../../quantities/dimension';
import { unitOf } from '../../quantities/parseUnit';
import { divide, multiply } from '../arithmetic';
import { figures } from '../figures';
import { quantityInput } from '../inputs';
import { notComputedYet } from '../problems/notComputedYet';
import { quantity, show } from '../quantity';
import type { Kind } from './kind';
import { ofQuantity } from './kind';

export const inlet: Kind = {
  word: 'inlet',
  title: 'an inlet',
  meaning: 'a fixed inflow of gas, or a leak from the ambient through a passage',
  role: 'part',
  heads: [{ relation: 'of', wants: 'gas' }],
  keys: [
    {
      name: 'throughput',
      symbol: 'q',
      meaning: 'the inflow: pressure times volume per time, or an amount of gas per time',
      example: '1e-6 mbar·L/s',
      type: { kind: 'quantity', quantity: 'throughput', bound: 'not-negative', orAmountFlow: true },
    },
    {
      name: 'through',
      meaning: 'the passage from the ambient, for a leak',
      example: 'passage',
      type: {
        kind: 'record',
        words: ['orifice', 'tube', 'duct', 'slit', 'annulus', 'cone', 'bend', 'bundle', 'plug', 'line'],
      },
    },
    ofQuantity(
      'temperature',
      'temperature',
      'the temperature at which a throughput counts; the ambient one is assumed',
      '20 °C',
      { symbol: 'T' },
    ),
  ],
  needs: [{ count: 1, of: ['throughput', 'through'] }],
  hint: ['throughput', 'standard_flow'],
  later: [],
  snippet: 'inlet ${1:name} of ${2:air} { throughput = ${3:1e-6 mbar·L/s} }',
  compute: ({ inputs, gas, place }, scope) => {
    const given = quantityInput(inputs, 'throughput');
    if (!gas) return undefined;
    if (!given) {
      scope.report(notComputedYet.at(place('through'), { what: 'a leak through a passage' }));
      return undefined;
    }
    const own = quantityInput(inputs, 'temperature');
    const temperature = own ?? scope.condition('ambient_temperature');
    const energy = multiply(molarGasConstant, temperature);
    const molar = given.dimension === amountFlow ? given : divide(given, energy);
    const massFigure = gas.members.get('molar_mass');
    const mass = massFigure?.kind === 'figure' && massFigure.value.kind === 'quantity' ? massFigure.value : undefined;
    const assumptions = own ? [] : [`the gas at the ambient temperature, ${show(temperature, { unit: unitOf('°C') })}`];
    return {
      kind: 'record',
      word: 'inlet',
      inputs,
      gas,
      species: new Map(),
      members: figures(
        'ideal gas: q = ṅ R T',
        {
          throughput: multiply(molar, energy),
          molar_flow: molar,
          standard_flow: molar,
          molecule_flow: multiply(molar, avogadro),
          ...(mass ? { mass_flow: multiply(molar, mass) } : {}),
        },
        assumptions,
      ),
    };
  },
};

const amountFlow = dimension({ amount: 1, time: -1 });
const molarGasConstant = quantity(constantNamed('R').value, unitOf('J/(mol·K)').dimension);
const avogadro = quantity(constantNamed('N_A').value, unitOf('1/mol').dimension);
