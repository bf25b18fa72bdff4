import type { Span } from '../../syntax/nodes';
import { defineProblem, replacement } from './problem';

export interface UnitMismatch {
  /** What the value is for, as in “pressure”. */
  readonly subject: string;
  /** With its article: “a pressure”. */
  readonly wants: string;
  /** What stands there: the unit as written, or the value's name. */
  readonly found: string;
  /** What that measures, with its article. */
  readonly measures: string;
  /** Where a unit can be replaced, and the units that could have been meant. */
  readonly unit?: { readonly span: Span; readonly candidates: readonly string[] };
  /** What to do instead, where a unit is not the answer. */
  readonly advice?: string;
}

export const unitMismatch = defineProblem<UnitMismatch>({
  code: 'unit-mismatch',
  severity: 'error',
  title: 'A unit that measures something else',
  doc: 'The value has another dimension than what is asked for. The fixes offer units that could have been meant: those spelt alike first, then those usual for the quantity.',
  message: ({ subject, wants, found, measures, unit, advice }) => {
    const candidates = unit?.candidates ?? [];
    const meant = candidates.length > 0 ? `; did you mean ${candidates.slice(0, 3).join(', ')}?` : '';
    return `${subject} is ${wants}, but ${found} is ${measures}${advice ? `; ${advice}` : meant}`;
  },
  fixes: ({ unit }) =>
    unit ? unit.candidates.map((candidate) => replacement(unit.span, candidate, `Use ${candidate}`)) : [],
});
