import type { Analysis } from '../../model/analysis';
import type { Name, Node, Span } from '../../syntax/nodes';
import { itemAt, pathAt } from '../../syntax/locate';
import { showing } from '../describe/describe';
import { hoverDeclaration } from './hoverDeclaration';
import { hoverKey } from './hoverKey';
import { hoverName } from './hoverName';
import { hoverNumber } from './hoverNumber';
import type { HoverPlace } from './hoverPlace';
import { hoverProperty } from './hoverProperty';
import { hoverRequirement } from './hoverRequirement';
import { hoverUnit } from './hoverUnit';
import { hoverCondition, hoverDisplayKind, hoverFunction, hoverRelation, hoverWord, meaningOf } from './hoverWord';

export interface HoverSettings {
  /** `brief` is the table of a declaration without what stands behind it. */
  readonly detail: 'brief' | 'full';
}

export interface Hover {
  readonly start: number;
  readonly end: number;
  readonly markdown: string;
}

/** What there is to know of the token at an offset; nothing where there is no token that means something. */
export function hover(analysis: Analysis, offset: number, { detail }: HoverSettings): Hover | undefined {
  const item = itemAt(analysis.file, offset);
  const declared = item && analysis.declared.find((each) => each.item === item);
  if (!declared) return undefined;
  const path = pathAt(item.declaration, offset - item.offset);
  const place = {
    analysis,
    declared,
    path,
    detail,
    scope: analysis.scope(declared),
    options: showing(analysis, declared),
  };
  const found = tokenHover(place) ?? conditionHover(place);
  if (!found || found.markdown === '') return undefined;
  return { start: item.offset + found.span.start, end: item.offset + found.span.end, markdown: found.markdown };
}

interface Found {
  readonly span: Span;
  readonly markdown: string;
}

function tokenHover(place: HoverPlace): Found | undefined {
  const node = place.path.at(-1);
  const found = (span: Span, markdown: string | undefined) => (markdown === undefined ? undefined : { span, markdown });
  switch (node?.kind) {
    case 'name':
      return found(node.span, nameHover(node, place));
    case 'unit':
      return found(node.span, hoverUnit(node, place));
    case 'number':
      return found(node.digits, hoverNumber(node, place));
    case 'balance':
      return found(node.span, meaningOf('balance', 'what the other parts leave of the whole'));
    default:
      return undefined;
  }
}

/** What a name is depends on what it stands in. */
function nameHover(node: Name, place: HoverPlace): string | undefined {
  const parent = place.path.at(-2);
  switch (parent?.kind) {
    case 'member':
      return node === parent.property ? hoverProperty(parent, node, place) : hoverName(node, place);
    case 'call':
      return node === parent.callee ? hoverFunction(node) : hoverName(node, place);
    case 'entry':
      return node === parent.key ? hoverKey(node, place) : hoverName(node, place);
    case 'head':
      return node === parent.relation ? hoverRelation(node) : hoverName(node, place);
    case 'display-item':
      return hoverDisplayKind(node);
    case 'use':
    case 'display':
    case 'stray':
      return hoverWord(node);
    case 'assume':
      if (node === parent.word) return hoverWord(node);
      return node === parent.name ? hoverCondition(node, place) : hoverName(node, place);
    case 'require':
      return node === parent.word ? hoverRequirement(parent, place) : hoverName(node, place);
    case 'site':
      if (node === parent.relation) return hoverRelation(node);
      return node === parent.word || node === parent.name ? hoverDeclaration(place) : hoverName(node, place);
    case 'let':
    case 'gas':
    case 'line':
    case 'thing':
      return node === parent.word || node === parent.name ? hoverDeclaration(place) : hoverName(node, place);
    default:
      return hoverName(node, place);
  }
}

/** Between the tokens of a condition the requirement itself is meant. */
function conditionHover(place: HoverPlace): Found | undefined {
  const { declaration } = place.declared.item;
  if (declaration.kind !== 'require') return undefined;
  const { condition } = declaration;
  const node: Node | undefined = place.path.at(-1);
  if (!node || !place.path.includes(condition) || !operators.has(node.kind)) return undefined;
  const markdown = hoverRequirement(declaration, place);
  return markdown === undefined ? undefined : { span: condition.span, markdown };
}

const operators: ReadonlySet<Node['kind']> = new Set<Node['kind']>([
  'comparison',
  'logic',
  'is',
  'within',
  'between',
  'unary',
  'group',
  'arithmetic',
]);
