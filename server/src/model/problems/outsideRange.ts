import { defineProblem } from './problem';

export const outsideRange = defineProblem<{ what: string; value: string; low: string; high: string }>({
  code: 'outside-range',
  severity: 'warning',
  title: 'A method outside its range',
  doc: 'The published range of the correlation or table does not cover this value. What is shown is an extrapolation and may be wrong by more than its tolerance says.',
  message: ({ what, value, low, high }) => `${what} holds from ${low} to ${high}; at ${value} it is extrapolated`,
});
