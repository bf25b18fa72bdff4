import type { CodeDescription, Diagnostic as ProtocolDiagnostic } from 'vscode-languageserver';
import { DiagnosticSeverity, DiagnosticTag } from 'vscode-languageserver';
import type { TextDocument } from 'vscode-languageserver-textdocument';
import type { Diagnostic } from '../../features/diagnostics';
import type { Severity } from '../../model/problems/problem';
import { pageAddress } from '../pages';
import type { Session } from '../session';
import { toRange } from './range';

const severities: Readonly<Record<Severity, DiagnosticSeverity>> = {
  error: DiagnosticSeverity.Error,
  warning: DiagnosticSeverity.Warning,
  information: DiagnosticSeverity.Information,
  hint: DiagnosticSeverity.Hint,
};

export function toDiagnostic(
  document: TextDocument,
  found: Diagnostic,
  { abilities, documents }: Pick<Session, 'abilities' | 'documents'>,
): ProtocolDiagnostic {
  const { code, message, severity, unnecessary } = found;
  const related = found.related.flatMap(({ message: why, uri, ...place }) => {
    const other = documents.get(uri);
    return other ? [{ message: why, location: { uri: other.uri, range: toRange(other, place) } }] : [];
  });
  return {
    range: toRange(document, found),
    severity: severities[severity],
    source: 'tenuity',
    code,
    message,
    ...(abilities.codeDescription && abilities.pages ? { codeDescription: describedAt(code) } : {}),
    ...(abilities.tags && unnecessary ? { tags: [DiagnosticTag.Unnecessary] } : {}),
    ...(abilities.relatedInformation && related.length > 0 ? { relatedInformation: related } : {}),
  };
}

function describedAt(code: string): CodeDescription {
  return { href: pageAddress(code) };
}
