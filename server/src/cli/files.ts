import { readFileSync, readdirSync, statSync } from 'node:fs';
import path from 'node:path';
import { fileURLToPath, pathToFileURL } from 'node:url';
import type { Files } from '../model/workspace';
import { canonical, resolveUse } from '../lsp/address';
import { UsageError } from './command';

/** A file that is named on the command line, under the name it was given. */
export interface NamedFile {
  readonly name: string;
  readonly uri: string;
  readonly text: string;
  /** The byte order mark that the text stands behind, or nothing. */
  readonly mark: string;
}

/** The operand that means the standard input. */
export const STANDARD_INPUT = '-';

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
        ...readText(0, 'the standard input'),
      };
    return { name, uri: addressOf(name), ...readText(name, name) };
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

/** A file's address as a person in this folder would write it. */
export function nameOf(uri: string): string {
  return withSlashes(path.relative('', fileURLToPath(uri)));
}

function listed(operand: string): readonly string[] {
  const status = onDisk(operand, () => statSync(operand, { throwIfNoEntry: false }));
  if (!status) throw new UsageError(`${operand}: there is no such file`);
  if (!status.isDirectory()) return [operand];
  const found = below(operand).map(withSlashes).sort();
  if (found.length === 0) throw new UsageError(`${operand}: the folder holds no gas-state file`);
  return found;
}

/** Folders that hold what others wrote. */
const passedOver: ReadonlySet<string> = new Set(['node_modules', '.git']);

function below(folder: string): readonly string[] {
  return onDisk(folder, () => readdirSync(folder, { withFileTypes: true })).flatMap((entry) => {
    const inside = path.join(folder, entry.name);
    if (entry.isDirectory()) return passedOver.has(entry.name) ? [] : below(inside);
    return entry.name.endsWith('.gas') && (entry.isFile() || leadsToFile(inside)) ? [inside] : [];
  });
}

function leadsToFile(link: string): boolean {
  return onDisk(link, () => statSync(link, { throwIfNoEntry: false }))?.isFile() ?? false;
}

function readText(file: string | number, name: string): Pick<NamedFile, 'text' | 'mark'> {
  const bytes = onDisk(name, () => readFileSync(file));
  const text = decoded(bytes);
  if (text === undefined) throw new UsageError(`${name} is not a text in UTF-8`);
  return text.startsWith(MARK) ? { text: text.slice(MARK.length), mark: MARK } : { text, mark: '' };
}

function readUsed(uri: string): { text: string } | 'missing' {
  try {
    const text = decoded(readFileSync(fileURLToPath(uri)));
    return text === undefined ? 'missing' : { text: text.startsWith(MARK) ? text.slice(MARK.length) : text };
  } catch {
    return 'missing';
  }
}

const MARK = '\uFEFF';
const utf8 = new TextDecoder('utf-8', { fatal: true, ignoreBOM: true });

/** Nothing for bytes that are no text: what is not understood must neither be judged nor written back. */
function decoded(bytes: Buffer): string | undefined {
  if (bytes.includes(0)) return undefined;
  try {
    return utf8.decode(bytes);
  } catch {
    return undefined;
  }
}

/** What goes wrong on the disk is told under the name of the file. */
function onDisk<T>(name: string, action: () => T): T {
  try {
    return action();
  } catch (error) {
    throw new UsageError(`${name} cannot be read: ${error instanceof Error ? error.message : String(error)}`);
  }
}

function addressOf(file: string): string {
  return canonical(pathToFileURL(path.resolve(file)).href);
}

function withSlashes(file: string): string {
  return file.split(path.sep).join('/');
}
