import type { Analysis } from '../model/analysis';
import type { Problem } from '../model/problems/problem';
import type { Position } from '../features/lines';
import { lineIndex } from '../features/lines';

/** A problem with its place in the file; lines and characters count from zero. */
export interface PlacedProblem {
  readonly problem: Problem;
  readonly start: Position;
  readonly end: Position;
}

/** The problems of a file in the order of their places. */
export function problemsOf(analysis: Analysis): readonly PlacedProblem[] {
  const lines = lineIndex(analysis.text);
  return analysis
    .problems()
    .map(({ problem, offset }) => ({ problem, from: offset + problem.span.start, to: offset + problem.span.end }))
    .sort((a, b) => a.from - b.from || a.to - b.to)
    .map(({ problem, from, to }) => ({ problem, start: lines.positionAt(from), end: lines.positionAt(to) }));
}
