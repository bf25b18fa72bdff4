import type { CodeAction as ProtocolAction, Diagnostic } from 'vscode-languageserver';
import { CodeActionKind } from 'vscode-languageserver';
import type { TextDocument } from 'vscode-languageserver-textdocument';
import type { CodeAction } from '../../features/codeActions';
import type { Session } from '../session';
import { toWorkspaceEdit } from './edit';

export const fixAllKind = `${CodeActionKind.SourceFixAll}.tenuity`;

/** `refactor` asks for everything below it; without a wish everything is asked for. */
export function isAsked(kind: string, only: readonly string[] | undefined): boolean {
  return only === undefined || only.some((wish) => wish === '' || kind === wish || kind.startsWith(`${wish}.`));
}

export function toCodeAction(
  document: TextDocument,
  { title, kind, edits, preferred, code }: CodeAction,
  { session, diagnostics }: { readonly session: Session; readonly diagnostics: readonly Diagnostic[] },
): ProtocolAction {
  const mended = code === undefined ? [] : diagnostics.filter((each) => each.code === code);
  return {
    title,
    kind,
    edit: toWorkspaceEdit(new Map([[document.uri, edits]]), session),
    ...(preferred ? { isPreferred: true } : {}),
    ...(mended.length > 0 ? { diagnostics: mended } : {}),
  };
}
