import assert from 'node:assert/strict';
import { readFileSync, readdirSync } from 'node:fs';
import { parseUnit } from '../../server/src/quantities/parseUnit';
import { children } from '../../server/src/syntax/children';
import type { Node } from '../../server/src/syntax/nodes';
import { parse } from '../../server/src/syntax/parse';

interface Snippet {
  readonly prefix: string;
  readonly description: string;
  readonly body: readonly string[];
}

const snippets = JSON.parse(readFileSync('grammar/gas-state.snippets.json', 'utf8')) as Record<string, Snippet>;

describe('snippets', () => {
  it('are a declaration without fault, whichever choices are taken', () => {
    for (const [name, { body }] of Object.entries(snippets)) {
      for (const text of expand(body.join('\n'))) assert.deepEqual(faults(text), [], `${name}: ${text}`);
    }
  });

  it('number their tab stops without a gap and end behind the declaration', () => {
    for (const [name, { body }] of Object.entries(snippets)) {
      const stops = [...body.join('\n').matchAll(/\$\{?(\d+)/g)].map(([, stop]) => Number(stop));
      const highest = Math.max(...stops);
      assert.deepEqual(
        [...new Set(stops)].sort((a, b) => a - b),
        Array.from({ length: highest + 1 }, (_, k) => k),
        name,
      );
      assert.equal(body.at(-1), '$0', name);
    }
  });

  it('are described in a phrase', () => {
    for (const [name, { prefix, description }] of Object.entries(snippets)) {
      assert.match(prefix, /^[a-z]+( [a-z]+)?$/, name);
      assert.match(description, /^[A-Z].{8,70}[^.]$/, name);
    }
  });
});

describe('starters', () => {
  for (const file of readdirSync('client/starters')) {
    it(`${file} is free of faults`, () => {
      assert.deepEqual(faults(readFileSync(`client/starters/${file}`, 'utf8')), []);
    });
  }
});

/** The texts that a snippet can become: as many as its longest list of choices. */
function expand(body: string): readonly string[] {
  const choices = [...body.matchAll(/\$\{\d+\|([^|]*)\|\}/g)].map(([, list = '']) => list.split(',').length);
  return Array.from({ length: Math.max(1, ...choices) }, (_, turn) =>
    body
      .replace(/\$\{\d+\|([^|]*)\|\}/g, (_all, list: string) => {
        const words = list.split(',');
        return words[turn % words.length] ?? '';
      })
      .replace(/\$\{\d+:([^}]*)\}/g, '$1')
      .replace(/\$0/g, ''),
  );
}

/** What is missing, superfluous or an unknown unit, by its text. */
function faults(text: string): readonly string[] {
  return parse(text).items.flatMap(({ declaration }) => nodeFaults(declaration));
}

function nodeFaults(node: Node): readonly string[] {
  const inner = children(node).flatMap(nodeFaults);
  switch (node.kind) {
    case 'hole':
      return [`missing: ${node.expected}`, ...inner];
    case 'junk':
      return [`junk: ${node.text}`, ...inner];
    case 'stray':
      return [`stray: ${node.word.text}`, ...inner];
    case 'unit':
      return parseUnit(node.text).ok ? inner : [`unit: ${node.text}`, ...inner];
    default:
      return inner;
  }
}
