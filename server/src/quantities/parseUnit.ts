import { superscriptValue } from './superscript';
import type { Unit, UnitPart } from './unit';
import { makeUnit } from './unit';
import { nearestUnits, unitSpelled } from './unitSpellings';

export type { Unit, UnitPart } from './unit';

/** Why a text is no unit. Positions are UTF-16 offsets in the text. */
export type UnitFault =
  | {
      readonly kind: 'unknown';
      readonly name: string;
      readonly start: number;
      readonly end: number;
      readonly nearest: readonly string[];
    }
  | {
      readonly kind: 'offset-in-product' | 'gauge-in-product';
      readonly name: string;
      readonly start: number;
      readonly end: number;
    }
  | { readonly kind: 'malformed'; readonly start: number; readonly end: number };

export type UnitResult = { readonly ok: true; readonly unit: Unit } | { readonly ok: false; readonly fault: UnitFault };

/** Reads a unit, spelling exact: `mbar·L/s`, `W/(m*K)`, `cm2`, `s^-1`. The same text gives the same object. */
export function parseUnit(text: string): UnitResult {
  const known = cache.get(text);
  if (known) return known;
  const result = readUnit(text);
  // A session meets few units; a text that is being fuzzed meets many.
  if (cache.size >= 5000) cache.clear();
  cache.set(text, result);
  return result;
}

/** A unit that our own source spells. */
export function unitOf(text: string): Unit {
  const result = parseUnit(text);
  if (!result.ok) throw new Error(`no unit: ${text}`);
  return result.unit;
}

const cache = new Map<string, UnitResult>();

const longestText = 120;
const deepestNesting = 8;
const highestPower = 24;

const token =
  /(?<name>°?\p{L}[\p{L}\p{M}]*|[°℃℉%])|(?<power>\^\(-?\d+\/\d+\)|\^-?\d+|⁻?[⁰¹²³⁴⁵⁶⁷⁸⁹]+|\d+)|(?<mark>[·*/()])/uy;

interface Token {
  readonly kind: 'name' | 'power' | 'mark' | 'end';
  readonly text: string;
  readonly start: number;
  readonly end: number;
}

/** A factor whose name is not looked up yet. */
interface Factor {
  readonly name: string;
  readonly power: number;
  readonly side: 'above' | 'below';
  readonly start: number;
  readonly end: number;
}

function readUnit(text: string): UnitResult {
  const factors = text.length > longestText ? malformed(0, text.length) : parseFactors(text);
  if (!Array.isArray(factors)) return { ok: false, fault: factors };
  const parts = lookUp(factors);
  if (!Array.isArray(parts)) return { ok: false, fault: parts };
  const unit = makeUnit(parts);
  // A tower of prefixes and powers can leave the range of doubles.
  if (!isUsable(unit)) return { ok: false, fault: malformed(0, text.length) };
  return { ok: true, unit };
}

function isUsable({ factor, scale }: Unit): boolean {
  return [factor, scale.times, scale.over].every((n) => Number.isFinite(n) && n > 0);
}

function lookUp(factors: readonly Factor[]): UnitPart[] | UnitFault {
  const parts: UnitPart[] = [];
  for (const { name, power, side, start, end } of factors) {
    const spelling = unitSpelled(name);
    if (!spelling) return { kind: 'unknown', name, start, end, nearest: nearestUnits(name) };
    const { row, prefix } = spelling;
    const alone = factors.length === 1 && power === 1;
    if (!alone && row.kind === 'offset') return { kind: 'offset-in-product', name, start, end };
    if (!alone && row.kind === 'gauge') return { kind: 'gauge-in-product', name, start, end };
    parts.push({ row, prefix, power, side, start, end });
  }
  return parts;
}

/**
 * product = ('1' | factor) (('·' | '*' | '/') factor)*
 * factor  = (name | '(' product ')') power?
 */
function parseFactors(text: string): Factor[] | UnitFault {
  const tokens = tokenize(text);
  let at = 0;
  const peek = (): Token => tokens[at] ?? { kind: 'end', text: '', start: text.length, end: text.length };
  const take = (what: string): boolean => {
    if (peek().text !== what) return false;
    at++;
    return true;
  };

  const product = (depth: number): Factor[] | undefined => {
    const factors = take('1') ? [] : factor(depth);
    if (!factors) return undefined;
    for (let side = separator(); side; side = separator()) {
      const next = factor(depth);
      if (!next) return undefined;
      factors.push(...(side === 'below' ? next.map(turnedOver) : next));
    }
    return factors;
  };

  const separator = (): Factor['side'] | undefined => {
    if (take('/')) return 'below';
    return take('·') || take('*') ? 'above' : undefined;
  };

  const factor = (depth: number): Factor[] | undefined => {
    const inner = peek().kind === 'name' ? name() : group(depth);
    if (!inner) return undefined;
    const power = exponent();
    return power === undefined ? undefined : inner.map((each) => ({ ...each, power: each.power * power }));
  };

  const name = (): Factor[] => {
    const { text: word, start, end } = peek();
    at++;
    return [{ name: word, power: 1, side: 'above', start, end }];
  };

  const group = (depth: number): Factor[] | undefined => {
    if (depth === 0 || !take('(')) return undefined;
    const inner = product(depth - 1);
    return take(')') ? inner : undefined;
  };

  const exponent = (): number | undefined => {
    if (peek().kind !== 'power') return 1;
    const power = powerValue(peek().text);
    if (power === 0 || !(Math.abs(power) <= highestPower)) return undefined;
    at++;
    return power;
  };

  const factors = product(deepestNesting);
  const { kind, start, end } = peek();
  return factors && kind === 'end' ? factors : malformed(start, end);
}

function turnedOver(factor: Factor): Factor {
  return { ...factor, power: -factor.power, side: factor.side === 'above' ? 'below' : 'above' };
}

/** `^-2`, `^(1/2)`, `⁻²` and the shop's plain `2`. */
function powerValue(text: string): number {
  const fraction = /^\^\((-?\d+)\/(\d+)\)$/.exec(text);
  if (fraction) return Number(fraction[1]) / Number(fraction[2]);
  if (/^[\d^]/.test(text)) return Number(text.replace('^', ''));
  return superscriptValue(text);
}

function tokenize(text: string): Token[] {
  const tokens: Token[] = [];
  let start = 0;
  while (start < text.length) {
    token.lastIndex = start;
    const match = token.exec(text);
    // What is no token stays in the list, so that the parser stops there.
    const found = match?.[0] ?? text.charAt(start);
    const end = start + found.length;
    tokens.push({ kind: tokenKind(match?.groups), text: found, start, end });
    start = end;
  }
  return tokens;
}

function tokenKind(groups: Record<string, string | undefined> | undefined): Token['kind'] {
  if (groups?.['name']) return 'name';
  return groups?.['power'] ? 'power' : 'mark';
}

function malformed(start: number, end: number): UnitFault {
  return { kind: 'malformed', start, end };
}
