import { pure } from '../composition';
import { k, N_A, R } from '../constants';
import type { Outcome } from '../outcome';
import { failure, map, map2, success } from '../outcome';
import type { Species } from '../species/species';
import { dewPoint, saturationPressure } from '../thermo/saturation';
import { heatCapacityRange, molarHeatCapacity } from '../thermo/heatCapacity';
import type { Virial } from '../thermo/virial';
import { secondVirial } from '../thermo/virial';
import { conductionMethod, correlatedConductivity, kineticConductivity } from '../transport/conductivity';
import { diameterOfViscosity, viscosity } from '../transport/viscosity';
import type { StateRequest, Trial } from './request';
import { factor } from './request';

/** One species of a gas, by itself at the temperature of the gas. */
export interface SpeciesAlone {
  readonly species: Species;
  readonly moleFraction: number;
  /** 1/m³. */
  readonly numberDensity: number;
  /** Mass of a molecule, kg. */
  readonly mass: number;
  /** Mean speed, m/s. */
  readonly meanSpeed: number;
  /** Of the species alone: J/(mol K), Pa s, W/(m K). */
  readonly cp: Outcome<number>;
  readonly viscosity: Outcome<number>;
  readonly conductivity: Outcome<number>;
  /** Hard-sphere diameter, m. */
  readonly diameter: Outcome<number>;
  /** Second virial coefficient, m³/mol. */
  readonly virial: Outcome<number>;
  /** Saturation pressure, Pa. */
  readonly saturation: Outcome<number>;
  /** The temperature, K, at which it is the partial pressure. */
  readonly dewPoint: Outcome<number>;
}

export function speciesAlone(
  species: Species,
  moleFraction: number,
  request: StateRequest,
  trial: Trial,
): SpeciesAlone {
  const { temperature: T, numberDensity } = request.point;
  const mass = species.molarMass.value / N_A;
  const eta = map(viscosity(species, T), (value) => value * factor(trial, `viscosity:${species.formula}`));
  const cp = heatCapacity(species, T, trial);
  const saturationScale = factor(trial, `saturation_pressure:${species.formula}`);
  return {
    species,
    moleFraction,
    numberDensity: moleFraction * numberDensity,
    mass,
    meanSpeed: Math.sqrt((8 * k * T) / (Math.PI * mass)),
    cp,
    viscosity: eta,
    conductivity: conductivity(species, eta, cp, T, trial),
    diameter: diameter(species, eta, request),
    virial: virialOnTrial(secondVirial(pure(species), T), trial),
    saturation: map(saturationPressure(species, T), (value) => value * saturationScale),
    dewPoint: dewPoint(species, (moleFraction * request.point.pressure) / saturationScale),
  };
}

/** B itself may be nought, so its error is counted in the volume that goes with it. */
export function virialOnTrial(virial: Outcome<Virial>, trial: Trial): Outcome<number> {
  const excess = factor(trial, 'second_virial') - 1;
  return map(virial, ({ coefficient, scale }) => coefficient + excess * scale);
}

function heatCapacity(species: Species, T: number, trial: Trial): Outcome<number> {
  const data = species.heatCapacity?.value;
  if (data === undefined) return failure({ kind: 'no-data', species: species.formula, property: 'heat_capacity' });
  const value = molarHeatCapacity(data, T) * factor(trial, `heat_capacity:${species.formula}`);
  const { low, high } = heatCapacityRange(data);
  if (low <= T && T <= high) return success(value);
  const range = { quantity: 'temperature', value: T, low, high } as const;
  return success(value, [{ kind: 'outside-range', ...range, property: 'heat_capacity', species: species.formula }]);
}

function conductivity(
  species: Species,
  eta: Outcome<number>,
  cp: Outcome<number>,
  T: number,
  trial: Trial,
): Outcome<number> {
  const method = conductionMethod(species);
  if (method === 'correlation') {
    const scale = factor(trial, `conductivity:${species.formula}`);
    return map(correlatedConductivity(species, T), (value) => value * scale);
  }
  const scale = factor(trial, method === 'eucken' ? 'eucken' : 'monatomic_conductivity');
  return map2(eta, cp, (value, heat) => scale * kineticConductivity(species, value, heat - R));
}

function diameter(species: Species, eta: Outcome<number>, request: StateRequest): Outcome<number> {
  const stated = request.collisionDiameter ?? species.hardSphere?.value;
  if (stated === undefined) {
    return map(eta, (value) => diameterOfViscosity(value, species.molarMass.value, request.point.temperature));
  }
  if (0 < stated) return success(stated);
  return failure({ kind: 'not-positive', quantity: 'collisionDiameter', value: stated });
}
