import type { Analysis } from '../model/analysis';

export interface Link {
  readonly start: number;
  readonly end: number;
  /** The address of the file. */
  readonly target: string;
}

/** The paths that a file uses, without their quotes. */
export function links({ file, uses }: Analysis): readonly Link[] {
  return file.items.flatMap(({ offset, declaration }) => {
    if (declaration.kind !== 'use' || declaration.path.kind !== 'text') return [];
    const { span, text } = declaration.path;
    const use = uses.find(({ path }) => path === text);
    const start = offset + span.start + 1;
    return use && text !== '' ? [{ start, end: start + text.length, target: use.uri }] : [];
  });
}
