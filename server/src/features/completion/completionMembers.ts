import { evaluate } from '../../model/expression';
import type { Gas, Record } from '../../model/values';
import { constants } from '../../quantities/constants';
import { formatNumber } from '../../quantities/format';
import type { Member } from '../../syntax/nodes';
import { parse } from '../../syntax/parse';
import type { Suggestion } from './completionItem';
import { suggestion } from './completionItem';
import type { CompletionPlace } from './completionPlace';
import type { Wanted } from './completionWanted';
import { isWanted, wantedAt } from './completionWanted';
import type { Row } from '../describe/describe';
import { describeMembers, expertOrder, showing } from '../describe/describe';

/** The same on a line that is nothing yet: `residual.` is a path all the same. */
export function strayMemberSuggestions(place: CompletionPlace): readonly Suggestion[] {
  const written = /[\p{L}_][\p{L}\p{N}_.]*\.$/u.exec(place.analysis.text.slice(0, place.replace.start))?.[0];
  const [item] = written === undefined ? [] : parse(`let path = ${written}`).items;
  const node = item?.declaration.kind === 'let' ? item.declaration.value : undefined;
  return node?.kind === 'member' ? memberSuggestions(node, place) : [];
}

/** What may follow a point: the results there are now, each with its value; the species of a mixture; constants. */
export function memberSuggestions(node: Member, place: CompletionPlace): readonly Suggestion[] {
  if (node.object.kind === 'name' && node.object.text === 'const' && !place.analysis.find('const')) {
    return constantSuggestions();
  }
  if (place.path.at(-3)?.kind === 'vary') return inputsOf(node, place);
  const value = place.scope && evaluate(node.object, place.scope);
  if (value?.kind !== 'record' && value?.kind !== 'gas') return [];
  return resultsOf(value, wantedAt(place.path.slice(0, -1), place.scope), place);
}

function resultsOf(value: Record | Gas, wanted: Wanted | undefined, place: CompletionPlace): readonly Suggestion[] {
  if (!place.declared) return [];
  const { rows, species } = describeMembers(value, showing(place.analysis, place.declared));
  const ordered = expertOrder(rows, value.kind === 'gas' ? 'gas' : value.word);
  const fitting = (row: Row) => !wanted || (row.value.kind === 'quantity' && isWanted(wanted, row.value));
  const results = [...ordered.filter(fitting), ...ordered.filter((row) => !fitting(row))].map(result);
  const mixture = species.length < 2 ? [] : species;
  return [...results, ...mixture.map(({ formula, rows: own }) => suggestion('gas', formula, shareOf(own)))];
}

function result({ name, text, meaning, method }: Row): Suggestion {
  const documentation = [meaning, `*${method}*`].filter(Boolean).join('\n\n');
  return suggestion('property', name, text, { documentation });
}

function shareOf(rows: readonly Row[]): string {
  return rows.find(({ name }) => name === 'mole_fraction')?.text ?? 'a species of the mixture';
}

/** What a sweep may vary: the inputs that are written. */
function inputsOf({ object }: Member, { analysis }: CompletionPlace): readonly Suggestion[] {
  const item = object.kind === 'name' ? analysis.find(object.text)?.declared.item : undefined;
  const block = item?.declaration.kind === 'thing' ? item.declaration.block : undefined;
  return (block?.items ?? []).flatMap((entry) =>
    entry.kind === 'entry'
      ? [suggestion('property', entry.key.text, item?.text.slice(entry.value.span.start, entry.value.span.end) ?? '')]
      : [],
  );
}

function constantSuggestions(): readonly Suggestion[] {
  return constants.map(({ name, title, value, unit, source }) =>
    suggestion('constant', name, `${formatNumber(value, 6)} ${unit}`, { documentation: `${title}\n\n*${source}*` }),
  );
}
