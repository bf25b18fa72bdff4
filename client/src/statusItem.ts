import * as vscode from 'vscode';
import { commands } from './commands';
import type { ServerState } from './languageServer';

/** The entry behind the `{}` of the status bar: how the server is, and what can be done about it. */
export function createStatusItem(): vscode.LanguageStatusItem {
  const item = vscode.languages.createLanguageStatusItem('tenuity.server', { language: 'tenuity' });
  item.name = vscode.l10n.t('Gas State language server');
  return item;
}

export function showState(item: vscode.LanguageStatusItem, state: ServerState): void {
  item.busy = state.kind === 'starting';
  item.severity =
    state.kind === 'stopped' ? vscode.LanguageStatusSeverity.Error : vscode.LanguageStatusSeverity.Information;
  switch (state.kind) {
    case 'starting':
      item.text = vscode.l10n.t('Starting');
      item.detail = '';
      item.command = { title: vscode.l10n.t('Show log'), command: commands.showLog };
      return;
    case 'running':
      item.text = vscode.l10n.t('Ready');
      item.detail = state.version === undefined ? '' : vscode.l10n.t('Version {0}', state.version);
      item.command = { title: vscode.l10n.t('Show log'), command: commands.showLog };
      return;
    case 'stopped':
      item.text = vscode.l10n.t('Stopped');
      item.detail = vscode.l10n.t('Figures and problems are not kept up to date');
      item.command = { title: vscode.l10n.t('Restart'), command: commands.restartServer };
      return;
  }
}
