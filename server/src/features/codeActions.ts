import type { Analysis, LocatedProblem } from '../model/analysis';
import { unitMismatch } from '../model/problems/unitMismatch';
import { unusedDeclaration } from '../model/problems/unusedDeclaration';
import type { Fix } from '../model/problems/problem';
import type { Span } from '../syntax/nodes';
import { convertLiteral } from './refactorings/convertLiteral';
import { extractLet } from './refactorings/extractLet';
import { inlineLet } from './refactorings/inlineLet';
import { removeDeclaration } from './refactorings/removeDeclaration';
import type { TextEdit } from './textEdit';

export interface CodeAction {
  readonly title: string;
  readonly kind: 'quickfix' | 'refactor.rewrite' | 'refactor.extract' | 'refactor.inline';
  readonly edits: readonly TextEdit[];
  /** The one that is meant nearly always. */
  readonly preferred: boolean;
  /** The code of the problem that it mends. */
  readonly code?: string;
}

/** What can be done to the text at a range: the fixes of its problems, then the refactorings. */
export function codeActions(analysis: Analysis, range: Span): readonly CodeAction[] {
  const problems = analysis.problems().filter(touches(range));
  // A unit that is wrong wants another unit, not the same mistake in other words.
  const conversions = problems.some(({ problem }) => problem.code === unitMismatch.code)
    ? []
    : convertLiteral(analysis, range);
  return [
    ...problems.flatMap((located) => fixesOf(located, analysis)),
    ...conversions.map((each) => ({ ...each, kind: 'refactor.rewrite', preferred: false }) as const),
    ...extractLet(analysis, range).map((each) => ({ ...each, kind: 'refactor.extract', preferred: false }) as const),
    ...inlineLet(analysis, range).map((each) => ({ ...each, kind: 'refactor.inline', preferred: false }) as const),
  ];
}

/** All preferred fixes of a file at once, in the order of the text; of two that meet, the first. */
export function fixAll(analysis: Analysis): readonly TextEdit[] {
  const chosen: TextEdit[] = [];
  for (const { problem, offset } of analysis.problems()) {
    const fix = problem.fixes.find(({ preferred }) => preferred);
    const edits = fix ? editsOf(fix, offset) : [];
    if (edits.every((edit) => chosen.every((other) => isApart(edit, other)))) chosen.push(...edits);
  }
  return chosen.sort((a, b) => a.start - b.start);
}

function fixesOf({ problem, offset, declared }: LocatedProblem, analysis: Analysis): readonly CodeAction[] {
  const { code, fixes } = problem;
  if (code === unusedDeclaration.code && fixes.length === 0) {
    return [{ ...removeDeclaration(analysis, declared), kind: 'quickfix', preferred: false, code }];
  }
  return fixes.map((fix) => ({
    title: fix.title,
    kind: 'quickfix',
    edits: editsOf(fix, offset),
    preferred: fix.preferred ?? false,
    code,
  }));
}

function editsOf({ edits }: Fix, offset: number): readonly TextEdit[] {
  return edits.map(({ span, text }) => ({ start: offset + span.start, end: offset + span.end, text }));
}

function touches({ start, end }: Span): (located: LocatedProblem) => boolean {
  return ({ problem: { span }, offset }) => offset + span.start <= end && start <= offset + span.end;
}

/** Two insertions at one place would leave their order to chance. */
function isApart(a: TextEdit, b: TextEdit): boolean {
  return a.end < b.start || b.end < a.start || ((a.end === b.start || b.end === a.start) && a.start !== b.start);
}
