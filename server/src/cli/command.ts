import { parseArgs } from 'node:util';
import { either } from '../model/problems/problem';
import { nearestNames } from '../quantities/nearestNames';

/** A command of the command line. */
export interface Command {
  readonly name: string;
  readonly summary: string;
  /** With two examples. */
  readonly help: string;
  /** Gives the exit code. */
  readonly run: (args: readonly string[]) => Promise<number>;
}

/** The call's words are off; the message says how. */
export class UsageError extends Error {}

export interface Options {
  readonly [name: string]: {
    readonly type: 'boolean' | 'string';
    /** The values it may have. A flag with words may stand alone as well. */
    readonly words?: readonly string[];
  };
}

export interface Arguments {
  readonly files: readonly string[];
  /** Whether it is given without a value. */
  flag(name: string): boolean;
  /** The value it is given. */
  text(name: string): string | undefined;
}

/** Reads options and operands; an unknown option is an error with the nearest name. `--` ends the options. */
export function readArguments(args: readonly string[], options: Options): Arguments {
  const { values, positionals, tokens } = parseArgs({
    args: [...args],
    options,
    strict: false,
    allowPositionals: true,
    tokens: true,
  });
  for (const token of tokens) {
    if (token.kind !== 'option') continue;
    const known = options[token.name];
    if (!known) {
      const [nearest] = nearestNames(token.name, Object.keys(options));
      throw new UsageError(
        `there is no option ${token.rawName}${nearest === undefined ? '' : `; did you mean --${nearest}?`}`,
      );
    }
    const { type, words } = known;
    if (type === 'string' && token.value === undefined) throw new UsageError(`${token.rawName} needs a value`);
    if (token.value === undefined) continue;
    if (type === 'boolean' && !words) throw new UsageError(`${token.rawName} takes no value`);
    if (words && !words.includes(token.value))
      throw new UsageError(`${token.rawName} is ${either(words)}, not “${token.value}”`);
  }
  return {
    files: positionals,
    flag: (name) => values[name] === true,
    text: (name) => {
      const value = values[name];
      return typeof value === 'string' ? value : undefined;
    },
  };
}
