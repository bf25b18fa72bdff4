import type { Location } from 'vscode-languageserver';
import type { Documents } from '../documents';
import type { Stretch } from './range';
import { toRange } from './range';

/** A place in a file, by the address that the client knows it by; undefined where its text is not known. */
export function toLocation(
  { uri, ...place }: Stretch & { readonly uri: string },
  documents: Documents,
): Location | undefined {
  const document = documents.get(uri);
  return document && { uri: document.uri, range: toRange(document, place) };
}
