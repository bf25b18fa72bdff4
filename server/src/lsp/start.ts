import type { Connection, WorkspaceFolder } from 'vscode-languageserver';
import { DidChangeConfigurationNotification, DidChangeWatchedFilesNotification } from 'vscode-languageserver';
import { version } from '../../../package.json';
import type { Abilities } from './abilities';
import { abilitiesOf } from './abilities';
import { capabilitiesFor } from './capabilities';
import { createDocuments } from './documents';
import type { Freshness } from './freshness';
import { createFreshness } from './freshness';
import { createGuard } from './guard';
import { handleColours } from './handlers/colours';
import { handleNames } from './handlers/names';
import { handleProblems } from './handlers/problems';
import { handleStructure } from './handlers/structure';
import { handleValues } from './handlers/values';
import { handleWriting } from './handlers/writing';
import { readFileRequest } from './messages';
import type { ReadFileParams } from './messages';
import type { Runtime } from './runtime';
import type { Session } from './session';
import type { Settings } from './settings';
import { defaultSettings, readSettings, section } from './settings';

/** Serves one client over a connection until it goes. */
export function startServer(connection: Connection, runtime: Runtime): void {
  let abilities: Abilities = abilitiesOf({ capabilities: {} });
  let settings = defaultSettings;
  let folders: readonly string[] = [];

  const guard = createGuard({ ...runtime, log: (message) => connection.console.error(message) });
  const documents = createDocuments({
    read: async (uri) => {
      try {
        const found = runtime.readFile(uri);
        return found === 'out-of-reach' ? await askForFile(uri) : await found;
      } catch (error) {
        connection.console.warn(`${uri} cannot be read: ${String(error)}`);
        return undefined;
      }
    },
    onArrival: (uri) => freshness.changed(uri, 0),
  });
  const session: Session = {
    connection,
    runtime,
    guard,
    documents,
    get abilities() {
      return abilities;
    },
    get settings() {
      return settings;
    },
    get folders() {
      return folders;
    },
  };
  const freshness: Freshness = createFreshness(session);

  const askForFile = async (uri: string): Promise<string | undefined> => {
    if (!abilities.files) return undefined;
    const params: ReadFileParams = { uri };
    return (await connection.sendRequest<string | null>(readFileRequest, params)) ?? undefined;
  };

  const take = (next: Settings) => {
    if (JSON.stringify(next) === JSON.stringify(settings)) return;
    settings = next;
    freshness.settingsChanged();
  };
  const pullSettings = () => {
    connection.workspace
      .getConfiguration(section)
      .then((given: unknown) => take(readSettings(given)))
      .catch((error: unknown) => guard.report('settings', error));
  };

  connection.onInitialize((params) => {
    abilities = abilitiesOf(params);
    folders = params.workspaceFolders?.map(({ uri }) => uri) ?? [];
    return { serverInfo: { name: 'tenuity', version }, capabilities: capabilitiesFor(abilities) };
  });

  connection.onInitialized(() => {
    if (abilities.configuration) pullSettings();
    if (abilities.registersConfiguration) {
      void connection.client.register(DidChangeConfigurationNotification.type, { section });
    }
    if (abilities.registersWatchers) {
      const watchers = [{ globPattern: '**/*.gas' }];
      void connection.client.register(DidChangeWatchedFilesNotification.type, { watchers });
    }
    if (abilities.folders)
      connection.workspace.onDidChangeWorkspaceFolders(({ added, removed }) => {
        const gone = new Set(removed.map(({ uri }: WorkspaceFolder) => uri));
        folders = [...folders.filter((uri) => !gone.has(uri)), ...added.map(({ uri }) => uri)];
      });
  });

  connection.onDidChangeConfiguration(
    guard.notification('didChangeConfiguration', ({ settings: given }: { settings?: { [section]?: unknown } }) => {
      if (abilities.configuration) pullSettings();
      else take(readSettings(given?.[section]));
    }),
  );
  connection.onDidChangeWatchedFiles(
    guard.notification('didChangeWatchedFiles', ({ changes }) => {
      for (const { uri } of changes) documents.reload(uri);
    }),
  );

  connection.onDidOpenTextDocument(
    guard.notification('didOpen', ({ textDocument }) => {
      documents.open(textDocument);
      freshness.changed(textDocument.uri, 0);
    }),
  );
  connection.onDidChangeTextDocument(
    guard.notification('didChange', ({ textDocument, contentChanges }) => {
      documents.change(textDocument.uri, textDocument.version, contentChanges);
      freshness.changed(textDocument.uri);
    }),
  );
  connection.onDidCloseTextDocument(
    guard.notification('didClose', ({ textDocument }) => {
      documents.close(textDocument.uri);
      freshness.closed(textDocument.uri);
      freshness.changed(textDocument.uri);
    }),
  );

  handleProblems(session, freshness);
  handleValues(session, freshness);
  handleWriting(session);
  handleNames(session);
  handleStructure(session);
  handleColours(session, freshness);
  connection.listen();
}
