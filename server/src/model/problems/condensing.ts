import { defineProblem } from './problem';

export const condensing = defineProblem<{
  species: string;
  phase: 'solid' | 'liquid';
  pressure: string;
  saturation?: string;
}>({
  code: 'condensing',
  severity: 'warning',
  title: 'Would condense or freeze',
  doc: 'The partial pressure of a vapour is above its saturation pressure at this temperature: part of it would become liquid or solid, and the gas would be thinner than stated. Lower the pressure or the share of the vapour, or raise the temperature above the dew point. What is shown holds for a vapour that has not condensed yet.',
  message: ({ species, phase, pressure, saturation }) => {
    const limit = saturation === undefined ? 'far above saturation' : `above its saturation pressure ${saturation}`;
    return `${species} would ${phase === 'solid' ? 'freeze' : 'condense'} here: its partial pressure ${pressure} is ${limit}`;
  },
});
