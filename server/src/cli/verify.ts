import { book } from '../verify/book';
import { circumstances } from '../verify/circumstances';
import { compareBook } from '../verify/compare';
import { verifyJson } from '../verify/json';
import { verifyText } from '../verify/text';
import type { Command } from './command';
import { readArguments, UsageError } from './command';
import { emphasisFor } from './emphasis';
import { VERSION } from './version';

export const verify: Command = {
  name: 'verify',
  summary: 'compares the figures with published values, on this machine',
  help: `tenuity verify [OPTIONS]

Computes the published values of the reference book that comes with the program, and says by property and gas how far the
figures are from them.

  --all                list every value: as printed, ours, the deviation, its source and place
  --format text|json   how to print (default text)

Exit codes: 0 every value is within its tolerance, 1 one is not, 2 bad usage.

  tenuity verify
  tenuity verify --all --format json > verification.json`,
  run: async (args) => {
    const given = readArguments(args, {
      all: { type: 'boolean' },
      format: { type: 'string', words: ['text', 'json'] },
    });
    if (given.files.length > 0) throw new UsageError('verify takes no files');
    const comparisons = compareBook(book);
    const ran = circumstances([`tenuity ${VERSION}`, `Node.js ${process.versions.node}`, platform()]);
    const rows = given.flag('all') ? 'all' : 'beyond';
    process.stdout.write(
      given.text('format') === 'json'
        ? `${JSON.stringify(verifyJson(ran, comparisons, { rows }), null, 2)}\n`
        : verifyText(ran, comparisons, { rows, emphasis: emphasisFor(process.stdout) }),
    );
    return Promise.resolve(comparisons.every(({ verdict }) => verdict === 'within') ? 0 : 1);
  },
};

function platform(): string {
  return `${process.platform} ${process.arch}`;
}
