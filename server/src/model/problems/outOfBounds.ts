import { defineProblem } from './problem';

export const outOfBounds = defineProblem<{ subject: string; value: string; bound: string }>({
  code: 'out-of-bounds',
  severity: 'error',
  title: 'A value that cannot be',
  doc: 'The value lies outside what the quantity can be: a pressure or a length is above zero, a fraction between 0 and 1.',
  message: ({ subject, value, bound }) => `${subject} is ${value}; it must be ${bound}`,
});
