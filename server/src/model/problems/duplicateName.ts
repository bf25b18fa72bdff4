import { defineProblem } from './problem';

export const duplicateName = defineProblem<{ name: string }>({
  code: 'duplicate-name',
  severity: 'error',
  title: 'A name declared twice',
  doc: 'A name stands for one thing. The first declaration counts where the name is used.',
  message: ({ name }) => `“${name}” is declared more than once; the first declaration counts`,
});
