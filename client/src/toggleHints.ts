import * as vscode from 'vscode';

const SECTION = 'tenuity.hints';
const KEY = 'enabled';
const LAST_CHOICE = 'hints.lastChoice';

type HintsShown = 'all' | 'failing' | 'off';

/** Turns the value hints off, or back on as they were shown before. */
export async function toggleHints(memory: vscode.Memento): Promise<void> {
  const settings = vscode.workspace.getConfiguration(SECTION);
  const current = settings.get<HintsShown>(KEY, 'all');
  if (current !== 'off') await memory.update(LAST_CHOICE, current);
  const next = current === 'off' ? memory.get<HintsShown>(LAST_CHOICE, 'all') : 'off';
  await settings.update(KEY, next, targetInForce(settings));
}

/** The workspace's own setting hides the user's, so that only a change in the workspace would be seen. */
function targetInForce(settings: vscode.WorkspaceConfiguration): vscode.ConfigurationTarget {
  return settings.inspect(KEY)?.workspaceValue === undefined
    ? vscode.ConfigurationTarget.Global
    : vscode.ConfigurationTarget.Workspace;
}
