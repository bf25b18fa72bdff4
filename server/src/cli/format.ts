import { randomUUID } from 'node:crypto';
import { chmodSync, realpathSync, renameSync, rmSync, statSync, writeFileSync } from 'node:fs';
import { format as formatEdits } from '../features/format/format';
import { applyEdits } from '../features/textEdit';
import type { Command } from './command';
import { readArguments, UsageError } from './command';
import { namedFiles, STANDARD_INPUT } from './files';

export const format: Command = {
  name: 'format',
  summary: 'gives files their usual spacing and spelling of units',
  help: `tenuity format [--check] FILES…

Rewrites gas-state files in place: spacing, indentation and the usual spelling of units, never the order, a number or a comment.
From the standard input (-) it writes to the standard output.

  --check   write nothing; exit with 1 when a file would change

  tenuity format records/
  tenuity format - < draft.gas > neat.gas`,
  run: async (args) => {
    const given = readArguments(args, { check: { type: 'boolean' } });
    const checking = given.flag('check');
    const changed: string[] = [];
    for (const { name, text, mark } of namedFiles(given.files, { stdinName: undefined })) {
      const neat = applyEdits(text, formatEdits(text));
      if (neat !== text) changed.push(name);
      if (checking) continue;
      if (name === STANDARD_INPUT) process.stdout.write(mark + neat);
      else if (neat !== text) replaceFile(name, mark + neat);
    }
    for (const name of changed.filter((each) => checking || each !== STANDARD_INPUT))
      process.stderr.write(`${name}: ${checking ? 'would be' : 'was'} formatted\n`);
    return Promise.resolve(checking && changed.length > 0 ? 1 : 0);
  },
};

/** The new text is complete on the disk before it takes the old one's place, so that no file is ever lost. */
function replaceFile(file: string, text: string): void {
  // A link stays a link; what it leads to is rewritten.
  const place = realpathSync(file);
  const beside = `${place}.${randomUUID()}.tmp`;
  try {
    writeFileSync(beside, text, { flag: 'wx', flush: true });
    chmodSync(beside, statSync(place).mode);
    renameSync(beside, place);
  } catch (error) {
    rmSync(beside, { force: true });
    throw new UsageError(`${file} cannot be written: ${error instanceof Error ? error.message : String(error)}`);
  }
}
