import { readFileSync } from 'node:fs';
import { INITIAL } from 'vscode-textmate';
import type { IGrammar } from 'vscode-textmate';
import { createRegistryFromGrammars } from 'vscode-tmgrammar-test/dist/common/index';

/** The TextMate grammars as the manifest contributes them, in a Markdown that knows nothing but them. */
export const registry = createRegistryFromGrammars([
  { grammar: { path: 'gas.json', scopeName: 'source.tenuity' }, content: grammarText('gas-state') },
  {
    grammar: { path: 'code.json', scopeName: 'markdown.tenuity.codeblock', injectTo: ['text.html.markdown'] },
    content: grammarText('markdown'),
  },
  {
    grammar: { path: 'markdown.json', scopeName: 'text.html.markdown' },
    content: JSON.stringify({ scopeName: 'text.html.markdown', patterns: [] }),
  },
]);

export async function load(scopeName: string): Promise<IGrammar> {
  const grammar = await registry.loadGrammar(scopeName);
  if (grammar === null) throw new Error(`no grammar ${scopeName}`);
  return grammar;
}

export interface Token {
  readonly text: string;
  readonly scope: string;
}

/** The tokens of each line with their innermost scope; white space has none. */
export function colour(grammar: IGrammar, text: string): readonly (readonly Token[])[] {
  let stack = INITIAL;
  return text.split('\n').map((line) => {
    const { tokens, ruleStack } = grammar.tokenizeLine(line, stack);
    stack = ruleStack;
    return tokens
      .map(({ startIndex, endIndex, scopes }) => ({
        text: line.slice(startIndex, endIndex),
        scope: scopes.at(-1) ?? '',
      }))
      .filter(({ text }) => text.trim() !== '');
  });
}

function grammarText(name: string): string {
  return readFileSync(`grammar/${name}.tmLanguage.json`, 'utf8');
}
