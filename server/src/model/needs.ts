import type { Entry, ThingDeclaration } from '../syntax/nodes';
import type { Kind, Need } from './kinds/kind';
import { missingInput } from './problems/missingInput';
import type { Edit, Fix } from './problems/problem';
import { replacement } from './problems/problem';
import { surplusInput } from './problems/surplusInput';
import type { Scope } from './scope';

export interface GivenKeys {
  readonly given: readonly string[];
  /** What unknown keys may have been meant for: these are not missing, only misspelt. */
  readonly misspelt: readonly string[];
  /** Given by the declaration that this one starts from; what is given anew replaces it. */
  readonly inherited: readonly string[];
  readonly entries: ReadonlyMap<string, Entry>;
}

/** Whether as many inputs are given as the kind needs, neither fewer nor more. */
export function checkNeeds(node: ThingDeclaration, kind: Kind, keys: GivenKeys, scope: Scope): boolean {
  return kind.needs.every((need) => checkNeed(node, kind, need, keys, scope));
}

function checkNeed(node: ThingDeclaration, kind: Kind, need: Need, keys: GivenKeys, scope: Scope): boolean {
  const { count, of } = need;
  const own = of.filter((name) => keys.given.includes(name));
  const kept = own.length >= count ? [] : of.filter((name) => keys.inherited.includes(name) && !own.includes(name));
  const total = own.length + kept.length;
  if (total === count) return true;
  if (total < count) {
    if (of.some((name) => keys.misspelt.includes(name) && !own.includes(name))) return false;
    const fixes = of.filter((name) => !own.includes(name)).map((name) => addition(node, kind, name));
    scope.report(
      missingInput.at(node.name.span, {
        what: kind.title,
        count,
        of,
        given: own,
        fixes: fixes.filter((fix) => fix !== undefined),
      }),
    );
  } else {
    const given = [...own, ...kept];
    const fixes = own
      .map((name) => keys.entries.get(name))
      .filter((entry) => entry !== undefined)
      .map((entry) => removal(node, entry));
    const last = keys.entries.get(own.at(-1) ?? '');
    scope.report(surplusInput.at(last?.key.span ?? node.name.span, { what: kind.title, count, given, fixes }));
  }
  return false;
}

/** Writes a key with a value to begin with, in the manner of the block. */
function addition(node: ThingDeclaration, kind: Kind, name: string): Fix | undefined {
  const key = kind.keys.find((each) => each.name === name);
  if (!key) return undefined;
  const text = `${name} = ${key.example}`;
  return { title: `Add ${text}`, edits: [entryEdit(node, text)] };
}

/** Where and how a further entry is written. */
export function entryEdit(node: ThingDeclaration, text: string): Edit {
  const { block } = node;
  if (!block) return { span: { start: node.span.end, end: node.span.end }, text: ` { ${text} }` };
  const last = block.items.at(-1);
  if (!last) return { span: { start: block.span.start + 1, end: block.span.start + 1 }, text: ` ${text}` };
  const before = block.items.at(-2)?.span.end ?? block.span.start;
  const sameLine = last.span.start - before <= 3;
  return { span: { start: last.span.end, end: last.span.end }, text: sameLine ? `, ${text}` : `\n  ${text}` };
}

/** Takes an entry out together with what separates it from its neighbour. */
export function removal(node: ThingDeclaration, entry: Entry): Fix {
  const items = node.block?.items ?? [];
  const index = items.indexOf(entry);
  const next = items[index + 1];
  const previous = items[index - 1];
  const span = next
    ? { start: entry.span.start, end: next.span.start }
    : { start: previous?.span.end ?? entry.span.start, end: entry.span.end };
  return replacement(span, '', `Remove ${entry.key.text}`);
}
