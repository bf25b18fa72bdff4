import type { Span } from '../../syntax/nodes';
import { defineProblem, replacement } from './problem';

export const duplicateKey = defineProblem<{ key: string; entry: Span }>({
  code: 'duplicate-key',
  severity: 'error',
  title: 'The same key twice',
  doc: 'An input is given once. The first one counts.',
  message: ({ key }) => `${key} is given twice; the first one counts`,
  fixes: ({ entry }) => [replacement(entry, '', 'Remove this one')],
});
