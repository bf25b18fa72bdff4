import { defineProblem } from './problem';

export const unusedDeclaration = defineProblem<{ name: string }>({
  code: 'unused-declaration',
  severity: 'hint',
  title: 'A declaration that nothing uses',
  doc: 'Nothing in this file reads the declaration. It is faded, and does no harm.',
  unnecessary: true,
  message: ({ name }) => `“${name}” is not used`,
});
