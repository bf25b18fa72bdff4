import { defineProblem } from './problem';

export const tooDense = defineProblem<{ spacing: string; diameter: string }>({
  code: 'too-dense',
  severity: 'warning',
  title: 'Too dense for dilute-gas theory',
  doc: 'The molecules themselves take up a noticeable part of the volume, so that the ideal-gas law and the dilute-gas transport properties no longer hold.',
  message: ({ spacing, diameter }) =>
    `too dense for dilute-gas theory: the molecules are ${spacing} apart and ${diameter} wide`,
});
