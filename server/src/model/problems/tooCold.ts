import { defineProblem } from './problem';

export const tooCold = defineProblem<{ species: string; degeneracy: string }>({
  code: 'too-cold',
  severity: 'warning',
  title: 'Too cold for classical statistics',
  doc: 'The thermal wavelength is no longer small against the spacing of the molecules (n·Λ³ must be far below 1). Quantum statistics would be needed.',
  message: ({ species, degeneracy }) =>
    `too cold for classical statistics: n·Λ³ of ${species} is ${degeneracy}, which should be far below 1`,
});
