import { defineProblem, didYouMean, respellings } from './problem';

export const unknownKind = defineProblem<{ word: string; nearest: readonly string[] }>({
  code: 'unknown-kind',
  severity: 'error',
  title: 'A declaration of no known kind',
  doc: 'A declaration begins with the word of its kind: let, gas, state, tube, site, require and so on.',
  message: ({ word, nearest }) => `“${word}” opens no declaration${didYouMean(nearest)}`,
  fixes: ({ nearest }, span) => respellings(span, nearest),
});
