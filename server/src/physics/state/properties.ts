import { amountProperties } from './amounts';
import { condensationProperties } from './condensation';
import { kineticProperties } from './kinetic';
import { nonIdealityProperties } from './nonIdeality';
import type { StateProperty } from './property';
import { thermalProperties } from './thermal';

/** Everything that can be asked of a gas state. A new property is one row in one of these lists, and its reference rows. */
export const stateProperties: readonly StateProperty[] = [
  ...amountProperties,
  ...kineticProperties,
  ...thermalProperties,
  ...nonIdealityProperties,
  ...condensationProperties,
];

const byName: ReadonlyMap<string, StateProperty> = new Map(stateProperties.map((row) => [row.name, row]));

export function statePropertyNamed(name: string): StateProperty | undefined {
  return byName.get(name);
}
