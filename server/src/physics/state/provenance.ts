import type { Composition } from '../composition';
import { pure } from '../composition';
import type { DataKind } from '../outcome';
import type { SourceId, Sourced } from '../sources';
import type { Species } from '../species/species';
import { saturationRange } from '../thermo/saturation';
import { heatCapacityRange } from '../thermo/heatCapacity';
import { stateProperties } from './properties';
import type { Method, StateProperty } from './property';

/** How a figure came about, whatever its state: the same for every temperature and pressure of one composition. */
export interface Provenance {
  readonly method: string;
  readonly sources: readonly SourceId[];
  /** Where all the correlations behind it hold. */
  readonly range?: TemperatureRange;
}

export interface TemperatureRange {
  readonly quantity: 'temperature';
  readonly low: number;
  readonly high: number;
}

/** The provenance of every property of a composition and of its species, in the order of the lists. */
export interface ProvenanceTable {
  readonly mixture: readonly Provenance[];
  readonly species: readonly (readonly Provenance[])[];
}

/** A composition is written down once and evaluated many times, so the table is kept as long as the composition is. */
const tables = new WeakMap<Composition, ProvenanceTable>();

export function provenanceTable(composition: Composition): ProvenanceTable {
  const known = tables.get(composition);
  if (known !== undefined) return known;
  const table: ProvenanceTable = {
    mixture: stateProperties.map((row) => provenance(row, composition, wholeMethod(row, composition))),
    species: composition.species.map((species) =>
      stateProperties.map((row) =>
        provenance(row, scope(row, species, composition), speciesMethod(row, species, composition)),
      ),
    ),
  };
  tables.set(composition, table);
  return table;
}

function provenance(row: StateProperty, { species }: Composition, { method, sources: published }: Method): Provenance {
  const sources = new Set<SourceId>();
  for (const one of species) {
    for (const kind of row.restsOn) {
      for (const source of dataSources(one, kind)) sources.add(source);
    }
  }
  for (const source of published) sources.add(source);
  const range = commonRange(species, row.restsOn);
  return { method, sources: [...sources], ...(range === undefined ? {} : { range }) };
}

function wholeMethod(row: StateProperty, composition: Composition): Method {
  const [only, second] = composition.species;
  if (second !== undefined) return row.mixed ?? row;
  return only === undefined ? row : (row.methodFor?.(only) ?? row);
}

/** Paths and diffusivities of a species depend on its partners too; the other figures are its own. */
function scope(row: StateProperty, species: Species, composition: Composition): Composition {
  return amongOthers.has(row.name) ? composition : pure(species);
}

function speciesMethod(row: StateProperty, species: Species, composition: Composition): Method {
  if (amongOthers.has(row.name) && 1 < composition.species.length) return row.mixed ?? row;
  return row.methodFor?.(species) ?? row;
}

const amongOthers: ReadonlySet<string> = new Set([
  'mean_free_path_hard_sphere',
  'collision_frequency',
  'diffusivity',
  'schmidt',
  'lewis',
]);

function dataSources(species: Species, kind: DataKind): readonly SourceId[] {
  return dataOf(species, kind).flatMap((data) => (data === undefined ? [] : [data.source]));
}

function dataOf(species: Species, kind: DataKind): readonly (Sourced<unknown> | undefined)[] {
  switch (kind) {
    case 'viscosity':
      return [species.viscosity];
    case 'conductivity':
      return [species.conductivity];
    case 'heat_capacity':
      return [species.heatCapacity];
    case 'pair_potential':
      return [species.lennardJones];
    case 'saturation_pressure':
    case 'saturation_curve':
      return species.saturation ?? [];
    case 'critical_point':
      return [species.critical];
    default:
      return kind satisfies never;
  }
}

function commonRange(species: readonly Species[], kinds: readonly DataKind[]): TemperatureRange | undefined {
  let low = 0;
  let high = Infinity;
  for (const one of species) {
    for (const range of kinds.map((kind) => dataRange(one, kind))) {
      low = Math.max(low, range?.low ?? 0);
      high = Math.min(high, range?.high ?? Infinity);
    }
  }
  return low === 0 && high === Infinity ? undefined : { quantity: 'temperature', low, high };
}

function dataRange(species: Species, kind: DataKind): { readonly low: number; readonly high: number } | undefined {
  switch (kind) {
    case 'viscosity':
      return species.viscosity?.value;
    case 'conductivity':
      return species.conductivity?.value;
    case 'heat_capacity':
      return species.heatCapacity && heatCapacityRange(species.heatCapacity.value);
    case 'saturation_pressure':
    case 'saturation_curve':
      return saturationRange(species);
    case 'pair_potential':
    case 'critical_point':
      return undefined;
    default:
      return kind satisfies never;
  }
}
