import type { WriteStream } from 'node:tty';
import { createColors } from 'picocolors';
import type { Emphasis } from '../report/text';
import { plain } from '../report/text';

/** Colours on a terminal that can show them, unless NO_COLOR asks for none (no-color.org); FORCE_COLOR asks for them anywhere. */
export function emphasisFor(
  stream: Pick<WriteStream, 'isTTY'>,
  environment: NodeJS.ProcessEnv = process.env,
): Emphasis {
  const { NO_COLOR, FORCE_COLOR, TERM } = environment;
  const forced = FORCE_COLOR !== undefined && FORCE_COLOR !== '' && FORCE_COLOR !== '0';
  if (NO_COLOR || !(forced || (stream.isTTY && TERM !== 'dumb'))) return plain;
  const colours = createColors(true);
  return {
    strong: colours.bold,
    quiet: colours.dim,
    severity: (text, severity) =>
      severity === 'error' ? colours.red(text) : severity === 'warning' ? colours.yellow(text) : colours.blue(text),
    status: (text, status) =>
      status === 'holds' ? colours.green(text) : status === 'fails' ? colours.red(text) : colours.yellow(text),
  };
}
