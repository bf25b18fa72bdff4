import { parseUnit } from '../../quantities/parseUnit';
import type { Declaration, Entry } from '../../syntax/nodes';
import type { Token } from '../tokens';

/** A token as it is to be written. The spelling of numbers and names is the author's own. */
export function tokenText(token: Token): string {
  if (token.kind === 'unit') return canonicalUnit(token.text);
  if (token.kind === 'comment') return token.text.trimEnd();
  return token.text === '+-' && token.parent.kind === 'tolerance' ? '±' : token.text;
}

export function canonicalUnit(text: string): string {
  const parsed = parseUnit(text);
  return parsed.ok ? parsed.unit.text : text;
}

/** What stands between two tokens of one line. */
export function spaceBetween(before: Token, after: Token): string {
  if (after.kind === 'comment') return '  ';
  if (before.kind === 'number' && after.kind === 'unit') return tokenText(after) === '°' ? '' : ' ';
  return isTight(before, after) ? '' : ' ';
}

function isTight(before: Token, after: Token): boolean {
  if (isMark(before, '([') || isMark(after, ')],;:')) return true;
  if (isMark(before, '{') && isMark(after, '}')) return true;
  if (isMark(before, '.') || isMark(after, '.')) return true;
  if (isMark(after, '(') && after.parent.kind === 'call') return true;
  if (isSign(before)) return !(before.text === '+' && after.text === '-');
  return isTightPower(before) || isTightPower(after);
}

function isMark(token: Token, marks: string): boolean {
  return token.kind === 'mark' && marks.includes(token.text);
}

/** The sign of a number, not a sum. */
function isSign({ kind, parent }: Token): boolean {
  return kind === 'mark' && parent.kind === 'unary';
}

/** `d^2`, but `5 mm ^ 2`: tight, the power would be the unit's own. */
function isTightPower({ kind, text, parent }: Token): boolean {
  if (kind !== 'mark' || text !== '^' || parent.kind !== 'arithmetic') return false;
  return !(parent.left.kind === 'number' && parent.left.unit);
}

/**
 * The space before the `=` of the entries whose `=` stand in one column, by the place of the `=`. It is kept where all
 * entries of the block agree, each on a line of its own.
 */
export function alignedEquals(
  declaration: Declaration,
  text: string,
  tokens: readonly Token[],
): ReadonlyMap<number, string> {
  if (declaration.kind !== 'thing' || !declaration.block) return new Map();
  const entries = declaration.block.items.filter((item) => item.kind === 'entry');
  const equals = entries.flatMap((entry) => tokens.find(({ text, parent }) => parent === entry && text === '=') ?? []);
  if (entries.length < 2 || equals.length < entries.length) return new Map();
  if (!entries.every((entry) => opensItsLine(entry, text))) return new Map();
  const places = equals.map(({ start }, index) => start - (entries[index]?.key.span.start ?? start));
  const columns = equals.map(({ start }) => start - text.lastIndexOf('\n', start));
  if (!allEqual(places) && !allEqual(columns)) return new Map();
  const longest = Math.max(...entries.map(({ key }) => key.text.length));
  const place = Math.max(longest + 1, Math.min(...places));
  return new Map(
    equals.map(({ start }, index) => [start, ' '.repeat(place - (entries[index]?.key.text.length ?? 0))] as const),
  );
}

function opensItsLine({ span }: Entry, text: string): boolean {
  return text.slice(text.lastIndexOf('\n', span.start - 1) + 1, span.start).trim() === '';
}

function allEqual(numbers: readonly number[]): boolean {
  return numbers.every((number) => number === numbers[0]);
}
