import type { Analysis } from '../model/analysis';
import type { Declared } from '../model/declare';
import { functionNamed } from '../model/functions';
import { kindOfWord } from '../model/kinds/list';
import { builtInGas } from '../model/mixture';
import { nominalBore } from '../model/nominalBores';
import type { Declaration, Node } from '../syntax/nodes';
import { takesWord } from './meaning';
import type { Token } from './tokens';
import { tokensOf } from './tokens';

export type SemanticType =
  | 'keyword'
  | 'type'
  | 'variable'
  | 'property'
  | 'number'
  | 'unit'
  | 'string'
  | 'operator'
  | 'function'
  | 'comment'
  | 'gas';

export type SemanticModifier = 'declaration' | 'readonly' | 'defaultLibrary';

export interface SemanticToken {
  readonly start: number;
  readonly length: number;
  readonly type: SemanticType;
  readonly modifiers: readonly SemanticModifier[];
}

export interface SemanticTokenOptions {
  /** Only the tokens of declarations that this touches. */
  readonly range?: { readonly start: number; readonly end: number };
}

/**
 * What each piece of the text is, as far as it is known: the colours are those of the grammar, and names get theirs by what
 * they stand for. Sorted; no token spans lines or overlaps another.
 */
export function semanticTokens(analysis: Analysis, { range }: SemanticTokenOptions = {}): readonly SemanticToken[] {
  const { text } = analysis;
  const found: SemanticToken[] = [];
  let at = 0;
  const between = (to: number) => {
    for (const { index, 0: comment } of text.slice(at, to).matchAll(/#[^\r\n]*/g)) {
      // The grammar tells documentation from remarks; that is left to it.
      if (!comment.startsWith('##')) found.push(semanticToken(at + index, comment.length, 'comment'));
    }
  };
  for (const declared of analysis.declared) {
    const { item } = declared;
    between(item.offset);
    at = item.offset + item.text.length;
    if (range && (item.offset > range.end || at < range.start)) continue;
    for (const token of tokensOf(item.declaration, item.text)) {
      const meant = meaningOf(token, declared, analysis);
      if (meant) found.push(semanticToken(item.offset + token.start, token.end - token.start, ...meant));
    }
  }
  between(text.length);
  return range ? found.filter(({ start, length }) => start <= range.end && start + length >= range.start) : found;
}

function semanticToken(
  start: number,
  length: number,
  type: SemanticType,
  ...modifiers: readonly SemanticModifier[]
): SemanticToken {
  return { start, length, type, modifiers };
}

type Meaning = readonly [SemanticType, ...SemanticModifier[]];

function meaningOf(token: Token, declared: Declared, analysis: Analysis): Meaning | undefined {
  switch (token.kind) {
    case 'comment':
      return token.text.startsWith('##') ? undefined : ['comment'];
    case 'number':
      return ['number'];
    case 'unit':
      return ['unit'];
    case 'text':
      return ['string'];
    case 'balance':
    case 'word':
      return ['keyword'];
    case 'mark':
      return OPERATOR.test(token.text) ? ['operator'] : undefined;
    case 'name':
      return meaningOfName(token, declared, analysis);
    case 'junk':
      return undefined;
  }
}

const OPERATOR = /^(?:->|→|±|\+-|\.\.|[=!<>]=|[≤≥≠<>=]|[-+−*/^·×&])$/u;

function meaningOfName(token: Token, { item, name }: Declared, analysis: Analysis): Meaning | undefined {
  const { declaration } = item;
  const { parent, text } = token;
  const is = (node: Node | undefined) => node?.span.start === token.start && node.span.end === token.end;
  if (is(declaration.word)) return meaningOfWord(declaration);
  if (is(name)) return ['variable', 'declaration'];
  switch (parent.kind) {
    case 'assume':
      return is(parent.name) ? ['property'] : meaningOfReference(text, analysis);
    case 'display-item':
      return ['property'];
    case 'head':
      return is(parent.relation) ? ['keyword'] : meaningOfReference(text, analysis);
    case 'site':
      return is(parent.relation) ? ['keyword'] : meaningOfReference(text, analysis);
    case 'entry':
      if (is(parent.key)) return ['property'];
      // The words of the format are the grammar's.
      return takesWord(declaration, parent) ? undefined : meaningOfReference(text, analysis);
    case 'member':
      if (isConstants(parent.object, analysis)) return ['variable', 'readonly'];
      return is(parent.property) ? meaningOfProperty(text) : meaningOfReference(text, analysis);
    case 'is':
      return is(parent.right) ? ['variable', 'readonly'] : meaningOfReference(text, analysis);
    case 'call':
      if (!is(parent.callee)) return meaningOfReference(text, analysis);
      return functionNamed(text) ? ['function', 'defaultLibrary'] : ['function'];
    default:
      return meaningOfReference(text, analysis);
  }
}

/** A word that opens no declaration yet has the colour of a name. */
function meaningOfWord({ kind, word }: Declaration): Meaning | undefined {
  switch (kind) {
    case 'let':
    case 'use':
    case 'display':
    case 'assume':
    case 'require':
      return ['keyword'];
    case 'gas':
    case 'line':
    case 'site':
      return ['type'];
    case 'thing':
      return kindOfWord(word.text) ? ['type'] : undefined;
    case 'stray':
      return undefined;
  }
}

/** `const.k` is a constant unless a file declares that name. */
function isConstants(object: Node, analysis: Analysis): boolean {
  return object.kind === 'name' && object.text === 'const' && !analysis.find('const');
}

function meaningOfProperty(text: string): Meaning {
  return builtInGas(text) ? ['gas'] : ['property'];
}

/** Nothing is said of a name that stands for nothing. */
function meaningOfReference(text: string, analysis: Analysis): Meaning | undefined {
  const declaration = analysis.find(text)?.declared.item.declaration;
  if (declaration) return isGas(declaration) ? ['gas'] : ['variable'];
  if (builtInGas(text)) return ['gas', 'defaultLibrary'];
  return nominalBore(text) ? ['variable', 'readonly', 'defaultLibrary'] : undefined;
}

function isGas({ kind, word }: Declaration): boolean {
  return kind === 'gas' || word.text === 'species';
}
