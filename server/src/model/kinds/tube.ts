import { tubeTransmission } from '../../physics/passages/tube';
import { divide, multiply } from '../arithmetic';
import { figures } from '../figures';
import { quantityInput } from '../inputs';
import { plainNumber } from '../quantity';
import { accommodation, length } from './kind';
import type { Kind } from './kind';
import { accommodationOf, transmissionFigure, wallAssumptions } from './transmission';

export const tube: Kind = {
  word: 'tube',
  title: 'a tube',
  meaning: 'a straight tube of round section',
  role: 'geometry',
  heads: [],
  keys: [
    length('bore', 'the inner diameter', '40 mm', { symbol: 'd' }),
    length('length', 'the length along the axis', '1 m', { symbol: 'L' }),
    length('roughness', 'the mean roughness of the wall; smooth is assumed without it', '1 µm', {
      bound: 'not-negative',
    }),
    accommodation,
  ],
  needs: [
    { count: 1, of: ['bore'] },
    { count: 1, of: ['length'] },
  ],
  hint: ['volume', 'area'],
  later: [],
  snippet: 'tube ${1:name} {\n  bore   = ${2:40 mm}\n  length = ${3:1 m}\n}',
  compute: ({ inputs }) => {
    const bore = quantityInput(inputs, 'bore');
    const along = quantityInput(inputs, 'length');
    if (!bore || !along) return undefined;
    const area = multiply(plainNumber(Math.PI / 4), multiply(bore, bore));
    return {
      kind: 'record',
      word: 'tube',
      inputs,
      species: new Map(),
      members: new Map([
        ...figures('geometry of a circular cylinder', {
          bore,
          length: along,
          area,
          volume: multiply(area, along),
          wall_area: multiply(plainNumber(Math.PI), multiply(bore, along)),
          hydraulic_diameter: bore,
          characteristic_length: bore,
          aspect_ratio: divide(along, bore),
        }),
        transmissionFigure(
          [bore, along, accommodationOf(inputs)],
          (bore, length, accommodation) => tubeTransmission({ bore, length, accommodation }),
          wallAssumptions(inputs),
        ),
      ]),
    };
  },
};
