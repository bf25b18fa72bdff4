import { defineProblem } from './problem';

export const noValue = defineProblem<{ why: string }>({
  code: 'no-value',
  severity: 'error',
  title: 'An expression without a value',
  doc: 'The arithmetic has no result: a division by zero, the root of a negative number, or a number too large to be represented.',
  message: ({ why }) => why,
});
