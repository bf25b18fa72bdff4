import { defineProblem } from './problem';

export const wrongType = defineProblem<{ subject: string; wants: string; found: string }>({
  code: 'wrong-type',
  severity: 'error',
  title: 'A thing of the wrong sort',
  doc: 'Something else is asked for at this place: a state where a gas stands, a number where a text stands.',
  message: ({ subject, wants, found }) => `${subject} wants ${wants}, but this is ${found}`,
});
