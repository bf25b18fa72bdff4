import { defineProblem } from './problem';

export const contradictoryInput = defineProblem<{ why: string }>({
  code: 'contradictory-input',
  severity: 'error',
  title: 'Inputs that do not fit together',
  doc: 'The inputs cannot all be true of one thing, or do not fix it: a number density and a density say the same of a gas and leave its temperature open.',
  message: ({ why }) => why,
});
