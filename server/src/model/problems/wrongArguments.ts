import { defineProblem } from './problem';

export const wrongArguments = defineProblem<{ usage: string; given: number }>({
  code: 'wrong-arguments',
  severity: 'error',
  title: 'A function with the wrong arguments',
  doc: 'The function takes another number of arguments.',
  message: ({ usage, given }) => `write ${usage}; ${given === 1 ? '1 argument is' : `${given} arguments are`} given`,
});
