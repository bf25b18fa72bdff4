import type { Span } from './nodes';

/** The stretch of text that one declaration occupies, without comments around it. */
export interface Stretch extends Span {
  /** The `##` lines directly above, joined, without their marks. */
  readonly doc?: string;
}

/**
 * Splits a file into declarations by a scan that knows comments, strings and brackets but no grammar.
 * A declaration ends with its line, or with its brackets when some are open; a line that clearly opens another one
 * ends it too, so that a missing brace does not cost the next declaration.
 */
export function split(text: string): readonly Stretch[] {
  const stretches: Stretch[] = [];
  let docs: string[] = [];
  let open: { start: number; end: number; doc?: string } | undefined;
  let depth = 0;

  const close = () => {
    if (open) stretches.push(open);
    open = undefined;
    depth = 0;
  };

  for (let start = 0; start < text.length;) {
    const end = lineEnd(text, start);
    let at = skipSpace(text, start, end);
    if (at === end) {
      docs = [];
    } else if (text[at] === '#') {
      const doc = text[at + 1] === '#' && depth === 0;
      if (doc) docs.push(text.slice(at + 2, end).trim());
      else docs = [];
      if (doc) close();
    } else if (open && (depth > 0 ? opensDeclaration(text, at, end) : !continues(text, at))) {
      close();
    }

    while (at < end && text[at] !== '#') {
      open ??= { start: at, end: at, ...(docs.length > 0 ? { doc: docs.join('\n') } : {}) };
      docs = [];
      const code = text[at];
      at = code === '"' ? stringEnd(text, at, end) : at + 1;
      open.end = at;
      if (code === '{' || code === '(' || code === '[') depth += 1;
      else if (code === '}' || code === ')' || code === ']') depth = Math.max(0, depth - 1);
      if (code === '}' && depth === 0) close();
      at = skipSpace(text, at, end);
    }
    start = end + 1;
  }
  close();
  return stretches;
}

const NAME = String.raw`[\p{L}_][\p{L}\p{N}_]*`;
const OPENS_DECLARATION = new RegExp(
  [
    String.raw`(?:let|gas|line|site|assume)\s+${NAME}\s*=`,
    String.raw`use\s*"`,
    String.raw`display\s+${NAME}\s+in\s`,
    String.raw`(?:require|prefer)\s+\S`,
    String.raw`${NAME}\s+${NAME}\s*(?:\{|(?:of|from|through|across)\s)`,
  ].join('|'),
  'uy',
);

function opensDeclaration(text: string, at: number, end: number): boolean {
  OPENS_DECLARATION.lastIndex = at;
  const match = OPENS_DECLARATION.exec(text);
  return match !== null && OPENS_DECLARATION.lastIndex <= end;
}

/** A block may open, and a reason may stand, on a line of its own. */
const CONTINUES = /\{|because(?![\p{L}\p{N}_])/uy;

function continues(text: string, at: number): boolean {
  CONTINUES.lastIndex = at;
  return CONTINUES.test(text);
}

function lineEnd(text: string, from: number): number {
  const end = text.indexOf('\n', from);
  return end < 0 ? text.length : end;
}

function skipSpace(text: string, from: number, end: number): number {
  let at = from;
  while (at < end && isSpace(text.charCodeAt(at))) at += 1;
  return at;
}

function isSpace(code: number): boolean {
  return code === 0x20 || code === 0x09 || code === 0x0d || code === 0xa0 || code === 0x202f || code === 0xfeff;
}

function stringEnd(text: string, from: number, end: number): number {
  const close = text.indexOf('"', from + 1);
  return close < 0 || close >= end ? end : close + 1;
}
