import type { Diagnostic, DocumentDiagnosticParams, DocumentDiagnosticReport } from 'vscode-languageserver';
import { DocumentDiagnosticReportKind } from 'vscode-languageserver';
import type { TextDocument } from 'vscode-languageserver-textdocument';
import { diagnostics } from '../features/diagnostics';
import { hover } from '../features/hover';
import { inlayHints } from '../features/inlayHints';
import type { Analysis } from '../model/analysis';
import { toDiagnostic, toHint, toHover, toOffset, toStretch } from './convert';
import type { Freshness } from './freshness';
import { pageRequest } from './messages';
import type { PageParams } from './messages';
import { problemPage } from './pages';
import type { Session } from './session';

/** One handler for each thing that an editor asks. */
export function registerLanguageFeatures(session: Session, freshness: Freshness): void {
  const { connection, documents, guard } = session;
  const { languages } = connection;
  const resultIds = createResultIds();

  /** A handler for a file that is known; of any other there is nothing to say. */
  const onFile = <P extends { readonly textDocument: { readonly uri: string } }, R>(
    name: string,
    fallback: R,
    answer: (file: OpenFile, params: P) => R,
  ) =>
    guard.request(name, fallback, (params: P) => {
      const document = documents.get(params.textDocument.uri);
      if (!document) return fallback;
      return answer({ document, analysis: documents.analyse(document.uri) }, params);
    });

  connection.onRequest(
    pageRequest,
    guard.request('page', null, ({ code }: PageParams) => problemPage(code)),
  );

  connection.onHover(
    onFile('hover', null, ({ document, analysis }, { position }) =>
      toHover(document, hover(analysis, toOffset(document, position), session.settings.hover), session.abilities),
    ),
  );

  const asProtocol = ({ document, analysis }: OpenFile): Diagnostic[] =>
    diagnostics(analysis).map((each) => toDiagnostic(document, each, session));

  languages.diagnostics.on(
    guard.request('diagnostic', emptyReport, async ({ textDocument, previousResultId }: DocumentDiagnosticParams) => {
      // A name of a file that is still being read is not unknown.
      await documents.settled(textDocument.uri);
      const document = documents.get(textDocument.uri);
      if (!document || !documents.isOpen(textDocument.uri)) return emptyReport;
      const analysis = documents.analyse(textDocument.uri);
      freshness.answered('diagnostics', analysis);
      const resultId = resultIds.of(analysis);
      return resultId === previousResultId
        ? { kind: DocumentDiagnosticReportKind.Unchanged, resultId }
        : { kind: DocumentDiagnosticReportKind.Full, resultId, items: asProtocol({ document, analysis }) };
    }),
  );

  languages.inlayHint.on(
    onFile('inlayHint', [], ({ document, analysis }, { range }) => {
      freshness.answered('hints', analysis);
      return inlayHints(analysis, toStretch(document, range), session.settings.hints).map((hint) =>
        toHint(document, hint),
      );
    }),
  );
}

const emptyReport: DocumentDiagnosticReport = { kind: DocumentDiagnosticReportKind.Full, items: [] };

interface OpenFile {
  readonly document: TextDocument;
  readonly analysis: Analysis;
}

/** Names analyses, so that a client need not be told the same twice. */
function createResultIds(): { of(analysis: Analysis): string } {
  const ids = new WeakMap<Analysis, string>();
  let count = 0;
  return {
    of: (analysis) => {
      const id = ids.get(analysis) ?? String((count += 1));
      ids.set(analysis, id);
      return id;
    },
  };
}
