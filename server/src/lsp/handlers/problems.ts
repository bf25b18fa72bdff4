import type { DocumentDiagnosticParams, DocumentDiagnosticReport } from 'vscode-languageserver';
import { DocumentDiagnosticReportKind } from 'vscode-languageserver';
import { diagnostics } from '../../features/diagnostics';
import type { Analysis } from '../../model/analysis';
import { toDiagnostic } from '../convert/diagnostic';
import type { Freshness } from '../freshness';
import { pageRequest } from '../messages';
import type { PageParams } from '../messages';
import { problemPage } from '../pages';
import type { Session } from '../session';

const nothingKnown: DocumentDiagnosticReport = { kind: DocumentDiagnosticReportKind.Full, items: [] };

/** Problems for clients that ask for them, and the pages of their codes. */
export function handleProblems(session: Session, freshness: Freshness): void {
  const { connection, documents, guard } = session;
  const nameOf = createNames();

  connection.languages.diagnostics.on(
    guard.request('diagnostic', nothingKnown, async ({ textDocument, previousResultId }: DocumentDiagnosticParams) => {
      // A name from a file that is still being read is not an unknown name.
      await documents.settled(textDocument.uri);
      const document = documents.get(textDocument.uri);
      if (!document || !documents.isOpen(document.uri)) return nothingKnown;
      const analysis = documents.analyse(document.uri);
      freshness.answered('diagnostics', analysis);
      const resultId = nameOf(analysis);
      if (resultId === previousResultId) return { kind: DocumentDiagnosticReportKind.Unchanged, resultId };
      const items = diagnostics(analysis).map((each) => toDiagnostic(document, each, session));
      return { kind: DocumentDiagnosticReportKind.Full, resultId, items };
    }),
  );

  connection.onRequest(
    pageRequest,
    guard.request('page', null, ({ code }: PageParams) => problemPage(code)),
  );
}

/** Names analyses, so that a client is not told the same twice. */
function createNames(): (analysis: Analysis) => string {
  const names = new WeakMap<Analysis, string>();
  let count = 0;
  return (analysis) => {
    const name = names.get(analysis) ?? String((count += 1));
    names.set(analysis, name);
    return name;
  };
}
