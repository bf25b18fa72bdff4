import { viscosityOfPotential } from '../transport/stockmayer';
import type { Species } from './species';

const potential = { diameter: 4.662e-10, wellDepth: 134 };

export const CF4: Species = {
  formula: 'CF4',
  names: ['carbon tetrafluoride', 'tetrafluoromethane'],
  molarMass: { value: 88.003e-3, source: 'CIAAW 2021', where: 'abridged standard atomic weights', uncertainty: 7e-5 },
  viscosity: {
    value: viscosityOfPotential(potential, 88.003e-3, { low: 200, high: 1500 }),
    source: 'Svehla 1962',
    where: 'table I(a), fitted to measured viscosities',
    uncertainty: 0.03,
  },
  heatCapacity: {
    value: {
      kind: 'nasa-9',
      low: 200,
      high: 6000,
      intervals: [
        {
          high: 1000,
          a: [9817.4585, 116.3343483, -1.288338636, 0.0395956691, -4.99624421e-5, 3.125339346e-8, -7.84170032e-12],
        },
        {
          high: 6000,
          a: [-416445.678, -1414.797167, 14.05124837, -4.19909386e-4, 9.27892161e-8, -1.06457583e-11, 4.93709968e-16],
        },
      ],
    },
    source: 'McBride 2002',
    where: 'table 1, carbon tetrafluoride, 200 to 6000 K',
    uncertainty: 0.01,
  },
  lennardJones: { value: potential, source: 'Svehla 1962', where: 'table I(a)' },
  critical: {
    value: { temperature: 227.51, pressure: 3.745e6, acentric: 0.179 },
    source: 'Poling 2001',
    where: 'appendix A; from memory',
  },
  hazards: [{ value: 'simple asphyxiant', source: 'OSHA HCS 2012', where: 'definition of a simple asphyxiant' }],
};
