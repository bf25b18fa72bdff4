import type { Species } from './species';

/** The single molecule: near room temperature the gas holds N₂O₄ too, which is left out here. */
export const NO2: Species = {
  formula: 'NO2',
  names: ['nitrogen dioxide'],
  molarMass: { value: 46.005e-3, source: 'CIAAW 2021', where: 'abridged standard atomic weights', uncertainty: 7e-5 },
  viscosity: {
    value: {
      kind: 'exponential',
      prefactor: 1e-7,
      low: 300,
      high: 5000,
      pieces: [
        { high: 1000, a: [0.573791, -126.36034, 2156.6823, 2.2287492] },
        { high: 5000, a: [0.64239645, 0.60012144, -27020.876, 1.6570566] },
      ],
    },
    source: 'Svehla 1995',
    where: 'NO2',
    uncertainty: 0.1,
  },
  heatCapacity: {
    value: {
      kind: 'nasa-9',
      low: 200,
      high: 6000,
      intervals: [
        {
          high: 1000,
          a: [-56420.3878, 963.308572, -2.434510974, 0.01927760886, -1.874559328e-5, 9.14549773e-9, -1.777647635e-12],
        },
        {
          high: 6000,
          a: [721300.157, -3832.6152, 11.13963285, -0.002238062246, 6.54772343e-7, -7.6113359e-11, 3.32836105e-15],
        },
      ],
    },
    source: 'McBride 2002',
    where: 'table 1, nitrogen dioxide, 200 to 6000 K',
    uncertainty: 0.01,
  },
  associates: { value: 'N2O4', source: 'Chase 1998', where: 'NO2 and N2O4; from memory' },
  hazards: [
    { value: 'oxidising gas', source: 'CLP 2008', where: 'Ox. Gas 1, H270; from memory' },
    { value: 'acute toxicity, inhalation', source: 'CLP 2008', where: 'Acute Tox. 2, H330; from memory' },
    { value: 'skin corrosion', source: 'CLP 2008', where: 'Skin Corr. 1B, H314; from memory' },
  ],
};
