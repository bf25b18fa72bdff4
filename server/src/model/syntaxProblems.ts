import { walk } from '../syntax/children';
import type { Declaration, Junk, Node } from '../syntax/nodes';
import type { Problem } from './problems/problem';
import { syntaxError } from './problems/syntaxError';

const known = new WeakMap<Declaration, readonly Problem[]>();

/** What is wrong with the text of a declaration, read off its finished tree. One problem a place. */
export function syntaxProblems(declaration: Declaration): readonly Problem[] {
  const before = known.get(declaration);
  if (before) return before;
  const problems = new Map<number, Problem>();
  walk(declaration, (node) => {
    const problem = problemOf(node);
    if (problem && !problems.has(problem.span.start)) problems.set(problem.span.start, problem);
  });
  const found = [...problems.values()];
  known.set(declaration, found);
  return found;
}

function problemOf(node: Node): Problem | undefined {
  switch (node.kind) {
    case 'hole':
      return syntaxError.at(node.span, { expected: node.expected });
    case 'junk':
      return junkProblem(node);
    case 'text':
      return node.closed ? undefined : syntaxError.at(endOf(node), { expected: 'a closing quote' });
    case 'group':
    case 'call':
      return node.closed ? undefined : syntaxError.at(endOf(node), { expected: '“)”' });
    case 'table':
      return node.closed ? undefined : syntaxError.at(endOf(node), { expected: '“]”' });
    case 'block':
      return node.closed ? undefined : syntaxError.at(openingOf(node), { expected: '“}” for this “{”' });
    default:
      return undefined;
  }
}

/** Only the first line of what is unexpected is underlined. */
function junkProblem({ span, text }: Junk): Problem {
  const line = text.split('\n', 1)[0]?.trimEnd() ?? '';
  return syntaxError.at({ start: span.start, end: span.start + Math.max(1, line.length) }, { unexpected: text });
}

function endOf({ span }: Node): Node['span'] {
  return { start: span.end, end: span.end };
}

function openingOf({ span }: Node): Node['span'] {
  return { start: span.start, end: span.start + 1 };
}
