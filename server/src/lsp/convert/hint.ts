import type { InlayHint } from 'vscode-languageserver';
import type { TextDocument } from 'vscode-languageserver-textdocument';
import type { Hint } from '../../features/inlayHints';
import { toMarkup } from './markup';

/** The protocol's kinds of hints, types and parameters, are neither of ours. */
export function toHint(document: TextDocument, { offset, label, tooltip }: Hint): InlayHint {
  return {
    position: document.positionAt(offset),
    label,
    paddingLeft: true,
    tooltip: toMarkup(tooltip, { markdown: true }),
  };
}
