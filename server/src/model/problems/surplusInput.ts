import type { Fix } from './problem';
import { defineProblem, either, numeral } from './problem';

export const surplusInput = defineProblem<{
  what: string;
  count: number;
  given: readonly string[];
  fixes: readonly Fix[];
}>({
  code: 'surplus-input',
  severity: 'error',
  title: 'More inputs than needed',
  doc: 'The inputs over-determine the declaration: they could contradict each other. Keep as many as it needs; the rest is computed from them.',
  message: ({ what, count, given }) =>
    `${what} takes ${numeral(count)} of ${either(given, 'and')}; remove ${given.length - count === 1 ? 'one' : 'some'}`,
  fixes: ({ fixes }) => fixes,
});
