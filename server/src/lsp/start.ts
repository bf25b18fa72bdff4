import type { Connection } from 'vscode-languageserver';
import { abilitiesOf } from './abilities';
import { createDocuments } from './documents';
import { createFreshness } from './freshness';
import { createGuard } from './guard';
import { handleColours } from './handlers/colours';
import { handleLifecycle } from './handlers/lifecycle';
import { handleNames } from './handlers/names';
import { handleProblems } from './handlers/problems';
import { handleStructure } from './handlers/structure';
import { handleTexts } from './handlers/texts';
import { handleValues } from './handlers/values';
import { handleWriting } from './handlers/writing';
import { readFileRequest } from './messages';
import type { ReadFileParams } from './messages';
import type { Runtime } from './runtime';
import type { Session } from './session';
import { defaultSettings } from './settings';

/** Serves one client over a connection until it goes. */
export function startServer(connection: Connection, runtime: Runtime): void {
  const guard = createGuard({ ...runtime, log: (message) => connection.console.error(message) });
  const session: Session = {
    connection,
    runtime,
    guard,
    documents: createDocuments({
      read: (uri) =>
        readFile(session, uri).catch((error: unknown) => {
          connection.console.warn(`${uri} cannot be read: ${String(error)}`);
          return undefined;
        }),
      onArrival: (uri) => freshness.changed(uri, 0),
    }),
    settings: defaultSettings,
    abilities: abilitiesOf({ capabilities: {} }),
    folders: [],
  };
  const freshness = createFreshness(session);

  handleLifecycle(session, freshness);
  handleTexts(session, freshness);
  handleProblems(session, freshness);
  handleValues(session, freshness);
  handleWriting(session);
  handleNames(session);
  handleStructure(session);
  handleColours(session, freshness);
  connection.listen();
}

/** By the machine itself where it can, else through the client. */
async function readFile({ abilities, connection, runtime }: Session, uri: string): Promise<string | undefined> {
  const own = runtime.readFile(uri);
  if (own !== 'out-of-reach') return own;
  if (!abilities.files) return undefined;
  const params: ReadFileParams = { uri };
  return (await connection.sendRequest<string | null>(readFileRequest, params)) ?? undefined;
}
