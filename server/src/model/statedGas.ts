import type { Composition } from '../physics/composition';
import type { Point } from '../physics/interpolated';
import type { Species } from '../physics/species/species';
import type { Stated } from '../physics/species/statedSpecies';
import { statedSpecies } from '../physics/species/statedSpecies';
import type { Gas, Quantity, StatedSpecies, Value } from './values';

/** The species of the engine that a declaration states, with its numbers as they are or as they are on trial. */
export function speciesOf({ name, inputs }: StatedSpecies, numberOf: NumberOf = best): Species {
  const number = (key: string) => {
    const value = inputs.get(key);
    return value?.kind === 'quantity' ? numberOf(value) : undefined;
  };
  const either = (key: string) => statedOf(inputs.get(key), numberOf);
  const [diameter, sigma, epsilon] = [number('diameter'), number('lj_sigma'), number('lj_epsilon')];
  const [temperature, pressure] = [number('critical_temperature'), number('critical_pressure')];
  const [dipoleMoment, acentric] = [number('dipole'), number('acentric_factor')];
  const [viscosity, heatCapacity, vapourPressure] = ['viscosity', 'heat_capacity', 'vapour_pressure'].map(either);
  const hazards = inputs.get('hazards');
  return statedSpecies({
    name,
    molarMass: number('molar_mass') ?? NaN,
    ...(diameter === undefined ? {} : { diameter }),
    ...(sigma === undefined || epsilon === undefined ? {} : { lennardJones: { diameter: sigma, wellDepth: epsilon } }),
    ...(dipoleMoment === undefined ? {} : { dipoleMoment }),
    ...(viscosity === undefined ? {} : { viscosity }),
    ...(heatCapacity === undefined ? {} : { heatCapacity }),
    ...(vapourPressure === undefined ? {} : { vapourPressure }),
    ...(temperature === undefined || pressure === undefined || acentric === undefined
      ? {}
      : { critical: { temperature, pressure, acentric } }),
    ...(hazards?.kind === 'phrase' ? { hazards: hazards.text } : {}),
  });
}

/** The numbers of a gas that may be uncertain, its shares and what a file states of its molecules, and the gas that they make. */
export interface MovableGas {
  readonly inputs: readonly Quantity[];
  /** The composition with these numbers in place of the inputs, in their order. */
  compositionAt(numbers: readonly number[]): Composition;
}

export function movableGas({ composition, fractions, stated }: Gas): MovableGas {
  const uncertain = [...stated.values()].flatMap(quantitiesOf).filter(({ leans }) => 0 < leans.size);
  const inputs = [...fractions, ...uncertain];
  return {
    inputs,
    compositionAt: (numbers) => {
      if (inputs.every(({ si }, index) => si === numbers[index])) return composition;
      const moved = new Map(inputs.map((quantity, index) => [quantity, numbers[index] ?? quantity.si]));
      const numberOf: NumberOf = (quantity) => moved.get(quantity) ?? quantity.si;
      const species = composition.species.map((one) => {
        const statement = uncertain.length > 0 ? stated.get(one.formula) : undefined;
        return statement ? speciesOf(statement, numberOf) : one;
      });
      return { ...composition, species, moleFractions: fractions.map(numberOf) };
    },
  };
}

type NumberOf = (quantity: Quantity) => number;

const best: NumberOf = ({ si }) => si;

function statedOf(value: Value | undefined, numberOf: NumberOf): Stated | undefined {
  if (value?.kind === 'quantity') return numberOf(value);
  if (value?.kind !== 'table') return undefined;
  const points: readonly Point[] = value.rows.map((row) => ({ at: numberOf(row.at), value: numberOf(row.value) }));
  return points;
}

function quantitiesOf({ inputs }: StatedSpecies): readonly Quantity[] {
  return [...inputs.values()].flatMap((value) => {
    if (value.kind === 'quantity') return [value];
    return value.kind === 'table' ? value.rows.flatMap((row) => [row.at, row.value]) : [];
  });
}
