import { execFileSync, spawnSync } from 'node:child_process';
import { existsSync } from 'node:fs';

/** What a call of the built command line did. */
export interface Ran {
  readonly code: number | null;
  readonly out: string;
  readonly err: string;
}

const CLI = 'dist/cli.js';

/** Runs the command line as a person would; it is built where it is not there yet. */
export function tenuity(
  args: readonly string[],
  { input = '', env = {} }: { input?: string; env?: Record<string, string> } = {},
): Ran {
  if (!existsSync(CLI)) execFileSync(process.execPath, ['esbuild.mjs']);
  const { NO_COLOR: _none, FORCE_COLOR: _forced, ...rest } = process.env;
  const { status, stdout, stderr } = spawnSync(process.execPath, [CLI, ...args], {
    input,
    encoding: 'utf8',
    env: { ...rest, ...env },
  });
  return { code: status, out: stdout, err: stderr };
}
