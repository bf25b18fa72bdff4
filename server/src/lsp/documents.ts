import { TextDocument } from 'vscode-languageserver-textdocument';
import type { TextDocumentContentChangeEvent, TextDocumentItem } from 'vscode-languageserver';
import type { Analysis } from '../model/analysis';
import { createWorkspace } from '../model/workspace';
import { canonical, resolveUse } from './address';

/** The texts as they stand: what is open in the editor, else what is on disk. Files are told apart by their canonical address. */
export interface Documents {
  open(item: TextDocumentItem): void;
  change(uri: string, version: number, changes: TextDocumentContentChangeEvent[]): void;
  close(uri: string): void;
  /** The file changed on disk, appeared or went. */
  reload(uri: string): void;
  opened(): Iterable<TextDocument>;
  isOpen(uri: string): boolean;
  /** The canonical address, by which analyses know a file. */
  key(uri: string): string;
  /** The text of a file that is open or has been read. */
  get(uri: string): TextDocument | undefined;
  /** The files that are open or have been read. */
  known(): Iterable<string>;
  /** Reads a file unless its text is known. */
  load(uri: string): Promise<TextDocument | undefined>;
  analyse(uri: string): Analysis;
  /** Settles when every file that this one uses, directly or through others, has been read. */
  settled(uri: string): Promise<void>;
  /** The open files whose analysis looked at this one. */
  dependants(uri: string): readonly string[];
}

interface DocumentsOptions {
  /** The text of a file on disk. */
  readonly read: (uri: string) => Promise<string | undefined>;
  /** A file was read, and its text is not what it was. */
  readonly onArrival: (uri: string) => void;
}

type OnDisk = TextDocument | 'missing' | 'pending';

export function createDocuments({ read, onArrival }: DocumentsOptions): Documents {
  const opened = new Map<string, TextDocument>();
  const onDisk = new Map<string, OnDisk>();
  const reading = new Map<string, Promise<void>>();
  const lookedAt = new Map<string, ReadonlySet<string>>();
  let looking = new Set<string>();

  const get = (uri: string): TextDocument | undefined => {
    const key = canonical(uri);
    const disk = onDisk.get(key);
    return opened.get(key) ?? (typeof disk === 'object' ? disk : undefined);
  };

  /** The text known so far stays until the new one is there. */
  const fetch = (key: string) => {
    if (!onDisk.has(key)) onDisk.set(key, 'pending');
    const turn = read(key).then((text) => {
      // A later read has overtaken this one.
      if (reading.get(key) !== turn) return;
      reading.delete(key);
      const before = onDisk.get(key);
      if (typeof before === 'object' && before.getText() === text) return;
      onDisk.set(key, text === undefined ? 'missing' : TextDocument.create(key, 'tenuity', 0, text));
      if (!opened.has(key)) onArrival(key);
    });
    reading.set(key, turn);
  };

  const workspace = createWorkspace({
    resolve: resolveUse,
    read: (key) => {
      looking.add(key);
      const open = opened.get(key);
      if (open) return { text: open.getText() };
      if (!onDisk.has(key)) fetch(key);
      const disk = onDisk.get(key) ?? 'pending';
      return typeof disk === 'string' ? disk : { text: disk.getText() };
    },
  });

  const analyse = (uri: string): Analysis => {
    const key = canonical(uri);
    looking = new Set();
    const analysis = workspace.analyse(key);
    lookedAt.set(key, looking);
    return analysis;
  };

  return {
    open: ({ uri, languageId, version, text }) => {
      opened.set(canonical(uri), TextDocument.create(uri, languageId, version, text));
    },
    change: (uri, version, changes) => {
      const document = opened.get(canonical(uri));
      if (!document) throw new Error(`${uri} is changed without being open`);
      TextDocument.update(document, changes, version);
    },
    close: (uri) => {
      const key = canonical(uri);
      const document = opened.get(key);
      if (!document) return;
      opened.delete(key);
      lookedAt.delete(key);
      const wanted = [...lookedAt.values()].some((looked) => looked.has(key));
      if (!wanted) {
        onDisk.delete(key);
        workspace.forget(key);
        return;
      }
      // Others use it. What was never saved is on no disk, so its text there is read again.
      onDisk.set(key, TextDocument.create(key, 'tenuity', 0, document.getText()));
      fetch(key);
    },
    reload: (uri) => {
      const key = canonical(uri);
      if (onDisk.has(key)) fetch(key);
    },
    opened: () => opened.values(),
    key: canonical,
    isOpen: (uri) => opened.has(canonical(uri)),
    get,
    known: () =>
      new Set([...opened.keys(), ...[...onDisk].flatMap(([key, disk]) => (typeof disk === 'object' ? [key] : []))]),
    load: async (uri) => {
      const key = canonical(uri);
      if (!opened.has(key) && !onDisk.has(key)) fetch(key);
      await reading.get(key);
      return get(key);
    },
    analyse,
    settled: async (uri) => {
      const key = canonical(uri);
      while (opened.has(key)) {
        analyse(key);
        const waiting = [...(lookedAt.get(key) ?? [])].flatMap((each) =>
          onDisk.get(each) === 'pending' && !opened.has(each) ? (reading.get(each) ?? []) : [],
        );
        if (waiting.length === 0) return;
        await Promise.all(waiting);
      }
    },
    dependants: (uri) => {
      const key = canonical(uri);
      return [...opened.keys()].filter((each) => each !== key && lookedAt.get(each)?.has(key));
    },
  };
}
