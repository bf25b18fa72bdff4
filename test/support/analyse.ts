import type { Analysis } from '../../server/src/model/analysis';
import { createWorkspace } from '../../server/src/model/workspace';

const MAIN = 'file:///test.gas';

/** The analysis of a text; other files stand beside it under their relative names. */
export function analyse(
  text: string,
  { files = {} }: { readonly files?: Readonly<Record<string, string>> } = {},
): Analysis {
  const texts = new Map([
    [MAIN, text],
    ...Object.entries(files).map(([name, other]) => [addressOf(name), other] as const),
  ]);
  const workspace = createWorkspace({
    read: (uri) => {
      const found = texts.get(uri);
      return found === undefined ? 'missing' : { text: found };
    },
    resolve: (_from, path) => addressOf(path),
  });
  return workspace.analyse(MAIN);
}

/** A text with the mark `<*>` taken out, and where the mark stood. */
export function cursor(marked: string): { readonly text: string; readonly offset: number } {
  const offset = marked.indexOf('<*>');
  if (offset < 0) throw new Error('the text has no mark <*>');
  return { text: marked.replace('<*>', ''), offset };
}

function addressOf(name: string): string {
  return `file:///${name}`;
}
