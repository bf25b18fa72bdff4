import * as vscode from 'vscode';
import { pageRequest } from '../../server/src/lsp/messages';
import type { PageParams } from '../../server/src/lsp/messages';
import type { LanguageServer } from './languageServer';

/** The pages behind the codes of problems, written by the server: `tenuity:/problems/<code>.md`. */
export function registerPages(server: LanguageServer): vscode.Disposable {
  return vscode.workspace.registerTextDocumentContentProvider('tenuity', {
    provideTextDocumentContent: async ({ path }) => {
      const params: PageParams = { code: path.replace(/^.*\//, '').replace(/\.md$/, '') };
      const page = await server.request<string | null>(pageRequest, params);
      return page ?? vscode.l10n.t('There is no page for {0}.', params.code);
    },
  });
}
