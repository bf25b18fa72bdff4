import { children } from './children';
import type { File, Node } from './nodes';

/**
 * The tree of a file or of a part of it as text, for tests and for reading: `(let room 20°C)`. What is missing stands in
 * angle brackets, what fits nowhere after `junk`. A node that does not fit a line is written one part a line.
 */
export function printTree(tree: File | Node): string {
  if (!('kind' in tree)) return tree.items.map(({ declaration }) => printTree(declaration)).join('\n');
  return print(tree, '');
}

const WIDTH = 100;

function print(node: Node, indent: string): string {
  const parts = partsOf(node);
  if (!parts) return leaf(node);
  const inner = parts.map((part) => print(part, `${indent}  `)).filter((text) => text !== '');
  const line = `(${[headOf(node), ...inner].join(' ')})`;
  if (indent.length + line.length <= WIDTH && !line.includes('\n')) return line;
  return `(${[headOf(node), ...inner].join(`\n${indent}  `)})`;
}

/** The parts that are printed below a node; nothing of a leaf. */
function partsOf(node: Node): readonly Node[] | undefined {
  switch (node.kind) {
    case 'name':
    case 'hole':
    case 'junk':
    case 'text':
    case 'unit':
    case 'number':
    case 'balance':
      return undefined;
    case 'thing':
    case 'stray':
      return children(node);
    default:
      return 'word' in node ? children(node).filter((part) => part !== node.word) : children(node);
  }
}

function leaf(node: Node): string {
  switch (node.kind) {
    case 'name':
    case 'unit':
      return node.text;
    case 'hole':
      return `<${node.expected}>`;
    case 'junk':
      return `junk ${JSON.stringify(node.text)}`;
    case 'text':
      return JSON.stringify(node.text) + (node.closed ? '' : ' unclosed');
    case 'number':
      return node.text + (node.unit?.text ?? '');
    default:
      return node.kind;
  }
}

/** What a node is called: its word or its operator where it has one. */
function headOf(node: Node): string {
  switch (node.kind) {
    case 'unary':
    case 'arithmetic':
    case 'comparison':
    case 'logic':
      return node.operator;
    case 'is':
      return node.negated ? 'is not' : 'is';
    case 'member':
      return '.';
    case 'tolerance':
      return '±';
    case 'conversion':
      return 'in';
    case 'vary':
      return node.spacing === 'log' ? 'vary log' : 'vary';
    case 'thing':
    case 'stray':
      return node.kind;
    case 'group':
    case 'call':
    case 'table':
    case 'block':
      return node.closed ? node.kind : `${node.kind} unclosed`;
    default:
      return 'word' in node ? node.word.text : node.kind;
  }
}
