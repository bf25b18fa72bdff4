import type { Composition } from '../composition';
import type { SourceId } from '../sources';
import { stateProperties } from '../state/properties';
import type { Provenance } from '../state/provenance';
import { provenanceTable } from '../state/provenance';

/** How the results of a conduction come about, those alike together. */
export interface HeatProvenance {
  readonly heat: Provenance;
  readonly jumps: Provenance;
  readonly freeFlight: Provenance;
  readonly continuum: Provenance;
  readonly knudsen: Provenance;
}

export function heatProvenance(composition: Composition): HeatProvenance {
  const of = (property: string): Provenance | undefined =>
    provenanceTable(composition).mixture[stateProperties.findIndex(({ name }) => name === property)];
  const conductivity = of('thermal_conductivity');
  const withGas = (method: string, sources: readonly SourceId[], gas = conductivity): Provenance => ({
    method,
    sources: [...sources, ...(gas?.sources ?? [])],
    ...(gas?.range ? { range: gas.range } : {}),
  });
  return {
    heat: withGas(
      `linearised kinetic equation between Fourier’s law and free flight; λ: ${conductivity?.method ?? ''}`,
      heatSources,
    ),
    jumps: withGas('ζ_T = 1.954 of a diffuse wall, and (1 − α)/α of the free-molecular resistance', jumpSources),
    freeFlight: {
      method: 'free flight between walls with energy accommodation (Knudsen), summed over the species',
      sources: ['Knudsen 1911'],
    },
    continuum: withGas('Fourier’s law with the conductivity integrated between the wall temperatures', []),
    knudsen: withGas('Kn = λ/ℓ on the distance of the walls, at their mean temperature', [], of('mean_free_path')),
  };
}

const jumpSources: readonly SourceId[] = ['Welander 1954', 'Barichello & Siewert 2000'];

/** Of what happens at the walls and between the limits; that of the gas is its own. */
export const heatSources: readonly SourceId[] = ['Knudsen 1911', ...jumpSources, 'Bassanini 1967', 'Shakhov 1968'];
