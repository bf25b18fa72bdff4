import type { Analysis } from '../../model/analysis';
import type { Declared } from '../../model/declare';
import { declarationStart } from './declarationStart';
import type { Refactoring } from './refactoring';

/** Takes a declaration away with the lines that document it. */
export function removeDeclaration({ text }: Analysis, { item, name }: Declared): Refactoring {
  const start = declarationStart(text, item);
  const end = item.offset + item.text.length;
  const newLine = /^[ \t]*\r?\n/.exec(text.slice(end))?.[0] ?? '';
  const ownLines = start === 0 || text[start - 1] === '\n';
  return {
    title: `Remove ${name?.text ?? 'the declaration'}`,
    edits: [{ start, end: ownLines ? end + newLine.length : end, text: '' }],
  };
}
