import type { Analysis } from '../model/analysis';
import { createWorkspace } from '../model/workspace';
import { jsonFile } from '../report/json';
import type { JsonReport } from '../report/json';
import { requirementsOf } from '../report/requirements';
import type { TextOptions } from '../report/text';
import { textFile, textSummary } from '../report/text';
import type { Command } from './command';
import { readArguments, UsageError } from './command';
import { emphasisFor } from './emphasis';
import { filesAround, namedFiles } from './files';
import { VERSION } from './version';

export const check: Command = {
  name: 'check',
  summary: 'evaluates files and lists problems and requirements',
  help: `tenuity check [OPTIONS] FILES…

Evaluates gas-state files and lists their problems and requirements. A folder means the files below it, - the standard input.

  --values               show the record as well: the main figures of every declaration
  --all-values           show every result with its method
  --format text|json     how to print (default text)
  --strict               warnings fail too
  --stdin-filename NAME  the name that the standard input goes by

Exit codes: 0 all requirements hold, 1 something fails, 2 bad usage or an unreadable file.

  tenuity check samples/load-lock.gas
  tenuity check --strict --format json records/ > checked.json`,
  run: async (args) => {
    const given = readArguments(args, {
      values: { type: 'boolean' },
      'all-values': { type: 'boolean' },
      format: { type: 'string' },
      strict: { type: 'boolean' },
      'stdin-filename': { type: 'string' },
    });
    const format = given.text('format') ?? 'text';
    if (format !== 'text' && format !== 'json') throw new UsageError(`--format is text or json, not “${format}”`);
    const named = namedFiles(given.files, { stdinName: given.text('stdin-filename') });
    const workspace = createWorkspace(filesAround(named));
    const checked = named.map(({ name, uri }) => ({ name, analysis: workspace.analyse(uri) }));
    const analyses = checked.map(({ analysis }) => analysis);
    if (format === 'json') {
      const report: JsonReport = {
        tenuity: VERSION,
        files: checked.map(({ name, analysis }) => jsonFile(name, analysis)),
      };
      process.stdout.write(`${JSON.stringify(report, null, 2)}\n`);
    } else {
      const values = given.flag('all-values') ? 'all' : given.flag('values') ? 'main' : 'none';
      const options: TextOptions = { values, emphasis: emphasisFor(process.stdout) };
      const texts = checked
        .map(({ name, analysis }) => textFile(name, analysis, options))
        .filter((text) => text !== '');
      process.stdout.write(`${[...texts, textSummary(analyses)].join('\n')}\n`);
    }
    return Promise.resolve(analyses.some((analysis) => fails(analysis, { strict: given.flag('strict') })) ? 1 : 0);
  },
};

/** An error, or a requirement that fails; when strict also a warning. A preference that is not met is a warning. */
function fails(analysis: Analysis, { strict }: { readonly strict: boolean }): boolean {
  const failing = requirementsOf(analysis).some(({ status, strength }) => status === 'fails' && strength === 'require');
  return (
    failing ||
    analysis
      .problems()
      .some(({ problem }) => problem.severity === 'error' || (strict && problem.severity === 'warning'))
  );
}
