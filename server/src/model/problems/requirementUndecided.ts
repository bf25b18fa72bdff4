import { defineProblem } from './problem';

export const requirementUndecided = defineProblem<{ found: string; holds: boolean }>({
  code: 'requirement-undecided',
  severity: 'warning',
  title: 'The tolerances leave a requirement undecided',
  doc: 'The best values meet the condition, or miss it, by less than their combined tolerance at 95 % coverage. Tighten the inputs that bring the largest share, or give the design more margin.',
  message: ({ found, holds }) =>
    `the tolerances leave this undecided: ${found}; the best values ${holds ? 'meet' : 'miss'} it`,
});
