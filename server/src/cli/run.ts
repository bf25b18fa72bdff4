import { nearestNames } from '../quantities/nearestNames';
import { check } from './check';
import type { Command } from './command';
import { UsageError } from './command';
import { explain } from './explain';
import { format } from './format';
import { serve } from './serve';
import { verify } from './verify';
import { VERSION } from './version';

const commands: readonly Command[] = [check, format, explain, verify, serve];

/** Exit codes: 0 all is well, 1 something fails, 2 bad usage or unreadable input, 3 a fault of our own. */
export async function run(args: readonly string[]): Promise<number> {
  const [word, ...rest] = args;
  try {
    if (word === undefined || word === '--help' || word === '-h' || word === 'help') return print(overview());
    if (word === '--version' || word === '-V') return print(VERSION);
    const command = commands.find(({ name }) => name === word);
    if (!command) {
      const [nearest] = nearestNames(
        word,
        commands.map(({ name }) => name),
      );
      throw new UsageError(`there is no command “${word}”${nearest === undefined ? '' : `; did you mean ${nearest}?`}`);
    }
    if (rest.includes('--help') || rest.includes('-h')) return print(command.help);
    return await command.run(rest);
  } catch (error) {
    if (error instanceof UsageError) {
      process.stderr.write(`tenuity: ${error.message}\nSee tenuity --help.\n`);
      return 2;
    }
    process.stderr.write(
      `tenuity: a fault of the program itself: ${error instanceof Error ? (error.stack ?? error.message) : String(error)}\n`,
    );
    return 3;
  }
}

function overview(): string {
  const width = Math.max(...commands.map(({ name }) => name.length));
  return [
    'tenuity evaluates gas-state files.',
    '',
    ...commands.map(({ name, summary }) => `  tenuity ${name.padEnd(width)}  ${summary}`),
    '',
    '  tenuity COMMAND --help   how a command is used',
    '  tenuity --version        the version',
    '',
    'Exit codes: 0 all is well, 1 something fails, 2 bad usage or an unreadable file.',
  ].join('\n');
}

function print(text: string): number {
  process.stdout.write(`${text}\n`);
  return 0;
}
