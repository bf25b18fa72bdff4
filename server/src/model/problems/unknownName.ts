import { defineProblem, didYouMean, respellings } from './problem';

export const unknownName = defineProblem<{ what: string; name: string; nearest: readonly string[] }>({
  code: 'unknown-name',
  severity: 'error',
  title: 'A name that nothing declares',
  doc: 'No declaration of this file, of a file it uses, or of the built-in gases has this name. Names are case-sensitive.',
  message: ({ what, name, nearest }) => `no ${what} is named “${name}”${didYouMean(nearest)}`,
  fixes: ({ nearest }, span) => respellings(span, nearest),
});
