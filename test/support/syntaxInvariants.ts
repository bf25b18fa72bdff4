import assert from 'node:assert/strict';
import { children } from '../../server/src/syntax/children';
import type { File, Node, NumberLiteral } from '../../server/src/syntax/nodes';

/** What holds of the tree of every text. */
export function checkTree(file: File): void {
  let end = 0;
  for (const { offset, text, declaration } of file.items) {
    assert.ok(offset >= end, 'declarations do not overlap');
    assert.equal(file.text.slice(offset, offset + text.length), text);
    assertNothing(file.text.slice(end, offset), 'between declarations');
    end = offset + text.length;
    assert.deepEqual(declaration.span, { start: 0, end: text.length });
    checkDeclaration(declaration, text);
  }
  assertNothing(file.text.slice(end), 'after the last declaration');
}

/** Parts lie within their node, in the order of the text; between the leaves lie only marks, white space and comments. */
function checkDeclaration(root: Node, text: string): void {
  let at = 0;
  const visit = (node: Node, from: number, to: number): void => {
    const { start, end } = node.span;
    const within = from <= start && start <= end && end <= to;
    const sound =
      (node.kind !== 'hole' || start === end) &&
      (node.kind !== 'junk' || (node.text !== '' && text.slice(start, end) === node.text));
    if (!within || !sound) assert.fail(`${node.kind} ${start} to ${end} of ${JSON.stringify(text)}`);
    const leaf = leafSpan(node);
    if (leaf) {
      checkMarks(text, at, leaf.start);
      at = Math.max(at, leaf.end);
    }
    let before = start;
    for (const child of children(node)) {
      visit(child, before, end);
      before = child.kind === 'hole' ? before : child.span.end;
    }
  };
  visit(root, 0, text.length);
  checkMarks(text, at, text.length);
}

/** The text that a leaf accounts for: of a number its digits, as the unit is a leaf of its own. */
function leafSpan(node: Node): { start: number; end: number } | undefined {
  switch (node.kind) {
    case 'number':
      return digitsOf(node);
    case 'name':
    case 'unit':
    case 'text':
    case 'junk':
    case 'balance':
      return node.span;
    default:
      return undefined;
  }
}

function digitsOf({ digits }: NumberLiteral): { start: number; end: number } {
  return digits;
}

const SPACE = String.raw`[ \t\u00a0\u202f\ufeff\r\n]`;
const COMMENT = '#[^\\n\\r]*';
/** The marks, and the words that join parts without being parts themselves. */
const MARKS = String.raw`[-=+*/·×−^±<>!≤≥≠→.,:;&(){}[\]]|\b(?:and|or|not|is|in|within|of|between|because|vary|show|log|steps)\b`;
const nothing = new RegExp(`^(?:${SPACE}|${COMMENT})*$`);
const marks = new RegExp(`^(?:${SPACE}|${COMMENT}|${MARKS})*$`);

function assertNothing(text: string, where: string): void {
  if (!nothing.test(text)) assert.fail(`${where} lies ${JSON.stringify(text)}`);
}

function checkMarks(text: string, start: number, end: number): void {
  const between = text.slice(start, Math.max(start, end));
  if (!marks.test(between)) assert.fail(`${JSON.stringify(between)} belongs to nothing in ${JSON.stringify(text)}`);
}
