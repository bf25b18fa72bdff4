import { nearestNames } from './nearestNames';
import type { Prefix } from './prefixes';
import { prefixes } from './prefixes';
import type { UnitRow } from './units';
import { units } from './units';

/** What one spelling of a unit, its prefix included, stands for. */
export interface UnitSpelling {
  readonly text: string;
  /** The canonical spelling. */
  readonly canonical: string;
  readonly row: UnitRow;
  readonly prefix: Prefix | undefined;
}

/** Every spelling of every row with every prefix it takes. A test proves that no two are the same. */
export const allSpellings: readonly UnitSpelling[] = units.flatMap(spellingsOfRow);

const byText = new Map(allSpellings.map((spelling) => [spelling.text, spelling]));

export function unitSpelled(text: string): UnitSpelling | undefined {
  return byText.get(text);
}

/** The spellings that an unknown unit name most likely meant. */
export function nearestUnits(name: string, most = 3): readonly string[] {
  const rows = units.filter((row) => row.words.includes(name)).map((row) => row.symbol);
  const meant = [...(shopWords.get(name.toLowerCase()) ?? []), ...rows];
  if (meant.length > 0) return meant.slice(0, most);
  // Twice as many, since two spellings of one unit may be among them.
  const near = nearestNames(name, suggestions, 2 * most).map((text) => unitSpelled(text)?.canonical ?? text);
  return [...new Set(near)].slice(0, most);
}

/** Words that mean a prefixed or a composed unit. A micron may be a length or a pressure. */
const shopWords = new Map<string, readonly string[]>([
  ['micron', ['µm', 'mTorr']],
  ['microns', ['µm', 'mTorr']],
  ['millibar', ['mbar']],
  ['millibars', ['mbar']],
  ['mb', ['mbar']],
  ['millitorr', ['mTorr']],
  ['cfm', ['ft³/min']],
  ['lpm', ['L/min', 'slm']],
  ['lps', ['L/s']],
  ['cmh', ['m³/h']],
  ['mbarl', ['mbar·L']],
  ['torrl', ['Torr·L']],
]);

const commonPrefixes = new Set(['n', 'µ', 'm', 'c', 'k', 'M', 'G']);

/** Units without prefix first, then those with a prefix in common use; nobody mistypes a ronnalux. */
const suggestions: readonly string[] = [
  ...allSpellings.filter((spelling) => !spelling.prefix),
  ...allSpellings.filter((spelling) => spelling.prefix && commonPrefixes.has(spelling.prefix.symbol)),
].map((spelling) => spelling.text);

function spellingsOfRow(row: UnitRow): UnitSpelling[] {
  return [undefined, ...allowedPrefixes(row)].flatMap((prefix) => {
    const canonical = (prefix?.symbol ?? '') + row.symbol;
    const starts = prefix ? [prefix.symbol, ...prefix.aliases] : [''];
    const ends = [row.symbol, ...row.aliases];
    return starts.flatMap((start) => ends.map((end) => ({ text: start + end, canonical, row, prefix })));
  });
}

function allowedPrefixes({ prefixes: allowed }: UnitRow): readonly Prefix[] {
  if (allowed === 'all') return prefixes;
  return allowed === 'none' ? [] : prefixes.filter(({ symbol }) => allowed.includes(symbol));
}
