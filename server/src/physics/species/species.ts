import type { Sourced } from '../sources';
import type { HeatCapacity } from '../thermo/heatCapacity';
import type { SaturationCurve } from '../thermo/saturationCurve';
import type { Correlation } from '../transport/correlation';

/** One kind of molecule, or a blend treated as one, with what is known of it. What is missing is left out, never invented. */
export interface Species {
  /** The name it has in files, also its key: `N2`. */
  readonly formula: string;
  /** Common names, the usual one first. */
  readonly names: readonly string[];
  /** Molar mass, kg/mol. */
  readonly molarMass: Sourced<number>;
  readonly viscosity?: Sourced<Correlation>;
  /** Where it is left out, the conductivity follows from viscosity and heat capacity. */
  readonly conductivity?: Sourced<Correlation>;
  readonly heatCapacity?: Sourced<HeatCapacity>;
  /** Over the solids and the liquid, from cold to warm, each curve with its own source. */
  readonly saturation?: readonly Sourced<SaturationCurve>[];
  readonly lennardJones?: Sourced<LennardJones>;
  /** The diameter, m, of molecules that are to collide as hard spheres; else it follows from the viscosity. */
  readonly hardSphere?: Sourced<number>;
  /** Electric dipole moment, C m, of a polar molecule. */
  readonly dipoleMoment?: Sourced<number>;
  readonly critical?: Sourced<CriticalPoint>;
  /** What its molecules join to, in part, or come from, where the vapour is not of one kind. */
  readonly associates?: Sourced<string>;
  readonly hazards: readonly Sourced<Hazard>[];
  /** What a file says of its hazards, word for word. */
  readonly cautions?: Sourced<string>;
  /** Mole fractions of what a blend consists of. */
  readonly blend?: Sourced<Readonly<Record<string, number>>>;
}

/** Whether a species is stated by a file, so that no published data hold for it even if it has the name of a gas that has them. */
export function isStated({ molarMass }: Species): boolean {
  return molarMass.source === 'the file';
}

/** The 12-6 potential V(r) = 4ε[(σ/r)¹² − (σ/r)⁶]. */
export interface LennardJones {
  /** σ, m. */
  readonly diameter: number;
  /** ε/k, K. */
  readonly wellDepth: number;
}

/** Where liquid and vapour become one, and the acentric factor, which tells how far the vapour curve departs from argon's. */
export interface CriticalPoint {
  /** K. */
  readonly temperature: number;
  /** Pa. */
  readonly pressure: number;
  /** ω = −1 − lg(p_sat/p_c) at 0.7 T_c. */
  readonly acentric: number;
}

/** Hazard classes by their GHS names; a simple asphyxiant is a class of the OSHA standard only. */
export const hazardClasses = [
  'flammable gas',
  'pyrophoric gas',
  'chemically unstable gas',
  'oxidising gas',
  'flammable liquid',
  'pyrophoric liquid',
  'emits flammable gas with water',
  'acute toxicity, inhalation',
  'acute toxicity, dermal',
  'narcotic effects',
  'carcinogenicity',
  'germ cell mutagenicity',
  'reproductive toxicity',
  'specific target organ toxicity',
  'skin corrosion',
  'skin irritation',
  'serious eye irritation',
  'hazardous to the aquatic environment',
  'hazardous to the ozone layer',
  'simple asphyxiant',
] as const;

export type Hazard = (typeof hazardClasses)[number];
