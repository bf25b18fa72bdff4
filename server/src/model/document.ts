import { parseUnit } from '../quantities/parseUnit';
import type { Unit } from '../quantities/parseUnit';
import { kindNamed } from '../quantities/quantityKinds';
import type { File, Name } from '../syntax/nodes';
import { createParser } from '../syntax/parse';
import type { Declarations } from './declare';
import { declare } from './declare';
import type { Outcome } from './evaluated';
import type { Problem } from './problems/problem';
import type { DisplayUnits } from './quantity';
import { references } from './references';

/** One file as the workspace keeps it: its text, what that declares, and what its declarations gave the last time they ran. */
export interface Document {
  readonly uri: string;
  readonly text: string;
  readonly file: File;
  readonly declarations: Declarations;
  /** Which declaration uses which names: the same object as long as that stays the same. */
  readonly shape: Shape;
  readonly display: DisplayUnits;
  /** The `use` declarations in order. */
  readonly uses: readonly Use[];
  /** What was evaluated, by the identity of the declaration. It goes with the document. */
  readonly memo: Map<string, MemoEntry>;
}

/** For each declaration its identity and the names it uses. */
export type Shape = readonly { readonly id: string; readonly uses: readonly Name[] }[];

export interface Use {
  readonly path: string;
  readonly uri: string;
}

/** A result with everything it was computed from. As long as all of that is the same, the result is. */
export interface MemoEntry {
  readonly text: string;
  readonly reads: readonly Read[];
  readonly outcome: Outcome;
  readonly problems: readonly Problem[];
}

/** Something a declaration read through its scope, and what it saw. Equal values are the same object. */
export interface Read {
  readonly key: string;
  readonly seen: unknown;
}

/** Keeps one document up to date with its text. */
export function createDocument(uri: string, resolve: (path: string) => string): (text: string) => Document {
  const parse = createParser();
  const memo = new Map<string, MemoEntry>();
  let before: Document | undefined;
  return (text) => {
    if (before?.text === text) return before;
    const file = parse(text);
    const declarations = declare(file);
    const display = displayUnits(file);
    const uses = usesOf(file).map((path) => ({ path, uri: resolve(path) }));
    const shape = declarations.all.map(({ id, item }) => ({ id, uses: references(item.declaration) }));
    before = {
      uri,
      text,
      file,
      declarations,
      shape: before && sameShape(before.shape, shape) ? before.shape : shape,
      display: before && sameUnits(before.display, display) ? before.display : display,
      uses,
      memo,
    };
    return before;
  };
}

function displayUnits(file: File): DisplayUnits {
  const units = new Map<string, Unit>();
  for (const { declaration } of file.items) {
    if (declaration.kind !== 'display') continue;
    for (const { quantity, unit } of declaration.items) {
      const kind = quantity.kind === 'name' ? kindNamed(quantity.text) : undefined;
      const parsed = unit.kind === 'unit' ? parseUnit(unit.text) : undefined;
      if (kind && parsed?.ok && parsed.unit.dimension === kind.dimension) units.set(kind.name, parsed.unit);
    }
  }
  return units;
}

function sameUnits(a: DisplayUnits, b: DisplayUnits): boolean {
  return a.size === b.size && [...a].every(([kind, unit]) => b.get(kind) === unit);
}

function sameShape(a: Shape, b: Shape): boolean {
  return (
    a.length === b.length &&
    a.every(({ id, uses }, index) => {
      const other = b[index];
      return other !== undefined && id === other.id && (uses === other.uses || sameNames(uses, other.uses));
    })
  );
}

function sameNames(a: readonly Name[], b: readonly Name[]): boolean {
  return a.length === b.length && a.every(({ text }, index) => text === b[index]?.text);
}

function usesOf(file: File): string[] {
  return file.items.flatMap(({ declaration }) =>
    declaration.kind === 'use' && declaration.path.kind === 'text' ? [declaration.path.text] : [],
  );
}
