import { defineProblem } from './problem';

export const requirementFails = defineProblem<{ strength: 'require' | 'prefer'; found: string; because?: string }>({
  code: 'requirement-fails',
  severity: 'error',
  title: 'A requirement does not hold',
  doc: 'The condition of a `require` is not met; for a `prefer` this is a warning. The hover shows both sides, the margin and which input brings which share of the tolerance.',
  message: ({ strength, found, because }) =>
    `${strength === 'require' ? 'requirement fails' : 'preference not met'}: ${found}${because ? ` (${because})` : ''}`,
});
