import { evaluate } from '../../model/expression';
import { kindOfWord } from '../../model/kinds/list';
import type { Expression, Junk, Node, ThingDeclaration } from '../../syntax/nodes';
import type { Suggestion } from './completionItem';
import { suggestion } from './completionItem';
import type { CompletionPlace } from './completionPlace';
import { isFirstWord } from './completionPlace';
import { isExpression } from '../refactorings/isExpression';

/** The words that can go on after something complete: `because` after a condition, `of` after the name of a state. */
export function followingSuggestions(junk: Junk, place: CompletionPlace): readonly Suggestion[] {
  // Behind other text that fits nowhere, nothing can be told.
  if (!isFirstWord(junk, place)) return [];
  const parent = place.path.at(-2);
  if (parent?.kind === 'entry') return isExpression(parent.value) ? afterValue(parent.value) : [];
  return parent ? afterPart(parent, place) : [];
}

function afterPart(node: Node, place: CompletionPlace): readonly Suggestion[] {
  switch (node.kind) {
    case 'require':
      return node.because ? [] : afterCondition(node.condition, place);
    case 'let':
    case 'assume':
      return afterValue(node.value);
    case 'display':
      return node.items.at(-1)?.unit.kind === 'hole' ? [suggestion('keyword', 'in', 'a unit')] : [];
    case 'vary':
      return node.count.kind === 'hole'
        ? []
        : ['log steps', 'steps'].map((word) => suggestion('keyword', word, 'how many values'));
    case 'thing':
      return node.head || node.block ? [] : headWords(node);
    default:
      return [];
  }
}

function headWords({ word }: ThingDeclaration): readonly Suggestion[] {
  const kind = kindOfWord(word.text);
  return (kind?.heads ?? []).map(({ relation, wants, words }) => {
    const what = { gas: 'a gas', record: `a ${(words ?? []).join(' or ')}`, route: 'a passage' }[wants];
    return suggestion('keyword', relation, what, { insert: `${relation} ` });
  });
}

function afterCondition(condition: Expression, { scope }: CompletionPlace): readonly Suggestion[] {
  if (condition.kind === 'between' && condition.high.kind === 'hole')
    return [suggestion('keyword', 'and', 'the upper limit')];
  if (condition.kind === 'within' && condition.target.kind === 'hole')
    return [suggestion('keyword', 'of', 'the value to meet')];
  const because = suggestion('keyword', 'because', 'the reason', { snippet: 'because "${1:reason}"' });
  if (decides(condition)) {
    return [
      because,
      suggestion('keyword', 'and', 'both must hold', { insert: 'and ' }),
      suggestion('keyword', 'or', 'one must hold', { insert: 'or ' }),
    ];
  }
  const value = scope && evaluate(condition, scope);
  if (value?.kind === 'word') return [suggestion('keyword', 'is', 'one of its words', { insert: 'is ' })];
  if (value?.kind !== 'quantity') return [];
  return [
    suggestion('keyword', 'within', 'near a value', { snippet: 'within ${1:5 %} of ${2:value}' }),
    suggestion('keyword', 'between', 'two limits', { snippet: 'between ${1:low} and ${2:high}' }),
    ...afterValue(condition),
  ];
}

function decides({ kind }: Expression): boolean {
  return ['comparison', 'is', 'within', 'between', 'logic'].includes(kind);
}

function afterValue({ kind }: Expression): readonly Suggestion[] {
  return kind === 'hole' || kind === 'conversion' || kind === 'table' || kind === 'text'
    ? []
    : [suggestion('keyword', 'in', 'the unit to show it in', { insert: 'in ' })];
}
