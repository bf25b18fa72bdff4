import type { Analysis } from './analysis';
import { createAnalysis } from './analysis';
import type { Document } from './document';
import { createDocument } from './document';
import { createEvaluation } from './evaluation';

/** Where texts come from: an editor, a disk, a test. */
export interface Files {
  /** The text of a file now; `pending` while it is being fetched. */
  read(uri: string): { readonly text: string } | 'missing' | 'pending';
  /** The address of a path written in a file. */
  resolve(from: string, path: string): string;
}

/** All files that are looked at, and their analyses. */
export interface Workspace {
  /** The analysis of a file as its text, and the texts it uses, stand now. */
  analyse(uri: string): Analysis;
  /** Lets go of a file that is closed. */
  forget(uri: string): void;
}

export function createWorkspace(files: Files): Workspace {
  const documents = new Map<string, (text: string) => Document>();
  const analyses = new Map<string, { readonly seen: readonly Seen[]; readonly analysis: Analysis }>();

  const load = (uri: string): Document | 'missing' | 'pending' => {
    const found = files.read(uri);
    if (found === 'missing' || found === 'pending') return found;
    const update = documents.get(uri) ?? createDocument(uri, (path) => files.resolve(uri, path));
    documents.set(uri, update);
    return update(found.text);
  };

  /** The document and all it uses, directly or through others. */
  const survey = (uri: string): ReadonlyMap<string, Seen['document']> => {
    const found = new Map<string, Seen['document']>();
    const waiting = [uri];
    for (let next = waiting.pop(); next !== undefined; next = waiting.pop()) {
      if (found.has(next)) continue;
      const document = load(next);
      found.set(next, document);
      if (typeof document !== 'string') waiting.push(...document.uses.map((use) => use.uri));
    }
    return found;
  };

  return {
    analyse: (uri) => {
      const sight = survey(uri);
      const before = analyses.get(uri);
      if (
        before &&
        before.seen.length === sight.size &&
        before.seen.every((each) => sight.get(each.uri) === each.document)
      )
        return before.analysis;
      const document = sight.get(uri);
      if (document === undefined || typeof document === 'string') return emptyAnalysis(uri);
      const analysis = createAnalysis(document, createEvaluation({ document: (each) => sight.get(each) ?? 'missing' }));
      analysis.problems();
      dropUnused(document);
      analyses.set(uri, { seen: [...sight].map(([each, state]) => ({ uri: each, document: state })), analysis });
      return analysis;
    },
    forget: (uri) => {
      documents.delete(uri);
      analyses.delete(uri);
    },
  };
}

interface Seen {
  readonly uri: string;
  readonly document: Document | 'missing' | 'pending';
}

function emptyAnalysis(uri: string): Analysis {
  const document = createDocument(uri, (path) => path)('');
  return createAnalysis(document, createEvaluation({ document: () => 'missing' }));
}

/** What is declared no longer is forgotten, so that the memo is never larger than the file. */
function dropUnused({ declarations, memo }: Document): void {
  if (memo.size <= declarations.all.length) return;
  const ids = new Set(declarations.all.map(({ id }) => id));
  for (const id of memo.keys()) if (!ids.has(id)) memo.delete(id);
}
