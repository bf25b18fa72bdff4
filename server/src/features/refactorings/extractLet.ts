import type { Analysis } from '../../model/analysis';
import { functionNamed } from '../../model/functions';
import { gasNames } from '../../model/mixture';
import type { Expression, Node, Span } from '../../syntax/nodes';
import { contains } from './contains';
import { declarationStart } from './declarationStart';
import { isExpression } from './isExpression';
import { selectionAt } from './selection';
import type { Refactoring } from './refactoring';

/** Gives an expression of an entry or a condition a name of its own, with a `let` above the declaration. */
export function extractLet(analysis: Analysis, range: Span): readonly Refactoring[] {
  const selection = selectionAt(analysis, range);
  if (!selection) return [];
  const path = wholePath(selection.path);
  const node = path.at(-1);
  if (!node || !isExtractable(node, path)) return [];
  const { item } = selection.declared;
  const { text } = analysis;
  const name = freeName(nameFor(node, path), analysis, selection.declared.name?.text);
  const at = declarationStart(text, item);
  const lineEnd = text.includes('\r\n') ? '\r\n' : '\n';
  const indent = at === item.offset ? '' : (/^[ \t]*/.exec(text.slice(at))?.[0] ?? '');
  const [start, end] = [item.offset + node.span.start, item.offset + node.span.end];
  return [
    {
      title: `Extract to let ${name}`,
      edits: [
        { start: at, end: at, text: `${indent}let ${name} = ${onItsOwn(node, text.slice(start, end))}${lineEnd}` },
        { start, end, text: name },
      ],
    },
  ];
}

/** A number is taken with its sign and its tolerance: by itself it would mean something else. */
function wholePath(path: readonly Node[]): readonly Node[] {
  const node = path.at(-1);
  const parent = path.at(-2);
  const part =
    node?.kind === 'unit' ||
    parent?.kind === 'tolerance' ||
    (parent?.kind === 'unary' && (node?.kind === 'number' || node?.kind === 'tolerance'));
  return part && parent ? wholePath(path.slice(0, -1)) : path;
}

function isExtractable(node: Node, path: readonly Node[]): node is Expression {
  const [declaration] = path;
  if (!declaration || !isExpression(node) || !VALUES.has(node.kind) || !isSound(node)) return false;
  if ((declaration.kind === 'let' && node === declaration.value) || path.some(({ kind }) => kind === 'mixture'))
    return false;
  const parent = path.at(-2);
  // What is added to a temperature in °C, and where a member begins, must stay literal.
  if (parent?.kind === 'arithmetic' && hasOffsetUnit(node)) return false;
  if (parent?.kind === 'member') return false;
  return (
    declaration.kind === 'require' ||
    declaration.kind === 'let' ||
    path.some((each) => each.kind === 'entry' && isBelow(each.value, node))
  );
}

const VALUES: ReadonlySet<string> = new Set<Expression['kind']>([
  'number',
  'member',
  'call',
  'group',
  'unary',
  'arithmetic',
  'tolerance',
  'conversion',
  'table',
]);

function isSound(node: Node): boolean {
  const broken = contains(node, ({ kind }) => kind === 'hole' || kind === 'junk');
  return !broken && !(node.kind === 'unary' && node.operator === 'not');
}

function hasOffsetUnit(node: Expression): boolean {
  return contains(node, (each) => each.kind === 'unit' && /^(?:°|deg)[CF]$/.test(each.text));
}

function isBelow({ span }: Node, node: Node): boolean {
  return span.start <= node.span.start && node.span.end <= span.end;
}

/** After the key, after the path, or after what the value is compared with. */
function nameFor(node: Expression, path: readonly Node[]): string {
  if (node.kind === 'member') return memberName(node);
  const entry = path.find((each) => each.kind === 'entry');
  if (entry?.kind === 'entry') return entry.key.text;
  const around = [...path].reverse().find((each) => each.kind === 'comparison');
  const other = around?.kind === 'comparison' ? (isBelow(around.left, node) ? around.right : around.left) : undefined;
  return other?.kind === 'member' && other.property.kind === 'name' ? `${other.property.text}_limit` : 'value';
}

function memberName(node: Expression): string {
  if (node.kind === 'name') return node.text;
  return node.kind === 'member' && node.property.kind === 'name'
    ? `${memberName(node.object)}_${node.property.text}`
    : 'value';
}

/** A name that nothing has yet: with the declaration's own name before it, then with a number after it. */
function freeName(wish: string, analysis: Analysis, owner: string | undefined): string {
  const taken = (name: string) =>
    RESERVED.has(name) || functionNamed(name) !== undefined || gasNames.includes(name) || !!analysis.find(name);
  if (!taken(wish)) return wish;
  const longer = owner === undefined ? wish : `${owner}_${wish}`;
  if (!taken(longer)) return longer;
  for (let count = 2; ; count += 1) if (!taken(`${longer}_${count}`)) return `${longer}_${count}`;
}

/** Words that the syntax knows and that would mislead as names. */
const RESERVED: ReadonlySet<string> = new Set(
  'let use display assume gas line site require prefer of from through across in around and or not is within between because const balance vary show log steps'.split(
    ' ',
  ),
);

/** On a line of its own an expression must not break off at a line end. */
function onItsOwn({ kind }: Expression, text: string): string {
  const closed = kind === 'group' || kind === 'table';
  return text.includes('\n') && !closed ? `(${text})` : text;
}
