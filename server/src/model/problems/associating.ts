import { defineProblem } from './problem';

export const associating = defineProblem<{ species: string; into: string }>({
  code: 'associating',
  severity: 'information',
  title: 'Molecules that join or part',
  doc: 'The vapour is a mixture of single and joined molecules whose shares depend on temperature and pressure. All results hold for single molecules only, so that densities, speeds and transport properties may be far off where it is cold or dense.',
  message: ({ species, into }) => `${species} is partly ${into}, which is left out: results hold for single molecules`,
});
