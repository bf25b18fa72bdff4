import { defineProblem } from './problem';

export const absoluteZero = defineProblem<{ subject: string; value: string }>({
  code: 'absolute-zero',
  severity: 'error',
  title: 'A temperature at or below absolute zero',
  doc: 'No gas is at or below 0 K (−273.15 °C, −459.67 °F). Often a minus sign or the unit is wrong.',
  message: ({ subject, value }) => `${subject} is ${value}, which is not above absolute zero`,
});
