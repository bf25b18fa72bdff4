import type { Analysis } from '../../server/src/model/analysis';
import { MAIN, textsOf, workspaceOf } from './workspace';

/** The analysis of a text; other files stand beside it under their relative names. */
export function analyse(
  text: string,
  { files = {} }: { readonly files?: Readonly<Record<string, string>> } = {},
): Analysis {
  return workspaceOf(textsOf(text, files)).analyse(MAIN);
}

/** A text with the mark `<*>` taken out, and where the mark stood. */
export function cursor(marked: string): { readonly text: string; readonly offset: number } {
  const offset = marked.indexOf('<*>');
  if (offset < 0) throw new Error('the text has no mark <*>');
  return { text: marked.replace('<*>', ''), offset };
}
