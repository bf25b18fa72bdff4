import type { Fix } from './problem';
import { defineProblem } from './problem';

export const ambiguousTemperature = defineProblem<{ written: string; why: string; readings: readonly Fix[] }>({
  code: 'ambiguous-temperature',
  severity: 'error',
  title: 'A temperature that can be read two ways',
  doc: 'A temperature in °C or °F is a point on a scale, not an amount: it cannot be doubled, and whether one that is added is a point or a difference cannot be seen. Write a difference in K, and a temperature in K where it is multiplied.',
  message: ({ written, why }) => `“${written}” ${why}`,
  fixes: ({ readings }) => readings,
});
