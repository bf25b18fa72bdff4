import type { Fix } from './problem';
import { defineProblem, either, numeral } from './problem';

export const missingInput = defineProblem<{
  what: string;
  count: number;
  of: readonly string[];
  given: readonly string[];
  fixes: readonly Fix[];
}>({
  code: 'missing-input',
  severity: 'error',
  title: 'An input is missing',
  doc: 'The declaration needs more inputs before anything can be computed. The message names the choices, and the fixes write them in.',
  message: ({ what, count, of, given }) => {
    if (of.length === 1) return `${what} needs ${of.join('')}`;
    const choices = `${numeral(count)} of ${either(of, 'and')}`;
    return given.length === 0
      ? `${what} needs ${choices}`
      : `${what} needs ${choices}; given is only ${given.join(', ')}`;
  },
  fixes: ({ fixes }) => fixes,
});
