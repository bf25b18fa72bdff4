import { defineProblem } from './problem';

export const hazard = defineProblem<{ hazards: readonly string[] }>({
  code: 'hazard',
  severity: 'information',
  title: 'A gas that can hurt',
  doc: 'The gas is toxic, or holds something flammable or pyrophoric together with an oxidiser. The classes are those of the GHS for the pure gases, whatever their share here. This is a reminder and no assessment: follow the safety data sheet, local codes and licensed practice. Where nothing is reported, nothing has been assessed either.',
  message: ({ hazards }) => `${hazards.join('; ')}; follow the safety data sheet, local codes and licensed practice`,
});
