import type { Position, Range } from 'vscode-languageserver';
import type { TextDocument } from 'vscode-languageserver-textdocument';

/** A stretch of a text in UTF-16 units. Lines and characters exist in this folder only. */
export interface Stretch {
  readonly start: number;
  readonly end: number;
}

export function toRange(document: TextDocument, { start, end }: Stretch): Range {
  return { start: document.positionAt(start), end: document.positionAt(end) };
}

export function toStretch(document: TextDocument, { start, end }: Range): Stretch {
  return { start: document.offsetAt(start), end: document.offsetAt(end) };
}

export function toOffset(document: TextDocument, position: Position): number {
  return document.offsetAt(position);
}
