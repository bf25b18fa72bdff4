import { evaluate } from '../../model/expression';
import { conditions, standardCondition } from '../../model/conditions';
import { kinds } from '../../model/kinds/list';
import { statements } from '../../model/kinds/statements';
import { regimes, standardRegimeLimits } from '../../model/regime';
import { fromSI } from '../../quantities/conversion';
import { unitOf } from '../../quantities/parseUnit';
import { kindNamed, quantityKinds } from '../../quantities/quantityKinds';
import type { DisplayDeclaration, Is } from '../../syntax/nodes';
import type { Suggestion } from './completionItem';
import { suggestion } from './completionItem';
import type { CompletionPlace } from './completionPlace';
import { measuredFirst } from './completionMeasuredFirst';
import { writeQuantity } from '../refactorings/literalReading';

/** What may open a line outside blocks, each as a whole declaration unless the line goes on already. */
export function openingSuggestions({ following }: CompletionPlace): readonly Suggestion[] {
  const whole = (snippet: string) => (following === '' ? { snippet } : {});
  return [
    ...statements.map(({ word, meaning, snippet }) => suggestion('keyword', word, meaning, whole(snippet))),
    ...kinds.map(({ word, meaning, snippet }) => suggestion('kind', word, meaning, whole(snippet))),
  ];
}

/** After `assume`: what may be assumed, with what holds otherwise. */
export function conditionSuggestions({ following, analysis }: CompletionPlace): readonly Suggestion[] {
  const inserted = (name: string, standard: string) =>
    following.startsWith('=') ? {} : { snippet: `${name} = \${1:${standard}}` };
  const limits = `[${Object.entries(standardRegimeLimits)
    .map(([regime, limit]) => `${regime}: ${limit}`)
    .join(', ')}]`;
  return [
    ...conditions.map((condition) => {
      const { name, quantityKind, meaning } = condition;
      const unit = analysis.display.get(quantityKind) ?? unitOf(kindNamed(quantityKind)?.usual[0] ?? '1');
      const standard = writeQuantity(fromSI(standardCondition(condition).si, unit), unit);
      return suggestion('condition', name, `${standard} by default`, {
        documentation: meaning,
        ...inserted(name, standard),
      });
    }),
    suggestion('condition', 'regime_limits', `${limits} by default`, {
      documentation: 'the Knudsen numbers from which on each regime holds',
      ...inserted('regime_limits', limits),
    }),
  ];
}

/** After `display`: the kinds of quantity that have units to choose from. */
export function quantitySuggestions(
  { items }: DisplayDeclaration,
  { following }: CompletionPlace,
): readonly Suggestion[] {
  const taken = items.flatMap(({ quantity }) => (quantity.kind === 'name' ? [quantity.text] : []));
  return measuredFirst(quantityKinds)
    .filter(({ name, usual }) => usual[0] !== '1' && !taken.includes(name))
    .map(({ name, usual, meaning }) =>
      suggestion('quantity', name, usual.join(', '), {
        documentation: meaning,
        insert: /^in\b/.test(following) ? name : `${name} in `,
      }),
    );
}

/** After `is`: the words that the left side can be. */
export function wordSuggestions({ left }: Is, { scope }: CompletionPlace): readonly Suggestion[] {
  const value = scope && evaluate(left, scope);
  if (value && value.kind !== 'word') return [];
  return (value?.of ?? regimes).map((word) => suggestion('word', word, word === value?.text ? 'as it is now' : ''));
}

/** In `regime_limits`: the regimes that begin at a Knudsen number. */
export function regimeSuggestions(): readonly Suggestion[] {
  return Object.entries(standardRegimeLimits).map(([regime, limit]) =>
    suggestion('word', regime, `from ${limit} by default`),
  );
}
