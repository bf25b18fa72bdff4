import type { Ratio } from './ratio';
import { ratio } from './ratio';

/** A decimal prefix of the SI. */
export interface Prefix {
  readonly symbol: string;
  /** Other spellings read as the same prefix. */
  readonly aliases: readonly string[];
  readonly name: string;
  readonly factor: Ratio;
}

/** SI Brochure, 9th edition (version 2.01, 2022), table 7; the last four by CGPM 2022, resolution 3. */
export const prefixes: readonly Prefix[] = [
  prefix('da', 'deca', '1e1'),
  prefix('h', 'hecto', '1e2'),
  prefix('k', 'kilo', '1e3'),
  prefix('M', 'mega', '1e6'),
  prefix('G', 'giga', '1e9'),
  prefix('T', 'tera', '1e12'),
  prefix('P', 'peta', '1e15'),
  prefix('E', 'exa', '1e18'),
  prefix('Z', 'zetta', '1e21'),
  prefix('Y', 'yotta', '1e24'),
  prefix('R', 'ronna', '1e27'),
  prefix('Q', 'quetta', '1e30'),
  prefix('d', 'deci', '1e-1'),
  prefix('c', 'centi', '1e-2'),
  prefix('m', 'milli', '1e-3'),
  // U+00B5 is what keyboards type; U+03BC is what some documents hold; u is the ASCII spelling.
  prefix('\u00B5', 'micro', '1e-6', ['\u03BC', 'u']),
  prefix('n', 'nano', '1e-9'),
  prefix('p', 'pico', '1e-12'),
  prefix('f', 'femto', '1e-15'),
  prefix('a', 'atto', '1e-18'),
  prefix('z', 'zepto', '1e-21'),
  prefix('y', 'yocto', '1e-24'),
  prefix('r', 'ronto', '1e-27'),
  prefix('q', 'quecto', '1e-30'),
];

function prefix(symbol: string, name: string, factor: string, aliases: readonly string[] = []): Prefix {
  return { symbol, aliases, name, factor: ratio(factor) };
}
