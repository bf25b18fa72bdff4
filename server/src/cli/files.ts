import { readFileSync, readdirSync, statSync } from 'node:fs';
import path from 'node:path';
import { fileURLToPath, pathToFileURL } from 'node:url';
import type { Files } from '../model/workspace';
import { resolveUse } from '../lsp/address';
import { UsageError } from './command';

/** A file that is named on the command line, under the name it was given. */
export interface NamedFile {
  readonly name: string;
  readonly uri: string;
  readonly text: string;
}

const STANDARD_INPUT = '-';

/** The files that the operands mean: a folder means the gas-state files below it, `-` the standard input. */
export function namedFiles(
  operands: readonly string[],
  { stdinName }: { readonly stdinName: string | undefined },
): readonly NamedFile[] {
  if (operands.length === 0) throw new UsageError('no file is named');
  const names = operands.flatMap((operand) => (operand === STANDARD_INPUT ? [operand] : listed(operand)));
  return [...new Set(names)].map((name) => {
    if (name === STANDARD_INPUT)
      return {
        name: stdinName ?? STANDARD_INPUT,
        uri: addressOf(stdinName ?? 'standard-input.gas'),
        text: readText(0, 'the standard input'),
      };
    return { name, uri: addressOf(name), text: readText(name, name) };
  });
}

/** The named files as they were read, and whatever they use from the disk. */
export function filesAround(named: readonly NamedFile[]): Files {
  const texts = new Map<string, { text: string } | 'missing'>(named.map(({ uri, text }) => [uri, { text }]));
  return {
    read: (uri) => {
      const known = texts.get(uri) ?? readUsed(uri);
      texts.set(uri, known);
      return known;
    },
    resolve: resolveUse,
  };
}

function listed(operand: string): readonly string[] {
  const status = statSync(operand, { throwIfNoEntry: false });
  if (!status) throw new UsageError(`${operand}: there is no such file`);
  if (!status.isDirectory()) return [operand];
  const found = readdirSync(operand, { recursive: true, encoding: 'utf8' })
    .filter((file) => file.endsWith('.gas') && !file.split(path.sep).includes('node_modules'))
    .map((file) => path.join(operand, file).split(path.sep).join('/'))
    .sort();
  if (found.length === 0) throw new UsageError(`${operand}: the folder holds no gas-state file`);
  return found;
}

function readText(file: string | number, name: string): string {
  let bytes: Buffer;
  try {
    bytes = readFileSync(file);
  } catch (error) {
    throw new UsageError(`${name} cannot be read: ${error instanceof Error ? error.message : String(error)}`);
  }
  if (bytes.includes(0)) throw new UsageError(`${name} is not a text`);
  return bytes.toString('utf8').replace(/^\uFEFF/, '');
}

function readUsed(uri: string): { text: string } | 'missing' {
  try {
    return { text: readFileSync(fileURLToPath(uri), 'utf8') };
  } catch {
    return 'missing';
  }
}

function addressOf(file: string): string {
  return pathToFileURL(path.resolve(file)).href;
}
