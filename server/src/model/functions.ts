import { dimensionless, powerDimension } from '../quantities/dimension';
import { map } from './arithmetic';
import { plainNumber, quantity } from './quantity';
import type { Gas, Quantity } from './values';
import { vapourPressure } from './vapourPressure';

/** A function of the expression language. */
export type FunctionDefinition = QuantityFunction | GasFunction;

interface Described {
  readonly name: string;
  readonly usage: string;
  readonly meaning: string;
  /** The least and the greatest number of arguments. */
  readonly arity: readonly [number, number];
}

export interface QuantityFunction extends Described {
  /** Whether the arguments are plain numbers (exp), of one dimension (max), or of any (sqrt). */
  readonly takes: 'number' | 'alike' | 'any';
  /** Undefined where the function has no value. */
  compute(first: Quantity, ...rest: readonly Quantity[]): Quantity | undefined;
}

/** A property of a gas at one temperature. */
export interface GasFunction extends Described {
  readonly takes: 'gas';
  readonly quantityKind: string;
  /** The value, or why there is none. */
  compute(gas: Gas, temperature: Quantity): Quantity | string;
}

export const functions: readonly FunctionDefinition[] = [
  {
    name: 'sqrt',
    usage: 'sqrt(x)',
    meaning: 'the square root; its unit is the root of the unit',
    arity: [1, 1],
    takes: 'any',
    compute: (x) => {
      const root = Math.sqrt(x.si);
      return x.si < 0 ? undefined : map(x, root, x.si === 0 ? 0 : 0.5 / root, powerDimension(x.dimension, 0.5));
    },
  },
  ofNumber('exp', 'the exponential function', Math.exp, Math.exp),
  ofNumber(
    'ln',
    'the natural logarithm',
    Math.log,
    (x) => 1 / x,
    (x) => x > 0,
  ),
  ofNumber(
    'log10',
    'the logarithm to base ten',
    Math.log10,
    (x) => 1 / (x * Math.LN10),
    (x) => x > 0,
  ),
  ofNumber('sin', 'the sine of an angle', Math.sin, Math.cos),
  ofNumber('cos', 'the cosine of an angle', Math.cos, (x) => -Math.sin(x)),
  ofNumber('tan', 'the tangent of an angle', Math.tan, (x) => 1 / Math.cos(x) ** 2),
  {
    name: 'abs',
    usage: 'abs(x)',
    meaning: 'the size without the sign',
    arity: [1, 1],
    takes: 'any',
    // At zero either direction leads away from it.
    compute: (x) => map(x, Math.abs(x.si), x.si < 0 ? -1 : 1),
  },
  {
    name: 'min',
    usage: 'min(a, b, …)',
    meaning: 'the least of several',
    arity: [1, Infinity],
    takes: 'alike',
    compute: (first, ...rest) => rest.reduce((least, next) => (next.si < least.si ? next : least), first),
  },
  {
    name: 'max',
    usage: 'max(a, b, …)',
    meaning: 'the greatest of several',
    arity: [1, Infinity],
    takes: 'alike',
    compute: (first, ...rest) => rest.reduce((greatest, next) => (next.si > greatest.si ? next : greatest), first),
  },
  {
    name: 'round',
    usage: 'round(x, step)',
    meaning: 'the nearest multiple of a step; without a step, of 1. What is rounded has no tolerance',
    arity: [1, 2],
    takes: 'alike',
    compute: (x, step = x.dimension === dimensionless ? plainNumber(1) : undefined) => {
      if (!step || step.si === 0) return undefined;
      const rounded = quantity(Math.round(x.si / step.si) * step.si, x.dimension);
      return x.unit ? { ...rounded, unit: x.unit } : rounded;
    },
  },
  {
    name: 'vapour_pressure',
    usage: 'vapour_pressure(gas, temperature)',
    meaning:
      'the saturation pressure of a gas over its liquid or solid; by a relative humidity or at a dew point, that of a vapour',
    arity: [2, 2],
    takes: 'gas',
    quantityKind: 'pressure',
    compute: vapourPressure,
  },
];

export function functionNamed(name: string): FunctionDefinition | undefined {
  return functions.find((each) => each.name === name);
}

function ofNumber(
  name: string,
  meaning: string,
  value: (x: number) => number,
  derivative: (x: number) => number,
  defined: (x: number) => boolean = () => true,
): QuantityFunction {
  return {
    name,
    usage: `${name}(x)`,
    meaning,
    arity: [1, 1],
    takes: 'number',
    compute: (x) => {
      const { unit: _unit, ...plain } = x;
      return defined(x.si) ? map(plain, value(x.si), derivative(x.si)) : undefined;
    },
  };
}
