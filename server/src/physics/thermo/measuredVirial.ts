import type { SourceId } from '../sources';
import type { Species } from '../species/species';
import { isStated } from '../species/species';

/** Second virial coefficients as measured and fitted, by formula, between `low` and `high`, K. */
export type MeasuredVirial = {
  readonly low: number;
  readonly high: number;
  readonly source: SourceId;
} & Form;

type Form =
  /** B = Σ aᵢ (298.15 K/T − 1)ⁱ, cm³/mol. */
  | { readonly kind: 'reduced'; readonly a: readonly number[] }
  /** B = 1000 Σ aᵢ (T/100 K)^bᵢ, cm³/mol. */
  | { readonly kind: 'powers'; readonly terms: readonly { readonly a: number; readonly b: number }[] };

/** The fit for a gas, if it has been measured. */
export function measuredVirial(formula: string): MeasuredVirial | undefined {
  return byFormula.get(formula);
}

/** The fit for a species, which a molecule that a file states has not, whatever its name. */
export function measuredVirialOf(species: Species): MeasuredVirial | undefined {
  return isStated(species) ? undefined : measuredVirial(species.formula);
}

/** B of a fit, m³/mol, at a temperature in K within its range. */
export function fittedVirial(fit: MeasuredVirial, T: number): number {
  switch (fit.kind) {
    case 'reduced': {
      const x = 298.15 / T - 1;
      return 1e-6 * fit.a.reduceRight((sum, a) => sum * x + a, 0);
    }
    case 'powers':
      return 1e-3 * fit.terms.reduce((sum, { a, b }) => sum + a * Math.pow(T / 100, b), 0);
    default:
      return fit satisfies never;
  }
}

/**
 * The handbook's fits to the evaluations of Dymond & Smith, from memory, each compared with Tsonopoulos's correlation:
 * they agree within 5 cm³/mol from 250 to 400 K. Water is that of Harvey & Lemmon 2004, from memory, whose form is smooth down
 * to temperatures at which the vapour over ice is too thin for B to matter.
 */
const fits: Readonly<Record<string, MeasuredVirial>> = {
  Ar: reduced(100, 1000, [-16, -60, -10]),
  Kr: reduced(110, 700, [-51, -118, -29, -5]),
  Xe: reduced(160, 650, [-130, -262, -87]),
  Ne: reduced(60, 600, [10.8, -7.5, 0.4]),
  He: reduced(50, 700, [12, -1]),
  H2: reduced(50, 400, [15.4, -9, -0.2]),
  N2: reduced(75, 700, [-4, -56, -12]),
  O2: reduced(90, 400, [-16, -62, -8, -3]),
  CO: reduced(210, 480, [-9, -58, -18]),
  CO2: reduced(220, 1100, [-127, -288, -118]),
  CH4: reduced(110, 600, [-43, -114, -19, -7]),
  NH3: reduced(290, 420, [-271, -1022, -2716, -4189]),
  SF6: reduced(200, 500, [-279, -647, -335, -72]),
  H2O: {
    kind: 'powers',
    low: 150,
    high: 1800,
    source: 'Harvey & Lemmon 2004',
    terms: [
      { a: 0.34404, b: -0.5 },
      { a: -0.75826, b: -0.8 },
      { a: -24.219, b: -3.35 },
      { a: -3978.2, b: -8.3 },
    ],
  },
};

const byFormula: ReadonlyMap<string, MeasuredVirial> = new Map(Object.entries(fits));

function reduced(low: number, high: number, a: readonly number[]): MeasuredVirial {
  return { kind: 'reduced', low, high, source: 'CRC 2014', a };
}
