import type { Analysis } from '../../model/analysis';
import type { Declared } from '../../model/declare';
import { hintResults } from '../../model/kinds/list';
import type { ShowOptions } from '../../model/quantity';
import { showWithTolerance, unitFor } from '../../model/quantity';
import { resultNamed } from '../../model/results';
import type { Figure, Gas, Members, Quantity, Record, Word } from '../../model/values';
import { alternativeUnit } from './describeUnits';

/** One result as a reader sees it, whatever shows it: a hover, a report, a table. */
export interface Row {
  readonly name: string;
  readonly symbol?: string;
  readonly meaning?: string;
  readonly value: Quantity | Word;
  /** In the file's unit, with its tolerance. */
  readonly text: string;
  /** The same in SI or, where that is SI already, in a usual unit. */
  readonly alternative?: string;
  readonly method: string;
  readonly sources: readonly string[];
  readonly range?: string;
  readonly assumptions: readonly string[];
}

/** A result that there is not, and why. */
export interface AbsentRow {
  readonly name: string;
  readonly why: string;
}

/** What a declaration computes, in plain rows. */
export interface Description {
  readonly rows: readonly Row[];
  readonly absent: readonly AbsentRow[];
  /** What each species of a mixture has by itself. */
  readonly species: readonly { readonly formula: string; readonly rows: readonly Row[] }[];
}

/** The results of a declaration that computes several; nothing while it has no value or computes a single one. */
export function describeRecord(analysis: Analysis, declared: Declared): Description | undefined {
  const outcome = analysis.outcome(declared);
  if (outcome.kind !== 'value') return undefined;
  const { value } = outcome;
  return value.kind === 'record' || value.kind === 'gas'
    ? describeMembers(value, showing(analysis, declared))
    : undefined;
}

export function describeMembers({ members, species }: Record | Gas, options: ShowOptions): Description {
  return {
    rows: rowsOf(members, options),
    absent: [...members].flatMap(([name, figure]) => (figure.kind === 'absent' ? [{ name, why: figure.why }] : [])),
    species: [...species].map(([formula, each]) => ({ formula, rows: rowsOf(each, options) })),
  };
}

export function describeFigure(name: string, figure: Extract<Figure, { kind: 'figure' }>, options: ShowOptions): Row {
  const { value, provenance } = figure;
  const { symbol, meaning } = resultNamed(name) ?? {};
  const alternative = value.kind === 'quantity' ? showAlternative(value, options) : undefined;
  return {
    name,
    value,
    text: showFigure(value, options),
    ...provenance,
    ...(symbol === undefined ? {} : { symbol }),
    ...(meaning === undefined ? {} : { meaning }),
    ...(alternative === undefined ? {} : { alternative }),
  };
}

/** How a file shows its numbers: its own units, and standard flows at its own reference conditions. */
export function showing(analysis: Analysis, declared: Declared): ShowOptions {
  const scope = analysis.scope(declared);
  return {
    display: analysis.display,
    reference: {
      temperature: scope.condition('standard_temperature').si,
      pressure: scope.condition('standard_pressure').si,
    },
  };
}

/** The value in the unit that `showWithTolerance` does not use. */
export function showAlternative(value: Quantity, options: ShowOptions): string | undefined {
  const unit = alternativeUnit(value, options.unit ?? unitFor(value, options.display));
  return unit && showWithTolerance(value, { ...options, unit });
}

export function showFigure(value: Quantity | Word, options: ShowOptions): string {
  return value.kind === 'word' ? value.text : showWithTolerance(value, options);
}

/** The results that an expert asks for first stand first. */
export function expertOrder(rows: readonly Row[], word: string): readonly Row[] {
  const first = hintResults(word);
  const rank = ({ name }: Row) => (first.includes(name) ? first.indexOf(name) : first.length);
  return [...rows].sort((a, b) => rank(a) - rank(b));
}

function rowsOf(members: Members, options: ShowOptions): readonly Row[] {
  return [...members].flatMap(([name, figure]) =>
    figure.kind === 'figure' ? [describeFigure(name, figure, options)] : [],
  );
}
