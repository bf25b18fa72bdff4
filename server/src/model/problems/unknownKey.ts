import { defineProblem, didYouMean, respellings } from './problem';

export const unknownKey = defineProblem<{ what: string; key: string; nearest: readonly string[] }>({
  code: 'unknown-key',
  severity: 'error',
  title: 'A key that is not known here',
  doc: 'The declaration has no input of this name. Completion lists the keys it has.',
  message: ({ what, key, nearest }) => `${what} has no input “${key}”${didYouMean(nearest)}`,
  fixes: ({ nearest }, span) => respellings(span, nearest),
});
