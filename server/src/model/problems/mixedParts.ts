import { defineProblem } from './problem';

export const mixedParts = defineProblem<{ why: string }>({
  code: 'mixed-parts',
  severity: 'error',
  title: 'Parts of different kinds',
  doc: 'The parts of a mixture are all of one kind: fractions, partial pressures, flows (by amount) or masses. One fraction may be `balance`.',
  message: ({ why }) => why,
});
