import { defineProblem, didYouMean, replacement } from './problem';

export const unknownUnit = defineProblem<{ name: string; nearest: readonly string[] }>({
  code: 'unknown-unit',
  severity: 'error',
  title: 'A unit that is not known',
  doc: 'Units are spelt exactly: upper and lower case differ (mPa is a thousandth of a pascal, MPa a million). Products are written tight, as in mbar·L/s.',
  message: ({ name, nearest }) => `no unit is spelt “${name}”${didYouMean(nearest)}`,
  // Which unit is meant, only its author knows: none is put in without being asked.
  fixes: ({ nearest }, span) => nearest.map((name) => replacement(span, name, `Change to ${name}`)),
});
