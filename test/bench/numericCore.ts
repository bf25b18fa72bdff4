import { h, k, N_A, R } from '../../server/src/physics/constants';
import type { Species } from '../../server/src/physics/species/species';
import { molarHeatCapacity } from '../../server/src/physics/thermo/heatCapacity';
import { correlated } from '../../server/src/physics/transport/correlation';
import { mixtureViscosity } from '../../server/src/physics/transport/mixtureViscosity';
import { pairsOf } from '../../server/src/physics/transport/pairs';
import { diameterOfViscosity } from '../../server/src/physics/transport/viscosity';

/* The engine's numbers without their provenance: its own correlations, and the kinetic formulas around them. */

export const siteDensity = 1e19;

/** The figures that `pureFigures` gives, in its order. */
export const pureNames = [
  'number_density',
  'density',
  'mean_speed',
  'rms_speed',
  'most_probable_speed',
  'mean_kinetic_energy',
  'mean_free_path',
  'mean_free_path_hard_sphere',
  'collision_diameter',
  'collision_frequency',
  'mean_spacing',
  'impingement_rate',
  'mass_flux',
  'monolayer_time',
  'thermal_wavelength',
  'viscosity',
  'molar_heat_capacity_cp',
  'heat_capacity_ratio',
  'sound_speed',
] as const;

/** Adds the figures of one gas at one state to the sums. */
export function addPureFigures(
  { molarMass, viscosity, heatCapacity }: Species,
  T: number,
  p: number,
  sums: Float64Array,
) {
  if (viscosity === undefined || heatCapacity === undefined) throw new Error('the gas has no data');
  const M = molarMass.value;
  const m = M / N_A;
  const n = p / (k * T);
  const speed = Math.sqrt((8 * k * T) / (Math.PI * m));
  const eta = correlated(viscosity.value, T);
  const d = diameterOfViscosity(eta, M, T);
  const path = 1 / (n * Math.PI * d * d * Math.SQRT2);
  const hits = (n * speed) / 4;
  const cp = molarHeatCapacity(heatCapacity.value, T);
  const ratio = cp / (cp - R);
  const figures = [
    n,
    n * m,
    speed,
    Math.sqrt((3 * k * T) / m),
    Math.sqrt((2 * k * T) / m),
    1.5 * k * T,
    (eta / p) * Math.sqrt((Math.PI * R * T) / (2 * M)),
    path,
    d,
    speed / path,
    1 / Math.cbrt(n),
    hits,
    m * hits,
    siteDensity / hits,
    h / Math.sqrt(2 * Math.PI * m * k * T),
    eta,
    cp,
    ratio,
    Math.sqrt((ratio * R * T) / M),
  ];
  for (let at = 0; at < figures.length; at += 1) sums[at] = (sums[at] ?? 0) + (figures[at] ?? 0);
}

/** The viscosity of a mixture, Pa s, by the engine's own functions. They give the ratios B* of the pairs as well. */
export function viscosityOfMixture(
  species: readonly Species[],
  x: readonly number[],
  molarMass: readonly number[],
  T: number,
): number {
  const own = species.map(({ viscosity }) => (viscosity === undefined ? NaN : correlated(viscosity.value, T)));
  return mixtureViscosity(x, molarMass, own, pairsOf(species, own, T));
}
