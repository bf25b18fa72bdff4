/** Markdown for hovers. Text from files is escaped, so that it reads as written. */

/** Text as it stands, whatever marks it holds. Line breaks stay. */
export function plainText(text: string): string {
  return text
    .replace(/[\\`*{}[\]<>#|~&$]|(?<![\p{L}\p{N}])_|_(?![\p{L}\p{N}])/gu, '\\$&')
    .replace(/^[ \t]+/gm, '')
    .replace(/^(?:[-+](?=[-+\s]|$)|=)/gm, '\\$&');
}

export function bold(text: string): string {
  return text.trim() === '' ? '' : `**${plainText(text.trim())}**`;
}

/** A name of the format, set as code. */
export function code(text: string): string {
  const line = text.replace(/\s+/g, ' ').replaceAll('`', 'ˋ').trim();
  return line === '' ? '' : `\`${line}\``;
}

/** A name in a table cell: the bar would end the cell even in code. */
function cell(text: string): string {
  return text.replace(/\s*\n\s*/g, ' ').replace(/(?<!\\)\|/g, '\\|');
}

export function table(head: readonly string[], rows: readonly (readonly string[])[]): string {
  if (rows.length === 0) return '';
  const line = (cells: readonly string[]) => `| ${cells.map(cell).join(' | ')} |`;
  return [line(head), line(head.map(() => '---')), ...rows.map(line)].join('\n');
}

export function list(items: readonly string[]): string {
  return items.map((item) => `- ${item}`).join('\n');
}

export function numbered(items: readonly string[]): string {
  return items.map((item, index) => `${index + 1}. ${item}`).join('\n');
}

/** Editors cut a hover that is too long; this stays below. In bytes of UTF-8. */
const longestHover = 19_000;

/** Paragraphs one after another; what would make the hover too long is left out from the end. */
export function paragraphs(parts: readonly (string | undefined)[]): string {
  let size = 0;
  const kept: string[] = [];
  for (const part of parts) {
    if (part === undefined || part === '') continue;
    size += utf8Length(part) + 2;
    if (size > longestHover) break;
    kept.push(part);
  }
  return kept.join('\n\n');
}

/** At most so many characters of a text that may be of any length. */
export function shortened(text: string, most: number): string {
  return text.length <= most ? text : `${text.slice(0, most - 1)}…`;
}

function utf8Length(text: string): number {
  let length = 0;
  for (const character of text) {
    const point = character.codePointAt(0) ?? 0;
    length += point < 0x80 ? 1 : point < 0x800 ? 2 : point < 0x10000 ? 3 : 4;
  }
  return length;
}
