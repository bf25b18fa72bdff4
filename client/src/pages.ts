import * as vscode from 'vscode';
import { pageRequest } from '../../server/src/lsp/messages';
import type { PageParams } from '../../server/src/lsp/messages';
import type { LanguageServer } from './languageServer';

/** The pages behind the codes of problems, written by the server: `tenuity:/problems/<code>.md`. Without a page there is no document. */
export function registerPages(server: LanguageServer): vscode.Disposable {
  return vscode.workspace.registerTextDocumentContentProvider('tenuity', {
    provideTextDocumentContent: ({ path }) => {
      const params: PageParams = { code: path.replace(/^.*\//, '').replace(/\.md$/, '') };
      return server.request<string | null>(pageRequest, params);
    },
  });
}
