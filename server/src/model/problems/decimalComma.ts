import { defineProblem, replacement } from './problem';

export const decimalComma = defineProblem<{ digits: string; inList: boolean }>({
  code: 'decimal-comma',
  severity: 'error',
  title: 'A comma inside a number',
  doc: 'The decimal sign is the point, everywhere and in every language, so that a file means the same to every reader. A comma separates entries and arguments; put a space after it there.',
  message: ({ digits, inList }) =>
    inList
      ? `“${digits}” has a comma inside; put a space after a comma that separates, or write the decimal point`
      : `“${digits}” has a comma; the decimal sign is the point`,
  fixes: ({ digits, inList }, span) => [
    {
      ...replacement(span, digits.replace(',', '.'), `Write ${digits.replace(',', '.')}`),
      ...(inList ? {} : { preferred: true }),
    },
    ...(inList ? [replacement(span, digits.replace(',', ', '), 'Separate two arguments')] : []),
    ...(/,\d{3}(?!\d)/.test(digits)
      ? [replacement(span, digits.replace(',', ''), `Write ${digits.replace(',', '')}`)]
      : []),
  ],
});
