import type { ShowOptions } from '../../model/quantity';
import { show, showWithTolerance } from '../../model/quantity';
import { hintResults } from '../../model/kinds/list';
import { resultNamed } from '../../model/results';
import type { Gas, Members, Value } from '../../model/values';
import { describeStatus } from './describeStatus';
import { showFigure } from './describe';

/** A value in one short line: a number with its tolerance, or the figures that an expert asks for first. */
export function describeShortly(value: Value, options: ShowOptions): string {
  switch (value.kind) {
    case 'quantity':
      return showWithTolerance(value, options);
    case 'word':
      return value.text;
    case 'phrase':
      return `“${value.text}”`;
    case 'table':
      return `a table of ${value.rows.length} rows`;
    case 'named-table':
      return `a table of ${value.rows.size} rows`;
    case 'gas':
      return describeComposition(value);
    case 'verdict':
      return describeStatus(value);
    case 'record':
      return describeFigures(value.members, hintResults(value.word), options);
    case 'pending':
      return 'its results come with a later version';
  }
}

/** `Ar 95.00 %, O2 5.000 %`; of a single gas its formula. */
export function describeComposition({ composition, fractions }: Gas): string {
  const { species } = composition;
  if (species.length === 1) return species[0]?.formula ?? '';
  return species
    .flatMap(({ formula }, index) => {
      const fraction = fractions[index];
      return fraction ? [`${formula} ${show({ ...fraction, quantityKind: 'fraction' })}`] : [];
    })
    .join(', ');
}

function describeFigures(members: Members, names: readonly string[], options: ShowOptions): string {
  return names
    .flatMap((name) => {
      const figure = members.get(name);
      if (figure?.kind !== 'figure') return [];
      const { symbol } = resultNamed(name) ?? {};
      return [`${symbol === undefined ? '' : `${symbol} `}${showFigure(figure.value, options)}`];
    })
    .join(' · ');
}
