/** A fenced block of a markdown page: ```` ```word argument ```` and the lines up to the closing fence. */
export interface Block {
  readonly word: string;
  readonly argument: string;
  readonly lines: readonly string[];
  /** The line of the page, from zero, on which its text begins. */
  readonly start: number;
}

/** A heading with what stands below it, up to the next heading. */
export interface Section {
  readonly heading: string;
  readonly level: number;
  readonly line: number;
  readonly blocks: readonly Block[];
}

/** Reads the headings and fenced blocks of a page. What is not closed, or stands before any heading, is an error. */
export function readSections(page: string): readonly Section[] {
  const lines = page.split('\n');
  const sections: (Section & { blocks: Block[] })[] = [];
  for (let at = 0; at < lines.length; at += 1) {
    const line = lines[at] ?? '';
    const heading = /^(#+) (.+)$/.exec(line);
    if (heading) {
      sections.push({ heading: heading[2] ?? '', level: heading[1]?.length ?? 0, line: at, blocks: [] });
      continue;
    }
    const fence = /^```(\S*) *(.*)$/.exec(line);
    if (!fence) continue;
    const start = at + 1;
    const end = lines.indexOf('```', start);
    if (end < 0) throw new Error(`line ${start}: the fence is not closed`);
    const section = sections.at(-1);
    if (!section) throw new Error(`line ${start}: a block stands before the first heading`);
    section.blocks.push({ word: fence[1] ?? '', argument: fence[2] ?? '', lines: lines.slice(start, end), start });
    at = end;
  }
  return sections;
}

/** Headings with neither blocks nor a deeper heading below: a test that nobody wrote. */
export function emptySections(sections: readonly Section[]): readonly Section[] {
  return sections.filter(
    ({ level, blocks }, index) => blocks.length === 0 && (sections[index + 1]?.level ?? 0) <= level,
  );
}

/** The page with the text of some blocks replaced. */
export function rewrite(page: string, changes: readonly { readonly block: Block; readonly text: string }[]): string {
  const lines = page.split('\n');
  for (const { block, text } of [...changes].sort((a, b) => b.block.start - a.block.start)) {
    lines.splice(block.start, block.lines.length, ...text.split('\n'));
  }
  return lines.join('\n');
}
