/** What the server needs of the machine it runs on. There is one for Node and one for workers. */
export interface Runtime {
  /** The text of a file, undefined where there is none; `out-of-reach` where the client has to be asked. */
  readFile(uri: string): Promise<string | undefined> | 'out-of-reach';
  /** The addresses of all gas-state files below a folder. */
  listFiles(folder: string): Promise<readonly string[]> | 'out-of-reach';
  /** Runs something later; the answer calls that off. */
  after(milliseconds: number, run: () => void): () => void;
  /** Settles when waiting messages have had their turn. */
  breathe(): Promise<void>;
  /** For tests: a fault becomes the request's error instead of being answered with the fallback. */
  readonly faults?: 'log' | 'throw';
}
