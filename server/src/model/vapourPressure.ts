import type { Outcome } from '../physics/outcome';
import { saturationErrorAt } from '../physics/state/modelErrors';
import { saturationPressure } from '../physics/thermo/saturation';
import { dimension } from '../quantities/dimension';
import { propagate } from './propagate';
import { quantity } from './quantity';
import { explainReason } from './reasons';
import { movableGas } from './statedGas';
import { exact } from './tolerance';
import type { Gas, Quantity } from './values';

/** The saturation pressure of a gas of one species at a temperature, with all that makes it uncertain; or why there is none. */
export function vapourPressure(gas: Gas, temperature: Quantity): Quantity | string {
  const [species, other] = gas.composition.species;
  if (!species || other) return 'a mixture has no vapour pressure of its own; ask for that of one of its species';
  const movable = movableGas(gas);
  const { result, leans } = propagate<Outcome<number>>({
    inputs: [temperature, ...movable.inputs],
    run: ([T = NaN, ...ofGas], factors) => {
      const [moved = species] = movable.compositionAt(ofGas).species;
      const found = saturationPressure(moved, T);
      const [factor = 1] = factors.values();
      return found.ok ? { ...found, value: factor * found.value } : found;
    },
    errorsOf: () => saturationErrorAt(species, temperature.si),
    valuesOf: (outcome) => new Map(outcome.ok ? [['pressure', outcome.value]] : []),
  });
  if (!result.ok) return explainReason(result.reason);
  return { ...quantity(result.value, pressure, leans.get('pressure') ?? exact), quantityKind: 'pressure' };
}

const pressure = dimension({ mass: 1, length: -1, time: -2 });
