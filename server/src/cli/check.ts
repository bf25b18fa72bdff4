import type { Analysis } from '../model/analysis';
import { createWorkspace } from '../model/workspace';
import { jsonFile } from '../report/json';
import type { JsonReport } from '../report/json';
import { requirementsOf } from '../report/requirements';
import type { TextOptions } from '../report/text';
import { textFile, textSummary } from '../report/text';
import type { Command } from './command';
import { readArguments } from './command';
import { emphasisFor } from './emphasis';
import type { NamedFile } from './files';
import { filesAround, namedFiles, nameOf } from './files';
import { VERSION } from './version';

export const check: Command = {
  name: 'check',
  summary: 'evaluates files and lists problems and requirements',
  help: `tenuity check [OPTIONS] FILES…

Evaluates gas-state files and lists their problems and requirements. A folder means the files below it, - the standard input.

  --values               show the record as well: the main figures of every declaration
  --values=all           show every result with its method
  --format text|json     how to print (default text)
  --strict               warnings fail too
  --stdin-filename NAME  the name that the standard input goes by

A file that is used by one of them is listed as well when something in it has no value.

Exit codes: 0 nothing fails, 1 an error, or a requirement that fails or has no value, 2 bad usage or an unreadable file.

  tenuity check samples/load-lock.gas
  tenuity check --strict --format json records/ > checked.json`,
  run: async (args) => {
    const given = readArguments(args, {
      values: { type: 'boolean', words: ['all'] },
      format: { type: 'string', words: ['text', 'json'] },
      strict: { type: 'boolean' },
      'stdin-filename': { type: 'string' },
    });
    const checked = checkedFiles(namedFiles(given.files, { stdinName: given.text('stdin-filename') }));
    if (given.text('format') === 'json') {
      const files = checked.map(({ name, analysis }) => jsonFile(name, analysis));
      const report: JsonReport = { tenuity: VERSION, files };
      process.stdout.write(`${JSON.stringify(report, null, 2)}\n`);
    } else {
      const values = given.text('values') === 'all' ? 'all' : given.flag('values') ? 'main' : 'none';
      process.stdout.write(textReport(checked, { values, emphasis: emphasisFor(process.stdout) }));
    }
    const strict = given.flag('strict');
    return Promise.resolve(checked.some(({ analysis }) => fails(analysis, { strict })) ? 1 : 0);
  },
};

interface Checked {
  readonly name: string;
  readonly analysis: Analysis;
}

/** The named files, and behind them each file used by them whose faults could leave a name without a value. */
function checkedFiles(named: readonly NamedFile[]): readonly Checked[] {
  const workspace = createWorkspace(filesAround(named));
  const checked = new Map(named.map(({ name, uri }) => [uri, { name, analysis: workspace.analyse(uri) }]));
  const seen = new Set(checked.keys());
  const waiting = [...checked.values()].map(({ analysis }) => analysis);
  for (let analysis = waiting.shift(); analysis; analysis = waiting.shift()) {
    for (const { uri } of analysis.uses) {
      if (seen.has(uri)) continue;
      seen.add(uri);
      const used = workspace.analyse(uri);
      waiting.push(used);
      if (used.declared.some((declared) => used.outcome(declared).kind === 'failed'))
        checked.set(uri, { name: nameOf(uri), analysis: used });
    }
  }
  return [...checked.values()];
}

function textReport(checked: readonly Checked[], options: TextOptions): string {
  const texts = checked.map(({ name, analysis }) => textFile(name, analysis, options));
  const summary = textSummary(checked.map(({ analysis }) => analysis));
  return `${[...texts.filter((text) => text !== ''), summary].join('\n')}\n`;
}

/** An error, or a requirement that fails or has no value; when strict also a warning. A preference that is not met is one. */
function fails(analysis: Analysis, { strict }: { readonly strict: boolean }): boolean {
  const required = requirementsOf(analysis).filter(({ strength }) => strength === 'require');
  return (
    required.some(({ status, evaluated }) => status === 'fails' || !evaluated) ||
    analysis
      .problems()
      .some(({ problem }) => problem.severity === 'error' || (strict && problem.severity === 'warning'))
  );
}
