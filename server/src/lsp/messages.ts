/** What Tenuity's own client and server say to each other beyond the protocol. The client imports this file and no other of the server. */

/** Announced by a client at `initialize`; every part may be missing, since other editors know nothing of it. */
export interface ClientOptions {
  /** The client opens addresses of the scheme `tenuity`, whose text it asks for by `pageRequest`. */
  readonly pages?: boolean;
  /** The client answers `readFileRequest` and `listFilesRequest`, for files that the server cannot reach by itself. */
  readonly files?: boolean;
}

/** From the client: the page of a problem's code, as Markdown. */
export const pageRequest = 'tenuity/page';
export interface PageParams {
  readonly code: string;
}

/** From the server: the text of a file, or null where there is none. */
export const readFileRequest = 'tenuity/readFile';
export interface ReadFileParams {
  readonly uri: string;
}

/** From the server: the addresses of all gas-state files in the workspace. */
export const listFilesRequest = 'tenuity/listFiles';
