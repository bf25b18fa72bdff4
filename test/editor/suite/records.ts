// What the tests ask the editor, in the words of the tests.
import * as vscode from 'vscode';
import { ok } from './assert';
import { until } from './until';

const EXTENSION = 'tenuity.tenuity';

/** As many code actions as this arrive with their edit worked out. */
const ALL_RESOLVED = 100;
const ATTEMPTS = 10;

/** Ends when the language server has told of a problem, so that it answers everything asked afterwards. */
export async function startTenuity(): Promise<void> {
  const extension = vscode.extensions.getExtension(EXTENSION);
  ok(extension, `the extension ${EXTENSION}`);
  await extension.activate();
  await diagnosticAppears(await openRecord('slip.gas'), 'unit-mismatch');
}

/** Shows a file of the workspace. */
export async function openRecord(name: string): Promise<vscode.TextDocument> {
  const folder = vscode.workspace.workspaceFolders?.[0];
  ok(folder, 'the workspace folder');
  const document = await vscode.workspace.openTextDocument(vscode.Uri.joinPath(folder.uri, name));
  await vscode.window.showTextDocument(document);
  return document;
}

/** Where a piece of the text stands; the piece must occur. */
export function placeOf(document: vscode.TextDocument, piece: string): vscode.Range {
  const offset = document.getText().indexOf(piece);
  ok(offset >= 0, `${JSON.stringify(piece)} in ${document.fileName}`);
  return new vscode.Range(document.positionAt(offset), document.positionAt(offset + piece.length));
}

/** Waits for a diagnostic with this code. */
export function diagnosticAppears(document: vscode.TextDocument, code: string): Promise<vscode.Diagnostic> {
  return until(vscode.languages.onDidChangeDiagnostics, () => findDiagnostic(document, code), `diagnostic ${code}`);
}

/** Waits until no diagnostic has this code. */
export async function diagnosticVanishes(document: vscode.TextDocument, code: string): Promise<void> {
  const gone = () => (findDiagnostic(document, code) ? undefined : true);
  await until(vscode.languages.onDidChangeDiagnostics, gone, `end of diagnostic ${code}`);
}

/** The text of every inlay hint of the document, one a line. */
export async function hintsOf(document: vscode.TextDocument): Promise<string> {
  const whole = document.validateRange(new vscode.Range(0, 0, document.lineCount, 0));
  const hints = await vscode.commands.executeCommand<vscode.InlayHint[]>(
    'vscode.executeInlayHintProvider',
    document.uri,
    whole,
  );
  return hints.map(labelOf).join('\n');
}

/** What hovering shows, as markdown. */
export async function hoverAt(document: vscode.TextDocument, place: vscode.Range): Promise<string> {
  const hovers = await vscode.commands.executeCommand<vscode.Hover[]>(
    'vscode.executeHoverProvider',
    document.uri,
    place.start,
  );
  return hovers
    .flatMap((hover) =>
      hover.contents.map((content) => (content instanceof vscode.MarkdownString ? content.value : '')),
    )
    .join('\n');
}

/**
 * The quick fixes that the editor offers at a place. VS Code drops all answers when any extension registers a provider
 * of fixes meanwhile, as its own do in the first seconds; so it is asked again a few times.
 */
export async function quickFixes(document: vscode.TextDocument, place: vscode.Range): Promise<vscode.CodeAction[]> {
  for (let attempt = 1; ; attempt++) {
    const actions = await vscode.commands.executeCommand<vscode.CodeAction[]>(
      'vscode.executeCodeActionProvider',
      document.uri,
      place,
      vscode.CodeActionKind.QuickFix.value,
      ALL_RESOLVED,
    );
    if (actions.length > 0 || attempt === ATTEMPTS) return actions.filter((action) => action.edit !== undefined);
  }
}

function findDiagnostic(document: vscode.TextDocument, code: string): vscode.Diagnostic | undefined {
  return vscode.languages.getDiagnostics(document.uri).find((diagnostic) => codeOf(diagnostic) === code);
}

function codeOf({ code }: vscode.Diagnostic): string | number | undefined {
  return typeof code === 'object' ? code.value : code;
}

function labelOf({ label }: vscode.InlayHint): string {
  return typeof label === 'string' ? label : label.map((part) => part.value).join('');
}
