import type { Composition } from '../composition';
import type { Provenance } from '../state/provenance';
import { provenanceTable } from '../state/provenance';
import { stateProperties } from '../state/properties';
import { heatSources } from './conductHeat';

/** How conducted heat comes about: the conductivity of the gas, and what the kinetic equation tells of its walls. */
export function heatProvenance(composition: Composition): Provenance {
  const row = stateProperties.findIndex(({ name }) => name === 'thermal_conductivity');
  const conductivity = provenanceTable(composition).mixture[row];
  const method = `linearised kinetic equation between Fourier’s law and free flight; λ: ${conductivity?.method ?? ''}`;
  const sources = [...heatSources, ...(conductivity?.sources ?? [])];
  return { method, sources, ...(conductivity?.range ? { range: conductivity.range } : {}) };
}
