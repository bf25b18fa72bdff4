/** A value as a published source prints it, for a gas at one state. */
export interface ReferenceRow {
  /** The result that it is compared with, by its name in a file. */
  readonly property: string;
  /** A gas by its formula, or the mole fractions of a mixture. */
  readonly gas: string | Readonly<Record<string, number>>;
  /** The species within a mixture whose result it is; left out, it is of the gas as a whole. */
  readonly of?: string;
  /** K. */
  readonly temperature: number;
  /** Pa. Most properties here do not depend on it. */
  readonly pressure: number;
  /** What the source reckons with instead of our own data. */
  readonly reckonedWith?: Reckoning;
  /** What is printed instead of the result itself. */
  readonly printedAs?: 'reciprocal' | 'cross-coefficient';
  /** Copied as printed, in the unit in which it is printed. Its last digit sets the tolerance. */
  readonly printed: string;
  readonly unit: string;
  readonly source: string;
  /** Table, equation or page, and "from memory" where it could not be looked up. */
  readonly where: string;
  /** Why half a unit of the last digit is not the tolerance. */
  readonly within?: Within;
}

export interface Reckoning {
  /** kg/mol. */
  readonly molarMass?: number;
  /** m. */
  readonly collisionDiameter?: number;
}

/** The error that we state for the result, beside half a unit of the last digit; or a tolerance in the unit printed. */
export type Within = 'stated' | Tolerance;

export interface Tolerance {
  readonly tolerance: number;
  readonly because: string;
}

/** Rows of one sort under one heading. */
export interface Page {
  readonly title: string;
  readonly rows: readonly ReferenceRow[];
}

/** Half a unit of the last printed digit: 5e-9 of `1.781e-5`. */
export function halfUnit(printed: string): number {
  const [mantissa = '', exponent = '0'] = printed.toLowerCase().split('e');
  const decimals = mantissa.includes('.') ? mantissa.length - mantissa.indexOf('.') - 1 : 0;
  return 0.5 * 10 ** (Number(exponent) - decimals);
}

/** Half a unit of the last digit and a share of the value. */
export function rounded(printed: string, relative: number, because: string): Tolerance {
  return { tolerance: halfUnit(printed) + relative * Math.abs(Number(printed)), because };
}

/** A share of the value. */
export function share(printed: string, relative: number, because: string): Tolerance {
  return { tolerance: relative * Math.abs(Number(printed)), because };
}
