import { chapmanEnskogPrefactor } from '../transport/correlation';
import type { Species } from './species';

/** Normal deuterium: two thirds ortho, one third para. */
export const D2: Species = {
  formula: 'D2',
  names: ['deuterium'],
  molarMass: {
    value: 4.028203556e-3,
    source: 'Wang 2021',
    where: 'twice the atomic mass of ²H; from memory',
    uncertainty: 1e-9,
  },
  viscosity: {
    value: {
      kind: 'collision-integral',
      prefactor: chapmanEnskogPrefactor(0.021357, 4.0282, 0.297),
      theta: 30.41,
      coefficients: [0.20963, -0.455274, 0.143602, -0.0335325, 0.00276981],
      low: 100,
      high: 2000,
    },
    source: 'Muzny 2013',
    where: 'the collision integral of hydrogen with the mass of deuterium',
    uncertainty: 0.02,
  },
  heatCapacity: {
    value: {
      kind: 'rotor-vibrator',
      low: 10,
      high: 1500,
      // B₀ = Bₑ − αₑ/2 and ΔG(½) = ωₑ − 2 ωₑxₑ, with Bₑ = 30.4438, αₑ = 1.0786, ωₑ = 3115.50, ωₑxₑ = 61.82 cm⁻¹.
      rotation: 2990.45,
      distortion: 1.141,
      vibration: 299186,
      even: 2 / 3,
      odd: 1 / 3,
    },
    source: 'Huber & Herzberg 1979',
    where: 'constants of ²H₂, X ¹Σg⁺; from memory',
    uncertainty: 0.005,
  },
  lennardJones: {
    value: { diameter: 2.827e-10, wellDepth: 59.7 },
    source: 'Svehla 1962',
    where: 'table I, hydrogen: isotopes share their potential; from memory',
  },
  saturation: [
    {
      value: {
        kind: 'wagner',
        phase: 'liquid',
        low: 18.724,
        high: 38.34,
        temperature: 38.34,
        pressure: 1679600.0,
        terms: [
          { n: -5.5706, t: 1 },
          { n: 1.7631, t: 1.5 },
          { n: -0.5458, t: 2.83 },
          { n: 1.2154, t: 4.06 },
          { n: -1.1556, t: 5.4 },
        ],
      },
      source: 'Richardson 2014',
      where: 'normal deuterium, ancillary equation of the vapour pressure; from memory',
      uncertainty: 0.01,
    },
  ],
  critical: {
    value: { temperature: 38.34, pressure: 1.665e6, acentric: -0.145 },
    source: 'Poling 2001',
    where: 'appendix A; from memory',
  },
  hazards: [
    { value: 'flammable gas', source: 'CLP 2008', where: 'Flam. Gas 1, H220, by analogy with hydrogen' },
    { value: 'simple asphyxiant', source: 'OSHA HCS 2012', where: 'definition of a simple asphyxiant' },
  ],
};
