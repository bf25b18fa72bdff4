import type { Fix } from './problem';
import { defineProblem } from './problem';

export const duplicateKey = defineProblem<{ key: string; removal: Fix }>({
  code: 'duplicate-key',
  severity: 'error',
  title: 'The same key twice',
  doc: 'An input is given once. The first one counts.',
  message: ({ key }) => `${key} is given twice; the first one counts`,
  fixes: ({ removal }) => [{ ...removal, title: 'Remove this one' }],
});
