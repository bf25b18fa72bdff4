import type { InitializeParams } from 'vscode-languageserver';
import { DidChangeConfigurationNotification, DidChangeWatchedFilesNotification } from 'vscode-languageserver';
import { version } from '../../../../package.json';
import { abilitiesOf } from '../abilities';
import { capabilitiesFor } from '../capabilities';
import type { Freshness } from '../freshness';
import type { Session } from '../session';
import type { Settings } from '../settings';
import { readSettings, section } from '../settings';

/** How a client and the server get to know each other, and the settings while they are together. */
export function handleLifecycle(session: Session, freshness: Freshness): void {
  const { connection, guard } = session;
  const { client, workspace } = connection;

  const take = (settings: Settings) => {
    if (JSON.stringify(settings) === JSON.stringify(session.settings)) return;
    session.settings = settings;
    freshness.settingsChanged();
  };
  /** What the client refuses is done without. */
  const unless = (name: string, request: Promise<unknown>) =>
    void request.catch((error: unknown) => guard.report(name, error));
  const askForSettings = () => {
    const answer = workspace.getConfiguration(section) as Promise<unknown>;
    unless(
      'settings',
      answer.then((given) => take(readSettings(given))),
    );
  };

  connection.onInitialize((params: InitializeParams) => {
    session.abilities = abilitiesOf(params);
    session.folders = params.workspaceFolders?.map(({ uri }) => uri) ?? [];
    return { serverInfo: { name: 'tenuity', version }, capabilities: capabilitiesFor(session.abilities) };
  });

  connection.onInitialized(() => {
    const { configuration, registersConfiguration, registersWatchers, folders } = session.abilities;
    if (configuration) askForSettings();
    if (registersConfiguration) {
      unless('settings', client.register(DidChangeConfigurationNotification.type, { section }));
    }
    if (registersWatchers) {
      const watchers = [{ globPattern: '**/*.gas' }];
      unless('watched files', client.register(DidChangeWatchedFilesNotification.type, { watchers }));
    }
    if (folders) {
      workspace.onDidChangeWorkspaceFolders(({ added, removed }) => {
        const gone = new Set(removed.map(({ uri }) => uri));
        session.folders = [...session.folders.filter((uri) => !gone.has(uri)), ...added.map(({ uri }) => uri)];
      });
    }
  });

  connection.onDidChangeConfiguration(
    guard.notification('didChangeConfiguration', ({ settings }: { settings?: { [section]?: unknown } }) => {
      if (session.abilities.configuration) askForSettings();
      else take(readSettings(settings?.[section]));
    }),
  );
}
