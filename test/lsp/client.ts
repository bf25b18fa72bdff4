import type {
  ClientCapabilities,
  Diagnostic,
  InitializeResult,
  MessageReader,
  MessageWriter,
  Position,
  PublishDiagnosticsParams,
  Range,
} from 'vscode-languageserver-protocol/node';
import { CancellationTokenSource, createMessageConnection } from 'vscode-languageserver-protocol/node';
import { TextDocument } from 'vscode-languageserver-textdocument';

/** Something the server sent of its own accord. */
export interface Message {
  readonly method: string;
  readonly params: unknown;
}

export interface ClientOptions {
  readonly capabilities?: ClientCapabilities;
  readonly initializationOptions?: unknown;
  readonly folders?: readonly string[];
  /** Answers to the server's requests, by method; others are answered with null. */
  readonly answers?: Readonly<Record<string, (params: never) => unknown>>;
}

/** An editor without a window: it keeps the texts, and everything that the server says. */
export interface Client {
  readonly initialized: InitializeResult;
  readonly messages: readonly Message[];
  request<R>(method: string, params: unknown): Promise<R>;
  /** A request, and how to call it off. */
  cancellable<R>(method: string, params: unknown): { readonly answer: Promise<R>; cancel(): void };
  notify(method: string, params: unknown): void;
  /** The first message of a method, from the given one on, that satisfies; waits for it to come. */
  next<P>(method: string, options?: NextOptions<P>): Promise<P>;
  open(uri: string, text: string): OpenFile;
}

interface NextOptions<P> {
  readonly since?: number;
  readonly when?: (params: P) => boolean;
}

export interface OpenFile {
  readonly uri: string;
  readonly document: TextDocument;
  /** Puts text in the place of a stretch, as an incremental change. */
  replace(start: number, end: number, text: string): void;
  /** Several changes in one notification, each counted in the text that the one before has left. */
  replaceAll(changes: readonly { readonly start: number; readonly end: number; readonly text: string }[]): void;
  close(): void;
  at(mark: string): Position;
  range(mark: string): Range;
  /** The problems as published for the text as it is now. */
  problems(): Promise<readonly Diagnostic[]>;
  /** A request about this file. */
  ask<R>(method: string, params?: object): Promise<R>;
}

export async function connect(
  reader: MessageReader,
  writer: MessageWriter,
  { capabilities = {}, initializationOptions, folders = [], answers = {} }: ClientOptions = {},
): Promise<Client> {
  const connection = createMessageConnection(reader, writer);
  const messages: Message[] = [];
  const waiting = new Set<() => void>();
  const take = (method: string, params: unknown) => {
    messages.push({ method, params });
    for (const look of [...waiting]) look();
  };
  connection.onNotification(take);
  connection.onRequest((method, params) => {
    take(method, params);
    return answers[method]?.(params as never) ?? null;
  });
  connection.listen();

  const request = <R>(method: string, params: unknown) => connection.sendRequest<R>(method, params);
  const notify = (method: string, params: unknown) => void connection.sendNotification(method, params);

  const next = <P>(method: string, { since = 0, when = () => true }: NextOptions<P> = {}) =>
    new Promise<P>((resolve) => {
      const look = () => {
        const found = messages.slice(since).find((each) => each.method === method && when(each.params as P));
        if (!found) return;
        waiting.delete(look);
        resolve(found.params as P);
      };
      waiting.add(look);
      look();
    });

  const open = (uri: string, text: string): OpenFile => {
    const document = TextDocument.create(uri, 'tenuity', 1, text);
    notify('textDocument/didOpen', { textDocument: { uri, languageId: 'tenuity', version: 1, text } });
    const at = (mark: string) => document.positionAt(placeOf(document, mark));
    const range = (mark: string) => {
      const start = placeOf(document, mark);
      return { start: document.positionAt(start), end: document.positionAt(start + mark.length) };
    };
    const replaceAll: OpenFile['replaceAll'] = (changes) => {
      const version = document.version + 1;
      const contentChanges = changes.map(({ start, end, text: own }) => {
        const change = { range: { start: document.positionAt(start), end: document.positionAt(end) }, text: own };
        TextDocument.update(document, [change], version);
        return change;
      });
      notify('textDocument/didChange', { textDocument: { uri, version }, contentChanges });
    };
    return {
      uri,
      document,
      at,
      range,
      replaceAll,
      replace: (start, end, own) => replaceAll([{ start, end, text: own }]),
      close: () => notify('textDocument/didClose', { textDocument: { uri } }),
      problems: async () => {
        const { version } = document;
        const published = await next<PublishDiagnosticsParams>('textDocument/publishDiagnostics', {
          when: (each) => each.uri === uri && each.version === version,
        });
        return published.diagnostics;
      },
      ask: (method, params = {}) => request(`textDocument/${method}`, { textDocument: { uri }, ...params }),
    };
  };

  const initialized = await request<InitializeResult>('initialize', {
    processId: null,
    rootUri: null,
    capabilities,
    initializationOptions,
    workspaceFolders: folders.map((uri) => ({ uri, name: uri })),
  });
  notify('initialized', {});

  return {
    initialized,
    messages,
    request,
    cancellable: <R>(method: string, params: unknown) => {
      const source = new CancellationTokenSource();
      return { answer: connection.sendRequest<R>(method, params, source.token), cancel: () => source.cancel() };
    },
    notify,
    next,
    open,
  };
}

function placeOf(document: TextDocument, mark: string): number {
  const found = document.getText().indexOf(mark);
  if (found < 0) throw new Error(`the text does not hold ${mark}`);
  return found;
}
