import type { Outcome } from '../outcome';
import { failure, success } from '../outcome';
import type { SourceId } from '../sources';
import type { Section } from './kineticSolution';
import {
  accommodationRoots,
  lowestAccommodation,
  rarefactionAt,
  rarefactionGrid,
  viscousPart,
} from './tables/kineticTable';
import { platesTable } from './tables/platesTable';
import { tubeTable } from './tables/tubeTable';
import type { UniformSpline } from './uniformSpline';
import { splineAt, uniformSpline } from './uniformSpline';

export type { Section } from './kineticSolution';

/**
 * The reduced flows through a long passage, as F. Sharipov and V. Seleznev define them (J. Phys. Chem. Ref. Data 27, 657 (1998)):
 * the mass flow is (area) (p/v₀) [−G_P (a/p) dp/dz + G_T (a/T) dT/dz], with v₀ = √(2kT/m) and the radius or the gap as a.
 */
export interface KineticCoefficients {
  readonly poiseuille: number;
  readonly thermalCreep: number;
  /** What G_P is more than by Poiseuille's law: the share of slip and of free flight. */
  readonly beyondViscous: number;
}

/** Where the equation and the definitions come from. The tables are our own. */
export const kineticSources: readonly SourceId[] = ['Shakhov 1968', 'Sharipov & Seleznev 1998'];

/**
 * For any rarefaction δ > 0 and diffuse–specular walls, from the tables of the linearised kinetic equation with the collision
 * model of Shakhov. Below the tables they go over into the free-molecular limit (tube), or rise with the logarithm of δ
 * (plates); above them they approach the slip coefficients as 1/δ.
 */
export function kineticCoefficients(
  section: Section,
  rarefaction: number,
  accommodation: number,
): Outcome<KineticCoefficients> {
  if (!(rarefaction > 0)) return failure({ kind: 'not-positive', quantity: 'rarefaction', value: rarefaction });
  if (!(accommodation >= lowestAccommodation && accommodation <= 1)) {
    return failure({
      kind: 'outside-range',
      quantity: 'accommodation',
      value: accommodation,
      low: lowestAccommodation,
      high: 1,
    });
  }
  const { slip, creep } = splines(section);
  const mirrored = (2 - accommodation) / accommodation;
  const root = Math.sqrt(Math.sqrt(accommodation));
  const beyondViscous = mirrored * acrossRoots(root, (row) => slipAt(slip[row], section, rarefaction));
  const thermalCreep = mirrored * Math.exp(acrossRoots(root, (row) => creepAt(creep[row], section, rarefaction)));
  return success({ poiseuille: viscousPart(section, rarefaction) + beyondViscous, thermalCreep, beyondViscous });
}

/** Of a tube, diffuse: G_P and twice G_T where no molecule meets another (Knudsen). */
const molecularTube = 8 / (3 * Math.sqrt(Math.PI));

function slipAt(spline: UniformSpline | undefined, section: Section, delta: number): number {
  if (!spline) return NaN;
  const place = placeOf(delta);
  if (place < 0) {
    const { value, slope } = splineAt(spline, 0);
    if (section === 'plates') return value + place * slope;
    return molecularTube + ((value - molecularTube) * delta) / rarefactionGrid.low;
  }
  if (place <= rarefactionGrid.count - 1) return splineAt(spline, place).value;
  const { value, slope } = splineAt(spline, rarefactionGrid.count - 1);
  return value + slope * perLogarithm * (1 - rarefactionGrid.high / delta);
}

function creepAt(spline: UniformSpline | undefined, section: Section, delta: number): number {
  if (!spline) return NaN;
  const place = placeOf(delta);
  if (place < 0) {
    const { value, slope } = splineAt(spline, 0);
    if (section === 'plates') return value + Math.log1p(place * slope);
    const limit = Math.log(molecularTube / 2);
    return limit + ((value - limit) * delta) / rarefactionGrid.low;
  }
  if (place <= rarefactionGrid.count - 1) return splineAt(spline, place).value;
  // G_T δ approaches the thermal slip coefficient as 1/δ.
  const { value, slope } = splineAt(spline, rarefactionGrid.count - 1);
  const ratio = rarefactionGrid.high / delta;
  return value + Math.log(ratio) + Math.log1p((slope * perLogarithm + 1) * (1 - ratio));
}

function placeOf(delta: number): number {
  return Math.log10(delta / rarefactionAt(0)) * rarefactionGrid.perDecade;
}

/** From a slope per column to one per ln δ. */
const perLogarithm = rarefactionGrid.perDecade / Math.LN10;

/** The polynomial through Chebyshev's points, in the barycentric form of Salzer. */
function acrossRoots(root: number, valueAt: (row: number) => number): number {
  let above = 0;
  let below = 0;
  const last = accommodationRoots.length - 1;
  for (const [row, point] of accommodationRoots.entries()) {
    const distance = root - point;
    if (Math.abs(distance) < 1e-14) return valueAt(row);
    const weight = ((row % 2 === 0 ? 1 : -1) * (row === 0 || row === last ? 0.5 : 1)) / distance;
    above += weight * valueAt(row);
    below += weight;
  }
  return above / below;
}

interface Splines {
  readonly slip: readonly UniformSpline[];
  readonly creep: readonly UniformSpline[];
}

const prepared = new Map<Section, Splines>();

/** Prepared when they are first asked for. */
function splines(section: Section): Splines {
  const known = prepared.get(section);
  if (known) return known;
  const table = section === 'tube' ? tubeTable : platesTable;
  const made = { slip: table.slip.map(uniformSpline), creep: table.creep.map(uniformSpline) };
  prepared.set(section, made);
  return made;
}

/** What the gas consists of, as far as the model of its collisions depends on it. */
export type Molecules = 'atoms' | 'molecules' | 'mixture';

/**
 * The relative errors, 95 %, of the collision model; our judgement from how far the slip coefficients of the Boltzmann equation
 * for rigid spheres lie from those of the model. Where no molecule meets another, and in Poiseuille's law, there is none. Heat
 * that molecules carry inside drives no creep, which the model does not know.
 */
export function kineticErrors({ poiseuille, beyondViscous }: KineticCoefficients, delta: number, of: Molecules) {
  const collisions = delta / (1 + delta);
  const creep = { atoms: 0.05, molecules: 0.15, mixture: 0.2 }[of];
  const slip = of === 'mixture' ? 0.06 : 0.03;
  return {
    poiseuille: NUMERICAL + slip * collisions * (beyondViscous / poiseuille),
    thermalCreep: NUMERICAL + creep * collisions,
  };
}

/** Of the solution and its interpolation. */
const NUMERICAL = 5e-4;
