import { kelvin, pascal } from '../../physics/brands';
import type { ConductedHeat, Conduction } from '../../physics/heat/conductHeat';
import { conductHeat } from '../../physics/heat/conductHeat';
import { heatErrors } from '../../physics/heat/heatErrors';
import type { HeatNotes } from '../../physics/heat/heatNotes';
import { heatNotes } from '../../physics/heat/heatNotes';
import type { HeatWalls } from '../../physics/heat/walls';
import type { Outcome } from '../../physics/outcome';
import { quantityInput } from '../inputs';
import type { Propagated } from '../propagate';
import { propagate } from '../propagate';
import { movableGas } from '../statedGas';
import type { Quantity } from '../values';
import type { ConductionInputs } from './conductionInputs';

export interface ConductionRun extends Propagated<Outcome<ConductedHeat>> {
  readonly notes: HeatNotes;
}

/** Runs the engine on the inputs, with every uncertain input and every model error carried through. */
export function runConduction(inputs: ConductionInputs): ConductionRun {
  const { gas, hot, cold, pressure, hotAccommodation, coldAccommodation } = inputs;
  const movable = movableGas(gas);
  const sizes = SIZES.map((name) => quantityInput(inputs.geometry.inputs, name)).filter((size) => size !== undefined);
  const all: readonly Quantity[] = [
    hot,
    cold,
    pressure,
    hotAccommodation,
    coldAccommodation,
    ...sizes,
    ...movable.inputs,
  ];
  const conductionAt = (values: readonly number[]): Conduction => {
    const [hotter = NaN, colder = NaN, filling = NaN, atHot = NaN, atCold = NaN] = values;
    return {
      composition: movable.compositionAt(values.slice(5 + sizes.length)),
      hot: kelvin(hotter),
      cold: kelvin(colder),
      pressure: pascal(filling),
      hotAccommodation: atHot,
      coldAccommodation: atCold,
      walls: wallsOf(inputs, values.slice(5, 5 + sizes.length)),
    };
  };
  const best = conductionAt(all.map(({ si }) => si));
  const errors = heatErrors(best);
  const propagated = propagate<Outcome<ConductedHeat>>({
    inputs: all,
    run: (values, factors) => conductHeat(conductionAt(values), { factors }),
    errorsOf: () => errors,
    valuesOf: (result) => (result.ok ? numbersOf(result.value) : new Map()),
  });
  return { ...propagated, notes: heatNotes(best) };
}

/** Of a gap or of a jacket, whichever it is. */
const SIZES = ['spacing', 'area', 'inner', 'outer', 'length'] as const;

function wallsOf({ geometry, hotWall }: ConductionInputs, sizes: readonly number[]): HeatWalls {
  const [first = NaN, second = NaN, third = NaN] = sizes;
  return geometry.word === 'gap'
    ? { kind: 'plates', spacing: first, area: second }
    : { kind: 'cylinders', inner: first / 2, outer: second / 2, length: third, hot: hotWall };
}

/** The results by the names that they have in a file. */
export function numbersOf(heat: ConductedHeat): ReadonlyMap<string, number> {
  return new Map([
    ['heat_flow', heat.flow],
    ['heat_flux', heat.flux],
    ['conductivity', heat.conductivity],
    ['jump_length_hot', heat.hotJump],
    ['jump_length_cold', heat.coldJump],
    ['free_molecular_heat_flow', heat.freeMolecularFlow],
    ['continuum_heat_flow', heat.continuumFlow],
    ...(heat.knudsen.ok ? [['knudsen', heat.knudsen.value] as const] : []),
  ]);
}
