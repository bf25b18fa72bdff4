import type { Point } from '../interpolated';
import type { Sourced } from '../sources';
import type { HeatCapacity } from '../thermo/heatCapacity';
import type { SaturationCurve } from '../thermo/saturationCurve';
import type { Correlation } from '../transport/correlation';
import { polarityOf, viscosityOfPotential } from '../transport/stockmayer';
import { viscosityOfSpheres } from '../transport/viscosityOfSpheres';
import type { CriticalPoint, Hazard, LennardJones, Species } from './species';
import { hazardClasses } from './species';

/** What a file states of a molecule that is not built in. All numbers are SI; a property is constant or a table over K. */
export interface Statement {
  readonly name: string;
  readonly molarMass: number;
  readonly diameter?: number;
  readonly lennardJones?: LennardJones;
  readonly dipoleMoment?: number;
  readonly viscosity?: Stated;
  readonly heatCapacity?: Stated;
  readonly vapourPressure?: Stated;
  readonly critical?: CriticalPoint;
  readonly hazards?: string;
}

export type Stated = number | readonly Point[];

/** How far a viscosity that follows from a potential, or from a diameter, may be off: our judgement. */
const potentialError = 0.05;
const sphereError = 0.1;

/** The species that a file states, as complete as its statement lets it be. */
export function statedSpecies(statement: Statement): Species {
  const { name, molarMass, diameter, lennardJones, dipoleMoment, heatCapacity, vapourPressure, critical } = statement;
  const viscosity = viscosityOf(statement);
  return {
    formula: name,
    names: [],
    molarMass: asStated(molarMass),
    ...(viscosity === undefined ? {} : { viscosity }),
    ...(heatCapacity === undefined ? {} : { heatCapacity: asStated<HeatCapacity>(pointwise(heatCapacity)) }),
    ...(vapourPressure === undefined ? {} : { saturation: [asStated(saturationOf(vapourPressure, critical))] }),
    ...(lennardJones === undefined ? {} : { lennardJones: asStated(lennardJones) }),
    ...(diameter === undefined ? {} : { hardSphere: asStated(diameter) }),
    ...(dipoleMoment === undefined || dipoleMoment === 0 ? {} : { dipoleMoment: asStated(dipoleMoment) }),
    ...(critical === undefined ? {} : { critical: asStated(critical) }),
    hazards: hazardsIn(statement.hazards ?? '').map((value) => asStated(value)),
    ...(statement.hazards === undefined ? {} : { cautions: asStated(statement.hazards) }),
  };
}

/** What is stated is taken at its word: its tolerance is that of the numbers themselves. */
function asStated<T>(value: T, uncertainty = 0): Sourced<T> {
  return { value, source: 'the file', uncertainty };
}

/** The file's own viscosity, else that of the potential, with a dipole Stockmayer's, else that of hard spheres. */
function viscosityOf(statement: Statement): Sourced<Correlation> | undefined {
  const { viscosity, lennardJones, dipoleMoment = 0, diameter, molarMass } = statement;
  if (viscosity !== undefined) return asStated<Correlation>(pointwise(viscosity));
  if (lennardJones !== undefined) {
    const polarity = polarityOf(lennardJones, dipoleMoment);
    return asStated(viscosityOfPotential(lennardJones, molarMass, anyTemperature, polarity), potentialError);
  }
  return diameter === undefined ? undefined : asStated(viscosityOfSpheres(diameter, molarMass), sphereError);
}

function saturationOf(stated: Stated, critical: CriticalPoint | undefined): SaturationCurve {
  if (typeof stated !== 'number') return { ...pointwise(stated), phase: 'liquid' };
  const high = critical?.temperature ?? Infinity;
  return { kind: 'constant', phase: 'liquid', low: 0, high, pressure: stated };
}

interface Pointwise {
  readonly kind: 'points';
  readonly low: number;
  readonly high: number;
  readonly points: readonly Point[];
}

/** A constant holds at any temperature, a table between its ends. */
function pointwise(stated: Stated): Pointwise {
  if (typeof stated === 'number') return { kind: 'points', ...anyTemperature, points: [{ at: 1, value: stated }] };
  return { kind: 'points', low: stated[0]?.at ?? 0, high: stated.at(-1)?.at ?? 0, points: stated };
}

const anyTemperature = { low: 0, high: Infinity };

/** The hazard classes that a text lists by their names; whatever else it says is for the reader. */
function hazardsIn(text: string): readonly Hazard[] {
  return hazardClasses.filter((name) => new RegExp(`(^|[;,.])\\s*${name}\\s*($|[;,.])`, 'i').test(text));
}
