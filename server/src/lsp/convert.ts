import type {
  CodeDescription,
  Diagnostic as ProtocolDiagnostic,
  Hover as ProtocolHover,
  InlayHint,
  MarkupContent,
  Position,
  Range,
} from 'vscode-languageserver';
import { DiagnosticSeverity, DiagnosticTag, InlayHintKind, MarkupKind } from 'vscode-languageserver';
import type { TextDocument } from 'vscode-languageserver-textdocument';
import type { Diagnostic } from '../features/diagnostics';
import type { Hover } from '../features/hover';
import type { Hint } from '../features/inlayHints';
import type { Severity } from '../model/problems/problem';
import type { Abilities } from './abilities';
import type { Documents } from './documents';
import { pageAddress } from './pages';

/** The only place where offsets become lines and characters, and plain data becomes the protocol's. */

/** A stretch of a text in UTF-16 units. */
export interface Stretch {
  readonly start: number;
  readonly end: number;
}

export function toRange(document: TextDocument, { start, end }: Stretch): Range {
  return { start: document.positionAt(start), end: document.positionAt(end) };
}

export function toStretch(document: TextDocument, { start, end }: Range): Stretch {
  return { start: document.offsetAt(start), end: document.offsetAt(end) };
}

export function toOffset(document: TextDocument, position: Position): number {
  return document.offsetAt(position);
}

const severities: Readonly<Record<Severity, DiagnosticSeverity>> = {
  error: DiagnosticSeverity.Error,
  warning: DiagnosticSeverity.Warning,
  information: DiagnosticSeverity.Information,
  hint: DiagnosticSeverity.Hint,
};

export function toDiagnostic(
  document: TextDocument,
  found: Diagnostic,
  { abilities, documents }: { readonly abilities: Abilities; readonly documents: Documents },
): ProtocolDiagnostic {
  const { code, message, severity, unnecessary } = found;
  return {
    range: toRange(document, found),
    severity: severities[severity],
    source: 'tenuity',
    code,
    message,
    ...(abilities.codeDescription && abilities.pages ? { codeDescription: describedAt(code) } : {}),
    ...(abilities.tags && unnecessary ? { tags: [DiagnosticTag.Unnecessary] } : {}),
    ...(abilities.relatedInformation && found.related.length > 0
      ? {
          relatedInformation: found.related.flatMap(({ message: why, uri, ...place }) => {
            const other = documents.get(uri);
            return other ? [{ message: why, location: { uri: other.uri, range: toRange(other, place) } }] : [];
          }),
        }
      : {}),
  };
}

function describedAt(code: string): CodeDescription {
  return { href: pageAddress(code) };
}

/** Markdown for clients that show it; for others the same, which reads well enough as it is. */
function toMarkup(text: string, markdown: boolean): MarkupContent {
  return { kind: markdown ? MarkupKind.Markdown : MarkupKind.PlainText, value: text };
}

export function toHover(
  document: TextDocument,
  found: Hover | undefined,
  { markdownHover }: Abilities,
): ProtocolHover | null {
  return found ? { contents: toMarkup(found.markdown, markdownHover), range: toRange(document, found) } : null;
}

export function toHint(document: TextDocument, { offset, label, tooltip, kind }: Hint): InlayHint {
  return {
    position: document.positionAt(offset),
    label,
    paddingLeft: true,
    tooltip: toMarkup(tooltip, true),
    ...(kind === 'value' ? { kind: InlayHintKind.Type } : {}),
  };
}
