import type { Sight } from '../../server/src/features/meaning';
import type { Location } from '../../server/src/features/navigation';
import { createWorkspace } from '../../server/src/model/workspace';

const MARK = '<*>';

/** Several open files, each by its name; one of them holds the cursor as `<*>`. */
export function sightOf(files: Readonly<Record<string, string>>): { sight: Sight; uri: string; offset: number } {
  const texts = new Map(
    Object.entries(files).map(([name, text]) => [addressOf(name), text.replace(MARK, '')] as const),
  );
  const workspace = createWorkspace({
    read: (address) => {
      const text = texts.get(address);
      return text === undefined ? 'missing' : { text };
    },
    resolve: (_from, path) => addressOf(path),
  });
  const marked = Object.entries(files).find(([, text]) => text.includes(MARK));
  if (!marked) throw new Error(`no file has the mark ${MARK}`);
  const [name, text] = marked;
  const analyses = [...texts.keys()].map((uri) => workspace.analyse(uri));
  return { sight: { analyses }, uri: addressOf(name), offset: text.indexOf(MARK) };
}

/** `main.gas:3 room`: where a location is and what it reads. */
export function told(sight: Sight, { uri, start, end }: Location): string {
  const text = sight.analyses.find((analysis) => analysis.uri === uri)?.text ?? '';
  const line = text.slice(0, start).split('\n').length;
  return `${uri.slice('file:///'.length)}:${line} ${text.slice(start, end)}`.trimEnd();
}

function addressOf(name: string): string {
  return `file:///${name}`;
}
