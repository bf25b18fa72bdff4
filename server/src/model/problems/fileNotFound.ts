import { defineProblem } from './problem';

export const fileNotFound = defineProblem<{ path: string }>({
  code: 'file-not-found',
  severity: 'error',
  title: 'A used file that is not there',
  doc: 'The path of `use` is relative to the file it stands in. The file cannot be read.',
  message: ({ path }) => `no file can be read at “${path}”`,
});
