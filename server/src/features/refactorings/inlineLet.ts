import type { Analysis } from '../../model/analysis';
import { offsetLiteral } from '../../model/literal';
import { references } from '../../model/references';
import type { Expression, LetDeclaration, Node, Span } from '../../syntax/nodes';
import { contains } from './contains';
import { selectionAt } from './selection';
import type { Refactoring } from './refactoring';

/** Writes the value of a `let` in the place of its name, in parentheses where it would be read otherwise. */
export function inlineLet(analysis: Analysis, range: Span): readonly Refactoring[] {
  const selection = selectionAt(analysis, range);
  const node = selection?.path.at(-1);
  const parent = selection?.path.at(-2);
  if (!selection || node?.kind !== 'name' || !parent) return [];
  if (!references(selection.declared.item.declaration).includes(node)) return [];
  const place = analysis.find(node.text);
  const declaration = place?.declared.item.declaration;
  if (!place || declaration?.kind !== 'let' || declaration.rest || !isSound(declaration.value)) return [];
  if (!seesTheSame(analysis, declaration, place.document.uri)) return [];
  const { value } = declaration;
  const level = levelWanted(node, parent);
  if (level === undefined || (offsetLiteral(value) && changesScale(parent))) return [];
  if (level === 'path' && value.kind !== 'name' && value.kind !== 'member') return [];
  const { text } = place.declared.item;
  const written = text.slice(value.span.start, value.span.end);
  const bare = level === 'path' || levelOf(value) >= level;
  const { offset } = selection.declared.item;
  return [
    {
      title: titleFor(node.text, value, analysis),
      edits: [{ start: offset + node.span.start, end: offset + node.span.end, text: bare ? written : `(${written})` }],
    },
  ];
}

/** How tightly an expression holds together; the levels of the grammar, from loosest to tightest. */
const LEVEL = {
  any: 0,
  or: 1,
  and: 2,
  not: 3,
  relation: 4,
  operand: 5,
  sum: 6,
  product: 7,
  signed: 8,
  toleranced: 9,
  power: 10,
  closed: 11,
};

function levelOf(node: Expression): number {
  switch (node.kind) {
    case 'logic':
      return LEVEL[node.operator];
    case 'comparison':
    case 'is':
    case 'within':
    case 'between':
      return LEVEL.relation;
    case 'conversion':
      return LEVEL.operand;
    case 'arithmetic':
      if (node.operator === '^') return LEVEL.power;
      return node.operator === '+' || node.operator === '-' ? LEVEL.sum : LEVEL.product;
    case 'unary':
      return node.operator === 'not' ? LEVEL.not : LEVEL.signed;
    case 'tolerance':
      return LEVEL.toleranced;
    case 'number':
      // Before a power or a unit a number would be read with it.
      return LEVEL.power;
    default:
      return LEVEL.closed;
  }
}

/** What a place takes without parentheses; nothing where no expression may stand. */
function levelWanted(node: Node, parent: Node): number | 'path' | undefined {
  switch (parent.kind) {
    case 'entry':
    case 'let':
    case 'assume':
    case 'require':
    case 'show':
    case 'group':
    case 'call':
      return parent.kind === 'call' && node === parent.callee ? undefined : LEVEL.any;
    case 'logic':
      return LEVEL[parent.operator] + (node === parent.right ? 1 : 0);
    case 'comparison':
    case 'is':
    case 'within':
    case 'between':
    case 'row':
      return LEVEL.operand;
    case 'conversion':
      return LEVEL.closed;
    case 'vary':
      return node === parent.target ? undefined : LEVEL.sum;
    case 'unary':
      return parent.operator === 'not' ? LEVEL.not : LEVEL.signed;
    case 'arithmetic':
      if (parent.operator === '^') return node === parent.left ? LEVEL.closed : LEVEL.power;
      return (
        (parent.operator === '+' || parent.operator === '-' ? LEVEL.sum : LEVEL.product) +
        (node === parent.right ? 1 : 0)
      );
    case 'tolerance':
      return LEVEL.power;
    case 'part':
      return node === parent.name ? undefined : LEVEL.toleranced;
    case 'member':
    case 'site':
      return 'path';
    default:
      return undefined;
  }
}

/** A temperature in °C is a point by itself, but a difference or in doubt in a sum. */
function changesScale({ kind }: Node): boolean {
  return kind === 'arithmetic' || kind === 'unary';
}

/** The names in the value must mean the same here as where it is declared. */
function seesTheSame(analysis: Analysis, declaration: LetDeclaration, uri: string): boolean {
  return uri === analysis.uri || references(declaration).every(({ text }) => analysis.find(text)?.document.uri === uri);
}

/** A tolerance that is written twice counts twice, as two causes. */
function titleFor(name: string, value: Expression, { declared }: Analysis): string {
  const uses = declared.flatMap(({ item }) => references(item.declaration).filter(({ text }) => text === name));
  const shared = uses.length > 1 && contains(value, ({ kind }) => kind === 'tolerance');
  return shared ? `Inline ${name}, its tolerance independent here` : `Inline ${name}`;
}

function isSound(value: Node): boolean {
  return !contains(value, ({ kind }) => kind === 'hole' || kind === 'junk');
}
