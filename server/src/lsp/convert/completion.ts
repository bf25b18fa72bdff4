import type { CompletionItem as ProtocolItem } from 'vscode-languageserver';
import { CompletionItemKind, InsertTextFormat } from 'vscode-languageserver';
import type { TextDocument } from 'vscode-languageserver-textdocument';
import type { CompletionItem, CompletionKind } from '../../features/completion/completionItem';
import type { Abilities } from '../abilities';
import { toMarkup } from './markup';
import { toRange } from './range';

const kinds: Readonly<Record<CompletionKind, CompletionItemKind>> = {
  keyword: CompletionItemKind.Keyword,
  kind: CompletionItemKind.Class,
  key: CompletionItemKind.Field,
  name: CompletionItemKind.Variable,
  property: CompletionItemKind.Property,
  unit: CompletionItemKind.Unit,
  gas: CompletionItemKind.Value,
  function: CompletionItemKind.Function,
  constant: CompletionItemKind.Constant,
  word: CompletionItemKind.EnumMember,
  condition: CompletionItemKind.Field,
  quantity: CompletionItemKind.TypeParameter,
  file: CompletionItemKind.File,
};

export function toCompletionItem(
  document: TextDocument,
  item: CompletionItem,
  { markdownCompletion, snippets }: Abilities,
): ProtocolItem {
  const { label, kind, detail, documentation, insertText, snippet, replace, sortText } = item;
  const newText = snippet && !snippets ? withoutStops(insertText) : insertText;
  return {
    label,
    kind: kinds[kind],
    detail,
    sortText,
    filterText: label,
    textEdit: { range: toRange(document, replace), newText },
    insertTextFormat: snippet && snippets ? InsertTextFormat.Snippet : InsertTextFormat.PlainText,
    ...(documentation === undefined
      ? {}
      : { documentation: toMarkup(documentation, { markdown: markdownCompletion }) }),
  };
}

const STOP =
  /\\(?<escaped>[$}\\])|\$\{\d+:(?<text>(?:\\.|[^}\\])*)\}|\$\{\d+\|(?<choice>[^,|]*)[^}]*\}|\$\{\d+\}|\$\d+/g;

/** `${1:10 Pa}` → `10 Pa`, `$0` → nothing, for editors without tab stops. */
function withoutStops(snippet: string): string {
  let plain = '';
  let at = 0;
  for (const { index, 0: stop, groups } of snippet.matchAll(STOP)) {
    const { escaped, text, choice } = groups ?? {};
    plain += snippet.slice(at, index) + (escaped ?? text?.replace(/\\(.)/g, '$1') ?? choice ?? '');
    at = index + stop.length;
  }
  return plain + snippet.slice(at);
}
