import { syntaxProblems } from '../../model/syntaxProblems';
import { walk } from '../../syntax/children';
import type { Declaration, File, Item, NumberLiteral } from '../../syntax/nodes';
import { parse } from '../../syntax/parse';
import { layOut } from './formatLayout';
import { canonicalUnit } from './formatSpacing';
import type { TextEdit } from '../textEdit';
import { applyEdits } from '../textEdit';
import { tokensOf } from '../tokens';

export interface FormatOptions {
  /** Only the lines that this touches. */
  readonly range?: { readonly start: number; readonly end: number };
  /** The tree of the text, where it is at hand. */
  readonly file?: File;
}

/**
 * The smallest changes that bring a text into its usual form. They change white space, the spelling of units and `+-`,
 * and nothing else; a declaration with an error in its syntax is left as it is.
 */
export function format(text: string, { range, file = parse(text) }: FormatOptions = {}): readonly TextEdit[] {
  // A carriage return alone ends a line for editors but not for the format.
  if (/\r(?!\n)/.test(text)) return [];
  const wanted = wholeLines(text, range);
  const kept = new Set(file.items.filter(({ declaration, text: own }) => !isWhole(declaration, own)));
  for (;;) {
    const edits = layOut(file, kept).filter(({ start, end }) => start >= wanted.start && end <= wanted.end);
    // Whatever the rules overlook, a declaration never changes its meaning: then it rather stays as it is.
    const changed = editsByItem(file.items, edits).flatMap(([item, own]) => (meansTheSame(item, own) ? [] : [item]));
    if (changed.length === 0) return edits;
    for (const item of changed) kept.add(item);
  }
}

function wholeLines(text: string, range: FormatOptions['range']): { start: number; end: number } {
  if (!range) return { start: 0, end: text.length };
  const start = range.start === 0 ? 0 : text.lastIndexOf('\n', range.start - 1) + 1;
  const end = text.indexOf('\n', range.end);
  return { start, end: end < 0 ? text.length : end };
}

/** Nothing is missing, nothing is left over, and every bracket has its partner. */
function isWhole(declaration: Declaration, text: string): boolean {
  if (declaration.kind === 'stray' || syntaxProblems(declaration).length > 0) return false;
  const numbers: NumberLiteral[] = [];
  walk(declaration, (node) => {
    if (node.kind === 'number') numbers.push(node);
  });
  return !numbers.some(({ comma }) => comma) && bracketsMatch(declaration, text);
}

function bracketsMatch(declaration: Declaration, text: string): boolean {
  const open: string[] = [];
  const partner: Readonly<Record<string, string>> = { ')': '(', ']': '[', '}': '{' };
  for (const token of tokensOf(declaration, text)) {
    if (token.kind !== 'mark') continue;
    if ('([{'.includes(token.text)) open.push(token.text);
    else if (token.text in partner && open.pop() !== partner[token.text]) return false;
  }
  return open.length === 0;
}

/** The items that are changed, with the edits inside each; what only moves is not changed. */
function editsByItem(items: readonly Item[], edits: readonly TextEdit[]): readonly [Item, readonly TextEdit[]][] {
  let next = 0;
  return items.flatMap((item) => {
    const own: TextEdit[] = [];
    const end = item.offset + item.text.length;
    for (let edit = edits[next]; edit && edit.start < end; edit = edits[(next += 1)]) {
      if (edit.end > item.offset && edit.start >= item.offset) own.push(edit);
    }
    return own.length > 0 ? [[item, own] as [Item, readonly TextEdit[]]] : [];
  });
}

function meansTheSame({ offset, text, declaration }: Item, edits: readonly TextEdit[]): boolean {
  const [only, another] = parse(applyEdits(text, edits, offset)).items;
  return only !== undefined && !another && shape(only.declaration) === shape(declaration);
}

/** A tree without its places, units in their usual spelling. */
function shape(declaration: Declaration): string {
  return JSON.stringify(declaration, (key, value: unknown) => {
    if (key === 'span' || key === 'digits') return undefined;
    return isUnit(value) ? { kind: 'unit', text: canonicalUnit(value.text) } : value;
  });
}

function isUnit(value: unknown): value is { kind: 'unit'; text: string } {
  return typeof value === 'object' && value !== null && 'kind' in value && value.kind === 'unit';
}
