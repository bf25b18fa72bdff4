import { defineProblem } from './problem';

/** The round is the way through the declarations back to the first, which is not repeated. */
export const circularDefinition = defineProblem<{ round: readonly string[] }>({
  code: 'circular-definition',
  severity: 'error',
  title: 'Declarations that need each other',
  doc: 'The value of a declaration depends on itself, directly or through others. Break the circle at one place.',
  message: ({ round }) => {
    const shown = round.length > MOST ? [...round.slice(0, MOST - 1), '…'] : round;
    return `circular: ${[...shown, round[0] ?? ''].join(' → ')}`;
  },
});

/** Names that a message can hold. */
const MOST = 8;
