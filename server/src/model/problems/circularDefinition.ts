import { defineProblem } from './problem';

export const circularDefinition = defineProblem<{ round: readonly string[] }>({
  code: 'circular-definition',
  severity: 'error',
  title: 'Declarations that need each other',
  doc: 'The value of a declaration depends on itself, directly or through others. Break the circle at one place.',
  message: ({ round }) => `circular: ${[...round, round[0] ?? ''].join(' → ')}`,
});
