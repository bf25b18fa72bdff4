import type { HintSettings } from '../features/inlayHints';
import type { HoverSettings } from '../features/hover/hover';

/** The user's settings, complete: what is missing or makes no sense is as the manifest has it by default. */
export interface Settings {
  readonly hints: HintSettings;
  readonly hover: HoverSettings;
}

/** The section that the client is asked for. */
export const section = 'tenuity';

export const defaultSettings: Settings = {
  hints: { enabled: 'all', figures: {}, digits: 4 },
  hover: { detail: 'full' },
};

/** Reads what the client says of the section; it may be anything. */
export function readSettings(given: unknown): Settings {
  const hints = fieldOf(given, 'hints');
  const hover = fieldOf(given, 'hover');
  const { hints: hintDefaults, hover: hoverDefaults } = defaultSettings;
  return {
    hints: {
      enabled: oneOf(fieldOf(hints, 'enabled'), ['all', 'failing', 'off'], hintDefaults.enabled),
      figures: figuresOf(fieldOf(hints, 'figures')),
      digits: digitsOf(fieldOf(hints, 'digits'), hintDefaults.digits),
    },
    hover: { detail: oneOf(fieldOf(hover, 'detail'), ['brief', 'full'], hoverDefaults.detail) },
  };
}

function fieldOf(given: unknown, name: string): unknown {
  return typeof given === 'object' && given !== null ? (given as Readonly<Record<string, unknown>>)[name] : undefined;
}

function oneOf<T extends string>(given: unknown, words: readonly T[], otherwise: T): T {
  return words.find((word) => word === given) ?? otherwise;
}

function digitsOf(given: unknown, otherwise: number): number {
  return typeof given === 'number' && Number.isInteger(given) && 3 <= given && given <= 6 ? given : otherwise;
}

function figuresOf(given: unknown): HintSettings['figures'] {
  if (typeof given !== 'object' || given === null) return defaultSettings.hints.figures;
  const lists = Object.entries(given).flatMap(([word, names]) =>
    Array.isArray(names) ? [[word, names.filter((name): name is string => typeof name === 'string')] as const] : [],
  );
  return Object.fromEntries(lists);
}
