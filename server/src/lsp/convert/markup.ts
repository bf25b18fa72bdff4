import type { MarkupContent } from 'vscode-languageserver';
import { MarkupKind } from 'vscode-languageserver';

/** Markdown for clients that show it; for others the same text, which reads well enough as it is. */
export function toMarkup(text: string, { markdown }: { readonly markdown: boolean }): MarkupContent {
  return { kind: markdown ? MarkupKind.Markdown : MarkupKind.PlainText, value: text };
}
