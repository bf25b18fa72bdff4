import * as vscode from 'vscode';

interface Starter extends vscode.QuickPickItem {
  /** The file below client/starters/. */
  readonly file: string;
}

/**
 * Opens a starter as an untitled document, so that nothing is written unasked. The walkthrough names the starter's
 * file; otherwise the user is asked.
 */
export async function newFile(extensionUri: vscode.Uri, wanted?: unknown): Promise<void> {
  const starter = starters().find(({ file }) => file === wanted) ?? (await askForStarter());
  if (starter === undefined) return;
  const bytes = await vscode.workspace.fs.readFile(
    vscode.Uri.joinPath(extensionUri, 'client', 'starters', starter.file),
  );
  const content = new TextDecoder().decode(bytes);
  const document = await vscode.workspace.openTextDocument({ language: 'tenuity', content });
  await vscode.window.showTextDocument(document);
}

function askForStarter(): Thenable<Starter | undefined> {
  return vscode.window.showQuickPick(starters(), {
    title: vscode.l10n.t('New gas-state file'),
    placeHolder: vscode.l10n.t('Choose what to start from'),
    matchOnDetail: true,
  });
}

function starters(): readonly Starter[] {
  return [
    {
      file: 'load-lock.gas',
      label: vscode.l10n.t('Load lock'),
      detail: vscode.l10n.t('A chamber is pumped down through a line; two requirements say how fast and how clean.'),
    },
    {
      file: 'freeze-dryer.gas',
      label: vscode.l10n.t('Freeze dryer'),
      detail: vscode.l10n.t('Water vapour flows to the condenser, and heat crosses the gas gap under the tray.'),
    },
    {
      file: 'blank-state.gas',
      label: vscode.l10n.t('Blank state'),
      detail: vscode.l10n.t('One gas at one pressure and temperature.'),
    },
  ];
}
