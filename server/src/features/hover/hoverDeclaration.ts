import { hintResults, kindOfWord } from '../../model/kinds/list';
import { statements } from '../../model/kinds/statements';
import type { Gas, Members, Record, Value } from '../../model/values';
import type { AbsentRow } from '../describe/describe';
import { describeMembers, expertOrder, showAlternative } from '../describe/describe';
import { describePercent } from '../describe/describePercent';
import { describeShortly } from '../describe/describeShortly';
import { budgetNote, figureTable, methodNotes } from './hoverFigures';
import { hazardNote, shareTable } from './hoverGas';
import { bold, code, list, paragraphs, plainText, shortened, table } from './hoverMarkdown';
import { noValueNote } from './hoverOutcome';
import type { HoverPlace } from './hoverPlace';
import { titleOf } from './hoverTitle';
import { sentence } from './hoverWord';

/** A declaration: what its author says of it, its results, and what stands behind them. */
export function hoverDeclaration(place: HoverPlace): string | undefined {
  const { analysis, declared } = place;
  const { declaration, doc } = declared.item;
  if (declaration.kind === 'thing' && !kindOfWord(declaration.word.text)) return undefined;
  const outcome = analysis.outcome(declared);
  const head = [titleOf(declared), doc === undefined ? undefined : plainText(shortened(doc, 2000))];
  if (outcome.kind !== 'value') return paragraphs([...head, meaningNote(place), noValueNote(analysis, declared)]);
  const meaning =
    place.path.at(-1) === declaration.word && outcome.value.kind !== 'pending' ? meaningNote(place) : undefined;
  return paragraphs([...head, meaning, ...valueParts(outcome.value, place)]);
}

function meaningNote({ declared }: HoverPlace): string | undefined {
  const { text } = declared.item.declaration.word;
  const meaning = statements.find(({ word }) => word === text)?.meaning ?? kindOfWord(text)?.meaning;
  return meaning === undefined ? undefined : sentence(meaning);
}

function valueParts(value: Value, place: HoverPlace): readonly (string | undefined)[] {
  const { analysis, options, detail } = place;
  switch (value.kind) {
    case 'record':
      return recordParts(value, place);
    case 'gas':
      return gasParts(value, place);
    case 'quantity': {
      const alternative = showAlternative(value, options);
      return [
        `${bold(describeShortly(value, options))}${alternative === undefined ? '' : `, ${plainText(alternative)}`}`,
        detail === 'full' ? budgetNote(analysis, value.leans) : undefined,
      ];
    }
    case 'verdict':
      return [
        plainText(describeShortly(value, options)),
        detail === 'full' ? budgetNote(analysis, value.leans) : undefined,
      ];
    case 'word':
    case 'phrase':
    case 'table':
    case 'named-table':
      return [plainText(shortened(describeShortly(value, options), 500))];
    case 'pending':
      return [meaningNote(place), sentence(describeShortly(value, options))];
  }
}

function gasParts(gas: Gas, { options, detail }: HoverPlace): readonly (string | undefined)[] {
  const { rows } = describeMembers(gas, options);
  return [
    figureTable(rows),
    shareTable(gas, options),
    ...(detail === 'full' ? [methodNotes(rows), hazardNote(gas.composition.species)] : []),
  ];
}

function recordParts(record: Record, place: HoverPlace): readonly (string | undefined)[] {
  const { analysis, options, detail } = place;
  const { rows: inOrder, absent } = describeMembers(record, options);
  const rows = expertOrder(inOrder, record.word);
  const figures = figureTable(rows);
  if (detail === 'brief') return [figures];
  const first = firstQuantity(record);
  return [
    figures,
    pathNote(record.members),
    first && budgetNote(analysis, first.leans, first.name),
    speciesTable(record, place),
    absentNote(absent, record),
    record.gas && hazardNote(record.gas.composition.species),
    methodNotes(rows),
  ];
}

/** The result whose tolerance is explained: the first of those that an expert asks for. */
function firstQuantity({ word, members }: Record) {
  for (const name of hintResults(word)) {
    const figure = members.get(name);
    if (figure?.kind === 'figure' && figure.value.kind === 'quantity') return { name, leans: figure.value.leans };
  }
  return undefined;
}

/** There are two mean free paths in use; which one is meant makes a difference. */
function pathNote(members: Members): string | undefined {
  const [path, hard] = ['mean_free_path', 'mean_free_path_hard_sphere'].map((name) => members.get(name));
  if (path?.kind !== 'figure' || hard?.kind !== 'figure') return undefined;
  if (path.value.kind !== 'quantity' || hard.value.kind !== 'quantity') return undefined;
  const ratio = hard.value.si / path.value.si - 1;
  const differs = `${describePercent(Math.abs(ratio))} ${ratio < 0 ? 'shorter' : 'longer'}`;
  return `${code('mean_free_path')} is viscosity-based; the hard-sphere path is ${plainText(differs)}.`;
}

/** What the species of a mixture have of their own. */
function speciesTable(record: Record, { options }: HoverPlace): string | undefined {
  const { species } = describeMembers(record, options);
  if (species.length < 2) return undefined;
  const text = (rows: (typeof species)[number]['rows'], name: string) =>
    plainText(rows.find((row) => row.name === name)?.text ?? '');
  return table(
    ['species', 'share of the molecules', 'partial pressure'],
    species.map(({ formula, rows }) => [code(formula), text(rows, 'mole_fraction'), text(rows, 'partial_pressure')]),
  );
}

/** What there is not, with the reason; what only a species has is said once. */
function absentNote(absent: readonly AbsentRow[], { species }: Record): string | undefined {
  const own = (name: string) => [...species.values()].some((members) => members.get(name)?.kind === 'figure');
  const alone = absent.filter(({ name }) => own(name)).map(({ name }) => name);
  const others = absent.filter(({ name }) => !own(name));
  return list([
    ...(alone.length > 0 ? [`only for one species: ${alone.map(code).join(', ')}`] : []),
    ...others.map(({ name, why }) => `${code(name)} is absent: ${plainText(why)}`),
  ]);
}
