import type { Sight } from '../features/meaning';
import { listFilesRequest } from './messages';
import type { Session } from './session';

/** Every gas-state file of the workspace, read where that has not happened yet: what is renamed may be used anywhere. */
export async function loadWorkspace(session: Session): Promise<Sight> {
  const { abilities, documents } = session;
  // Where nobody tells of changes on disk, what was read before may be old.
  if (!abilities.registersWatchers) for (const uri of documents.known()) documents.reload(uri);
  await Promise.all((await listFiles(session)).map((uri) => documents.load(uri)));
  return { analyses: [...documents.known()].map((uri) => documents.analyse(uri)) };
}

async function listFiles({ connection, runtime, abilities, folders }: Session): Promise<readonly string[]> {
  const lists = folders.map((folder) => runtime.listFiles(folder));
  const within = await Promise.all(lists.filter((list) => list !== 'out-of-reach'));
  const asked = lists.includes('out-of-reach') && abilities.files;
  return [...within.flat(), ...(asked ? await connection.sendRequest<string[]>(listFilesRequest) : [])];
}
