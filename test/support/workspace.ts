import type { Workspace } from '../../server/src/model/workspace';
import { createWorkspace } from '../../server/src/model/workspace';

/** Where the text under test stands. */
export const MAIN = addressOf('test.gas');

export function addressOf(name: string): string {
  return `file:///${name}`;
}

/** A workspace over texts in memory, by their addresses; what the map holds may change between analyses. */
export function workspaceOf(texts: ReadonlyMap<string, string>): Workspace {
  return createWorkspace({
    read: (uri) => {
      const text = texts.get(uri);
      return text === undefined ? 'missing' : { text };
    },
    resolve: (_from, path) => addressOf(path),
  });
}

/** The texts of a test: the one under test, and others beside it by their relative names. */
export function textsOf(main: string, files: Readonly<Record<string, string>> = {}): Map<string, string> {
  return new Map([[MAIN, main], ...Object.entries(files).map(([name, text]) => [addressOf(name), text] as const)]);
}
