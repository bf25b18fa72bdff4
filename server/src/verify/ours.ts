import { kelvin, pascal } from '../physics/brands';
import type { Composition } from '../physics/composition';
import { compositionOfMoles } from '../physics/composition';
import { speciesByName } from '../physics/species/list';
import type { Species } from '../physics/species/species';
import { solveState } from '../physics/state/closure';
import type { StateFigures, StateRequest } from '../physics/state/evaluateState';
import { evaluateState } from '../physics/state/evaluateState';
import { unitOf } from '../quantities/parseUnit';
import type { ReferenceRow } from './row';

/** What we make of a row's state, in the unit of the row. Not a number where we have no value. */
export interface Ours {
  readonly value: number;
  /** The error, 95 %, that we state for it, as a share of the value. */
  readonly stated: number;
}

export function ours(row: ReferenceRow): Ours {
  const request = requestOf(row);
  if (request === undefined) return { value: NaN, stated: NaN };
  const figures = evaluateState(request);
  const si = read(row, figures);
  const slopes = figures.modelErrors.map(({ key, relative }) => {
    const moved = (by: number) => read(row, evaluateState(request, { factors: new Map([[key, 1 + by * relative]]) }));
    return (moved(STEP) - moved(-STEP)) / (2 * STEP);
  });
  return { value: si / unitOf(row.unit).factor, stated: Math.hypot(...slopes) / Math.abs(si) };
}

/** Small against the error, so that the slope at the value is taken; large against rounding. */
const STEP = 1e-2;

/** No figure of the book rests on it. */
const siteDensity = 1e19;

function requestOf({ gas, temperature, pressure, reckonedWith }: ReferenceRow): StateRequest | undefined {
  const parts = typeof gas === 'string' ? { [gas]: 1 } : gas;
  const composition = compositionOf(parts, reckonedWith?.molarMass);
  if (composition === undefined) return undefined;
  const point = solveState(composition, { temperature: kelvin(temperature), pressure: pascal(pressure) });
  if (!point.ok) return undefined;
  const collisionDiameter = reckonedWith?.collisionDiameter;
  const request = { composition, point: point.value, siteDensity };
  return collisionDiameter === undefined ? request : { ...request, collisionDiameter };
}

function compositionOf(parts: Readonly<Record<string, number>>, molarMass?: number): Composition | undefined {
  const species: Species[] = [];
  for (const name of Object.keys(parts)) {
    const known = speciesByName(name);
    if (known === undefined) return undefined;
    species.push(molarMass === undefined ? known : { ...known, molarMass: { ...known.molarMass, value: molarMass } });
  }
  const composition = compositionOfMoles(species, Object.values(parts));
  return composition.ok ? composition.value : undefined;
}

/** The printed quantity of the row, SI. */
function read({ property, of, printedAs }: ReferenceRow, figures: StateFigures): number {
  const members = of === undefined ? figures.mixture : figures.species.get(of);
  const value = valueOf(members, property);
  switch (printedAs) {
    case undefined:
      return value;
    case 'reciprocal':
      return 1 / value;
    case 'cross-coefficient': {
      // In an even mixture of two, 4 B = B₁ + 2 B₁₂ + B₂.
      const own = [...figures.species.values()].reduce((sum, each) => sum + valueOf(each, property), 0);
      return (4 * value - own) / 2;
    }
    default:
      return printedAs satisfies never;
  }
}

function valueOf(members: StateFigures['mixture'] | undefined, property: string): number {
  const outcome = members?.get(property);
  return outcome?.ok ? outcome.value.value : NaN;
}
