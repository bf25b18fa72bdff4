import { R } from '../constants';
import type { Outcome } from '../outcome';
import { failure, success } from '../outcome';
import type { Species } from '../species/species';
import { measuredVirialOf } from '../thermo/measuredVirial';
import { isQuantumGas } from '../thermo/tsonopoulos';
import type { GasState } from './gasState';
import type { Method, StateProperty } from './property';

/* How far the gas departs from p = nkT. Symbols: Z compressibility factor, B second virial coefficient. */

const correspondingStates: Method = {
  method: 'Tsonopoulos, from the critical constants',
  sources: ['Tsonopoulos 1974', 'Poling 2001'],
};
const quantumGas: Method = {
  method: 'Tsonopoulos, from the effective critical constants of quantum gases',
  sources: ['Tsonopoulos 1974', 'Gunn 1966'],
};
const ofPairs: Method = {
  method: 'B = Σ xᵢxⱼBᵢⱼ, as measured where it has been, pairs by Tsonopoulos',
  sources: ['Tsonopoulos 1974', 'Chueh & Prausnitz 1967', 'Gunn 1966', 'CRC 2014'],
};

function virialMethod(species: Species): Method {
  if (species.blend !== undefined) return ofPairs;
  const fit = measuredVirialOf(species);
  if (fit !== undefined) return { method: 'fitted to measurements', sources: [fit.source] };
  return isQuantumGas(species) ? quantumGas : correspondingStates;
}

const throughVirial = ({ method, sources }: Method): Method => ({ method: `Z = 1 + Bp/(RT); ${method}`, sources });

/** Beyond this departure the series has lost its meaning: the third coefficient, which is left out, counts as much. */
const furthest = 0.5;

/** Z = 1 + Bp/(RT), as far as the second coefficient alone can tell. */
export function compressibilityFactor({ virial, point }: GasState): Outcome<number> {
  if (!virial.ok) return virial;
  const value = 1 + (virial.value * point.pressure) / (R * point.temperature);
  if (Math.abs(value - 1) <= furthest) return success(value, virial.notes);
  const range = { low: 1 - furthest, high: 1 + furthest };
  return failure({ kind: 'outside-range', quantity: 'compressibility_factor', value, ...range });
}

export const nonIdealityProperties: readonly StateProperty[] = [
  {
    name: 'compressibility_factor',
    symbol: 'Z',
    quantityKind: 'number',
    perSpecies: false,
    ...throughVirial(correspondingStates),
    methodFor: (species) => throughVirial(virialMethod(species)),
    mixed: throughVirial(ofPairs),
    restsOn: [],
    compute: compressibilityFactor,
  },
  {
    name: 'second_virial',
    symbol: 'B',
    quantityKind: 'molar_volume',
    perSpecies: true,
    signed: true,
    ...correspondingStates,
    methodFor: virialMethod,
    mixed: ofPairs,
    restsOn: [],
    compute: ({ virial }) => virial,
    computeFor: ({ virial }) => virial,
  },
];
