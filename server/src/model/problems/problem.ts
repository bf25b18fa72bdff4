import type { Span } from '../../syntax/nodes';

export type Severity = 'error' | 'warning' | 'information' | 'hint';

/** Something a person should know, at a place of a declaration. Spans count from the start of the declaration. */
export interface Problem {
  readonly code: string;
  readonly severity: Severity;
  readonly span: Span;
  readonly message: string;
  readonly fixes: readonly Fix[];
  readonly related: readonly Related[];
  /** Faded in the editor. */
  readonly unnecessary: boolean;
}

export interface Fix {
  readonly title: string;
  readonly edits: readonly Edit[];
  /** The one that is meant nearly always. */
  readonly preferred?: boolean;
}

export interface Edit {
  readonly span: Span;
  readonly text: string;
}

/** Another place that explains the problem: a declaration, by its name and file. */
export interface Related {
  readonly message: string;
  readonly uri: string;
  readonly offset: number;
  readonly length: number;
}

export interface ProblemDefinition<A> {
  readonly code: string;
  readonly severity: Severity;
  readonly title: string;
  /** For the page of the code: what it means and what to do. */
  readonly doc: string;
  readonly unnecessary?: boolean;
  /** One phrase in the reader's words, then what would be right; lower case, no full stop. */
  message(args: A): string;
  fixes?(args: A, span: Span): readonly Fix[];
}

export interface ProblemKind<A> extends ProblemDefinition<A> {
  at(span: Span, args: A, options?: { readonly related?: readonly Related[]; readonly severity?: Severity }): Problem;
}

export function defineProblem<A>(definition: ProblemDefinition<A>): ProblemKind<A> {
  return {
    ...definition,
    at: (span, args, { related = [], severity = definition.severity } = {}) => ({
      code: definition.code,
      severity,
      span,
      message: definition.message(args),
      fixes: definition.fixes?.(args, span) ?? [],
      related,
      unnecessary: definition.unnecessary ?? false,
    }),
  };
}

/** A fix that puts other text in place of a span. */
export function replacement(span: Span, text: string, title: string): Fix {
  return { title, edits: [{ span, text }] };
}

/** The fixes for a misspelt name, the nearest first. */
export function respellings(span: Span, nearest: readonly string[]): readonly Fix[] {
  return nearest.map((name, index) => ({
    ...replacement(span, name, `Change to ${name}`),
    ...(index === 0 && nearest.length === 1 ? { preferred: true } : {}),
  }));
}

/** `, did you mean a or b` or nothing. */
export function didYouMean(nearest: readonly string[]): string {
  return nearest.length === 0 ? '' : `; did you mean ${either(nearest)}?`;
}

export function either(words: readonly string[], conjunction = 'or'): string {
  if (words.length < 2) return words.join('');
  return `${words.slice(0, -1).join(', ')} ${conjunction} ${words.at(-1) ?? ''}`;
}

export function numeral(count: number): string {
  return ['none', 'one', 'two', 'three'][count] ?? String(count);
}
