import { URI, Utils } from 'vscode-uri';

/** One spelling for each file: clients differ in what they percent-encode. */
export function canonical(uri: string): string {
  return URI.parse(uri).toString();
}

/** The address of a path that is written in a file. */
export function resolveUse(from: string, path: string): string {
  return Utils.resolvePath(Utils.dirname(URI.parse(from)), path).toString();
}
