import { superscript } from './superscript';

/** The dimension of a quantity. Equal dimensions are one object, so `===` compares them. */
export interface Dimension {
  /** Exponents of length, mass, time, current, temperature, amount and luminosity. */
  readonly exponents: readonly number[];
  readonly key: string;
}

const bases = ['length', 'mass', 'time', 'current', 'temperature', 'amount', 'luminosity'] as const;
export type BaseDimension = (typeof bases)[number];

const baseUnits = ['m', 'kg', 's', 'A', 'K', 'mol', 'cd'] as const;
/** The kilogram is written first, as the SI Brochure writes derived units. */
const writingOrder = [1, 0, 2, 3, 4, 5, 6];

const interned = new Map<string, Dimension>();
/** Evaluation asks for the same few products over and over. */
const products = new Map<Dimension, Map<Dimension, Dimension>>();

export const dimensionless = intern(bases.map(() => 0));

export function dimension(exponents: Partial<Record<BaseDimension, number>>): Dimension {
  return intern(bases.map((base) => exponents[base] ?? 0));
}

export function multiplyDimensions(a: Dimension, b: Dimension): Dimension {
  const known = products.get(a)?.get(b);
  if (known) return known;
  const product = intern(a.exponents.map((exponent, i) => exponent + (b.exponents[i] ?? 0)));
  products.set(a, (products.get(a) ?? new Map<Dimension, Dimension>()).set(b, product));
  return product;
}

export function divideDimensions(a: Dimension, b: Dimension): Dimension {
  return multiplyDimensions(a, powerDimension(b, -1));
}

export function powerDimension(base: Dimension, exponent: number): Dimension {
  return intern(base.exponents.map((each) => each * exponent));
}

/** The coherent SI unit in base units: `kg·m⁻¹·s⁻²`, and `1` for a plain number. */
export function coherentUnitText(of: Dimension): string {
  const factors = writingOrder.flatMap((i) => {
    const exponent = of.exponents[i] ?? 0;
    return exponent === 0 ? [] : [(baseUnits[i] ?? '') + superscript(exponent)];
  });
  return factors.join('·') || '1';
}

/** Roots leave fractions; sixths hold every square and cube root, and rounding to them keeps equal things equal. */
function intern(exponents: readonly number[]): Dimension {
  const sixths = exponents.map((exponent) => Math.round(exponent * 6));
  const key = sixths.join(',');
  const known = interned.get(key);
  if (known) return known;
  const made: Dimension = { exponents: sixths.map((n) => (n === 0 ? 0 : n / 6)), key };
  interned.set(key, made);
  return made;
}
