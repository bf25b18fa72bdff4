import type { Analysis } from '../model/analysis';
import type { Declared } from '../model/declare';
import { kindOfWord } from '../model/kinds/list';
import type { BlockItem, Declaration, Node, RequireDeclaration, Span } from '../syntax/nodes';
import { showing } from './describe/describe';
import { describeShortly } from './describe/describeShortly';

export type SymbolKind =
  'variable' | 'constant' | 'object' | 'struct' | 'class' | 'module' | 'boolean' | 'file' | 'property' | 'field';

/** A declaration, or an entry of one, as the outline of a file lists it. */
export interface OutlineItem {
  readonly name: string;
  /** Its value in a few figures, or what it is. */
  readonly detail: string;
  readonly kind: SymbolKind;
  readonly start: number;
  readonly end: number;
  /** What is selected when the item is chosen. */
  readonly selectionStart: number;
  readonly selectionEnd: number;
  readonly children: readonly OutlineItem[];
}

export function outline(analysis: Analysis): readonly OutlineItem[] {
  return analysis.declared.flatMap((declared) => {
    const { declaration, offset, text } = declared.item;
    const title = titleOf(declared);
    if (title === undefined || title.name === '') return [];
    const own = { start: offset, end: offset + text.length };
    return [
      {
        name: title.name,
        detail: shortened(detailOf(analysis, declared)),
        kind: symbolKindOf(declaration),
        ...own,
        ...selection(title.span, offset),
        children: entriesOf(declaration, text, offset),
      },
    ];
  });
}

export function symbolKindOf(declaration: Declaration): SymbolKind {
  switch (declaration.kind) {
    case 'let':
      return 'variable';
    case 'assume':
      return 'constant';
    case 'use':
      return 'file';
    case 'display':
    case 'stray':
      return 'property';
    case 'gas':
      return 'class';
    case 'line':
      return 'struct';
    case 'site':
      return 'object';
    case 'require':
      return 'boolean';
    case 'thing':
      return kindOfThing(declaration.word.text);
  }
}

function kindOfThing(word: string): SymbolKind {
  switch (kindOfWord(word)?.role) {
    case 'geometry':
    case 'part':
      return 'struct';
    case 'study':
      return 'module';
    case 'substance':
      return 'class';
    case 'state':
    case 'conduct':
    case undefined:
      return 'object';
  }
}

interface Title {
  readonly name: string;
  readonly span: Span;
}

function titleOf({ item, name }: Declared): Title | undefined {
  const { declaration, text } = item;
  if (name) return { name: name.text, span: name.span };
  switch (declaration.kind) {
    case 'use':
      return declaration.path.kind === 'text' && declaration.path.text !== ''
        ? { name: shortened(declaration.path.text), span: declaration.path.span }
        : wordOf(declaration);
    case 'require':
      return requirementTitle(declaration, text);
    case 'assume':
      return declaration.name.kind === 'name' ? titled(declaration.name, text) : wordOf(declaration);
    case 'stray':
      return undefined;
    default:
      return wordOf(declaration);
  }
}

/** A requirement is known by what it says. */
function requirementTitle(declaration: RequireDeclaration, text: string): Title {
  const { condition } = declaration;
  return condition.kind === 'hole' ? wordOf(declaration) : titled(condition, text);
}

function wordOf({ word }: Declaration): Title {
  return { name: word.text, span: word.span };
}

function titled({ span }: Node, text: string): Title {
  return { name: shortened(text.slice(span.start, span.end)), span };
}

function detailOf(analysis: Analysis, declared: Declared): string {
  const { declaration, text } = declared.item;
  if (declaration.kind === 'display') {
    const [first, last] = [declaration.items[0], declaration.items.at(-1)];
    return first && last ? text.slice(first.span.start, last.span.end) : '';
  }
  const outcome = analysis.outcome(declared);
  if (outcome.kind === 'none') return declaration.word.text;
  if (outcome.kind !== 'value' || outcome.value.kind === 'pending') {
    return declaration.kind === 'require' ? 'not evaluated' : declaration.word.text;
  }
  const value = describeShortly(outcome.value, showing(analysis, declared));
  const word = declaration.kind === 'thing' || declaration.kind === 'site' ? declaration.word.text : '';
  return [word, value].filter((part) => part !== '').join(' · ');
}

function entriesOf(declaration: Declaration, text: string, offset: number): readonly OutlineItem[] {
  if (declaration.kind !== 'thing') return [];
  return (declaration.block?.items ?? []).flatMap((item) => {
    const parts = entryParts(item);
    if (!parts || parts.name.start === parts.name.end) return [];
    const { start, end } = item.span;
    const name = shortened(text.slice(parts.name.start, parts.name.end));
    const detail = parts.value ? shortened(text.slice(parts.value.start, parts.value.end)) : '';
    const own = { start: offset + start, end: offset + end };
    return [{ name, detail, kind: 'field' as const, ...own, ...selection(parts.name, offset), children: [] }];
  });
}

function entryParts(item: BlockItem): { readonly name: Span; readonly value?: Span } | undefined {
  switch (item.kind) {
    case 'entry':
      return { name: item.key.span, value: item.value.span };
    case 'connection':
      return { name: item.route.span };
    case 'vary':
      return { name: item.target.span, value: { start: item.from.span.start, end: item.count.span.end } };
    case 'show': {
      const [first, last] = [item.figures[0], item.figures.at(-1)];
      return first && last && { name: { start: first.span.start, end: last.span.end } };
    }
    case 'junk':
      return undefined;
  }
}

function selection({ start, end }: Span, offset: number): { selectionStart: number; selectionEnd: number } {
  return { selectionStart: offset + start, selectionEnd: offset + end };
}

const LONGEST = 60;

/** On one line, and no longer than a side bar shows. */
function shortened(text: string): string {
  const line = text
    .replaceAll(/#[^\r\n]*/g, '')
    .replaceAll(/\s+/g, ' ')
    .trim();
  return line.length > LONGEST ? `${line.slice(0, LONGEST - 1).trimEnd()}…` : line;
}
