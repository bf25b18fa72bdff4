import { defineProblem } from './problem';

export const notComputedYet = defineProblem<{ what: string }>({
  code: 'not-computed-yet',
  severity: 'information',
  title: 'Not computed yet',
  doc: 'This version reads and checks the declaration but does not compute it. What depends on it waits.',
  message: ({ what }) => `${what} is not computed yet`,
});
