import { defineProblem } from './problem';

export const noData = defineProblem<{ why: string }>({
  code: 'no-data',
  severity: 'error',
  title: 'A result for which there are no data',
  doc: 'The result needs data that are not known for this gas. Nothing is invented in their place.',
  message: ({ why }) => why,
});
