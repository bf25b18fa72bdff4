import { defineProblem, didYouMean, respellings } from './problem';

export const unknownProperty = defineProblem<{ what: string; property: string; nearest: readonly string[] }>({
  code: 'unknown-property',
  severity: 'error',
  title: 'A result that there is not',
  doc: 'The declaration computes no result of this name. Completion after the point lists its results with their values.',
  message: ({ what, property, nearest }) => `${what} has no result “${property}”${didYouMean(nearest)}`,
  fixes: ({ nearest }, span) => respellings(span, nearest),
});
