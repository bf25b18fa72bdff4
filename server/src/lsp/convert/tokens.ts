import type { SemanticTokensBuilder, SemanticTokensLegend } from 'vscode-languageserver';
import type { TextDocument } from 'vscode-languageserver-textdocument';
import type { SemanticModifier, SemanticToken, SemanticType } from '../../features/semanticTokens';

const types: Readonly<Record<SemanticType, number>> = {
  keyword: 0,
  type: 1,
  variable: 2,
  property: 3,
  number: 4,
  unit: 5,
  string: 6,
  operator: 7,
  function: 8,
  comment: 9,
  gas: 10,
};

const modifiers: Readonly<Record<SemanticModifier, number>> = { declaration: 0, readonly: 1, defaultLibrary: 2 };

/** The numbers above are places in these lists. */
export const tokensLegend: SemanticTokensLegend = {
  tokenTypes: Object.keys(types),
  tokenModifiers: Object.keys(modifiers),
};

export function pushTokens(
  builder: SemanticTokensBuilder,
  document: TextDocument,
  tokens: readonly SemanticToken[],
): void {
  for (const { start, length, type, modifiers: own } of tokens) {
    const { line, character } = document.positionAt(start);
    const bits = own.reduce((sum, each) => sum | (1 << modifiers[each]), 0);
    builder.push(line, character, length, types[type], bits);
  }
}
