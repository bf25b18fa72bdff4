import { defineProblem, didYouMean, respellings } from './problem';

export const unknownUnit = defineProblem<{ name: string; nearest: readonly string[] }>({
  code: 'unknown-unit',
  severity: 'error',
  title: 'A unit that is not known',
  doc: 'Units are spelt exactly: upper and lower case differ (mPa is a thousandth of a pascal, MPa a million). Products are written tight, as in mbar·L/s.',
  message: ({ name, nearest }) => `no unit is spelt “${name}”${didYouMean(nearest)}`,
  fixes: ({ nearest }, span) => respellings(span, nearest),
});
