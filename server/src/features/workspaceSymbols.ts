import type { Analysis } from '../model/analysis';
import type { SymbolKind } from './outline';
import { symbolKindOf } from './outline';

export interface WorkspaceSymbol {
  readonly name: string;
  readonly kind: SymbolKind;
  readonly uri: string;
  readonly start: number;
  readonly end: number;
}

/** The declared names of all files that hold the letters of the query in order, the closest match first. */
export function workspaceSymbols(analyses: readonly Analysis[], query: string): readonly WorkspaceSymbol[] {
  const wanted = query.toLowerCase();
  return analyses
    .flatMap(({ uri, declared }) =>
      declared.flatMap(({ item, name }) => {
        const distance = name ? distanceOf(name.text.toLowerCase(), wanted) : undefined;
        if (!name || distance === undefined) return [];
        const [start, end] = [item.offset + name.span.start, item.offset + name.span.end];
        return [{ distance, symbol: { name: name.text, kind: symbolKindOf(item.declaration), uri, start, end } }];
      }),
    )
    .sort((a, b) => a.distance - b.distance)
    .map(({ symbol }) => symbol);
}

/** 0 for a name that begins with the query, 1 for one that holds it, 2 for one that holds its letters in order. */
function distanceOf(name: string, query: string): 0 | 1 | 2 | undefined {
  if (name.startsWith(query)) return 0;
  if (name.includes(query)) return 1;
  let at = 0;
  for (const letter of query) {
    at = name.indexOf(letter, at) + 1;
    if (at === 0) return undefined;
  }
  return 2;
}
