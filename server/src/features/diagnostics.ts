import type { Analysis } from '../model/analysis';
import type { Severity } from '../model/problems/problem';

/** A problem at its place in the file. */
export interface Diagnostic {
  readonly start: number;
  readonly end: number;
  readonly code: string;
  readonly severity: Severity;
  readonly message: string;
  readonly unnecessary: boolean;
  readonly related: readonly RelatedPlace[];
}

/** A place that explains a problem, perhaps in another file. */
export interface RelatedPlace {
  readonly message: string;
  readonly uri: string;
  readonly start: number;
  readonly end: number;
}

/** Everything that is wrong or worth knowing in a file, from its top to its end. */
export function diagnostics(analysis: Analysis): readonly Diagnostic[] {
  return analysis
    .problems()
    .map(({ problem, offset }) => ({
      start: offset + problem.span.start,
      end: offset + problem.span.end,
      code: problem.code,
      severity: problem.severity,
      message: problem.message,
      unnecessary: problem.unnecessary,
      related: problem.related.map(({ message, uri, offset: start, length }) => ({
        message,
        uri,
        start,
        end: start + length,
      })),
    }))
    .sort((a, b) => a.start - b.start || a.end - b.end);
}
