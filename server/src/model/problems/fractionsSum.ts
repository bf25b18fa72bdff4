import type { Fix } from './problem';
import { defineProblem } from './problem';

export const fractionsSum = defineProblem<{ sum: string; fixes: readonly Fix[] }>({
  code: 'fractions-sum',
  severity: 'error',
  title: 'Fractions that do not add up',
  doc: 'The fractions of a mixture add up to 100 %. Correct one, let the last be `balance`, or scale them all.',
  message: ({ sum }) => `the fractions add up to ${sum}, not to 100 %`,
  fixes: ({ fixes }) => fixes,
});
