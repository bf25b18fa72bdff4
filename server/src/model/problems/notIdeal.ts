import { defineProblem } from './problem';

export const notIdeal = defineProblem<{ compressibility: string; departure: string }>({
  code: 'not-ideal',
  severity: 'warning',
  title: 'Not an ideal gas here',
  doc: 'The compressibility factor, from the second virial coefficient, differs from 1 by more than 1 %. Pressure, temperature and density are tied by the ideal-gas law, so that densities are off by as much, and so is what follows from them.',
  message: ({ compressibility, departure }) =>
    `not an ideal gas here: Z is ${compressibility}, so densities are off by ${departure}`,
});
