import { defineProblem, replacement } from './problem';

export const gaugePressure = defineProblem<{ ambient: string; absolute: string }>({
  code: 'gauge-pressure',
  severity: 'information',
  title: 'A gauge pressure',
  doc: 'psig and barg count from the ambient pressure. The value is made absolute with the ambient pressure that is assumed (`assume ambient_pressure = …`, by default 101 325 Pa).',
  message: ({ ambient, absolute }) =>
    `gauge pressure, read as ${absolute} absolute with an ambient pressure of ${ambient}`,
  fixes: ({ absolute }, span) => [replacement(span, absolute, `Write the absolute pressure, ${absolute}`)],
});
