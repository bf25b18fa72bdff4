import { defineProblem } from './problem';

export const missingUnit = defineProblem<{ subject: string; wants: string; digits: string; units: readonly string[] }>({
  code: 'missing-unit',
  severity: 'error',
  title: 'A number without its unit',
  doc: 'Every number that measures something is written with its unit, zero included. The fixes offer the units that are usual here.',
  message: ({ subject, wants, digits }) => `expected a unit after ${digits}: ${subject} is ${wants}`,
  fixes: ({ units }, span) =>
    units.map((unit) => ({
      title: `Add ${unit}`,
      edits: [{ span: { start: span.end, end: span.end }, text: ` ${unit}` }],
    })),
});
