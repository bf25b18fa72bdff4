import type { CancellationToken, ResponseError } from 'vscode-languageserver';
import type { TextDocument } from 'vscode-languageserver-textdocument';
import type { Analysis } from '../../model/analysis';
import type { Session } from '../session';

/** A file that a request is about, and what there is to say of it. Both are of the same moment. */
export interface KnownFile {
  readonly document: TextDocument;
  readonly analysis: Analysis;
}

interface AboutFile {
  readonly textDocument: { readonly uri: string };
}

/** Makes handlers for requests about one file; of a file that is not known there is nothing to say. */
export function onFile({ documents, guard }: Session) {
  return <P extends AboutFile, R>(
    name: string,
    fallback: R,
    answer: (file: KnownFile, params: P) => R,
  ): ((params: P, token: CancellationToken) => Promise<R | ResponseError<never>>) =>
    guard.request(name, fallback, (params: P) => {
      const document = documents.get(params.textDocument.uri);
      return document ? answer({ document, analysis: documents.analyse(document.uri) }, params) : fallback;
    });
}
