import { multiply } from '../arithmetic';
import { plainNumber } from '../quantity';
import { length, ofQuantity } from './kind';
import type { Kind } from './kind';
import { given, passageRecord } from './passageRecord';

export const particle: Kind = {
  word: 'particle',
  title: 'a particle',
  meaning: 'a small sphere in the gas',
  role: 'geometry',
  heads: [],
  keys: [
    length('diameter', 'the diameter', '1 µm', { symbol: 'd' }),
    ofQuantity('density', 'density', 'the density of its material', '2500 kg/m³', { symbol: 'ρ' }),
  ],
  needs: [
    { count: 1, of: ['diameter'] },
    { count: 1, of: ['density'] },
  ],
  hint: ['diameter'],
  later: [],
  snippet: 'particle ${1:name} { diameter = ${2:1 µm}, density = ${3:2500 kg/m³} }',
  compute: ({ inputs }) => {
    const sizes = given(inputs, 'diameter', 'density');
    if (!sizes) return undefined;
    const { diameter, density } = sizes;
    const surface = multiply(plainNumber(Math.PI), multiply(diameter, diameter));
    const volume = multiply(plainNumber(1 / 6), multiply(surface, diameter));
    return passageRecord('particle', inputs, {
      method: 'geometry of a sphere',
      geometry: { diameter, density, volume, mass: multiply(density, volume), characteristic_length: diameter },
    });
  },
};
