import type { Declaration, File, Item, Name } from '../syntax/nodes';

/** A declaration with its identity: what stays the same while its text is edited and while it moves in the file. */
export interface Declared {
  /** The name; of a nameless declaration its text; with a counter where that is taken. */
  readonly id: string;
  readonly item: Item;
  /** Where it introduces a name. */
  readonly name?: Name;
}

export interface Declarations {
  readonly all: readonly Declared[];
  /** By the name they introduce; two entries are a duplicate. */
  readonly byName: ReadonlyMap<string, readonly Declared[]>;
  /** The `assume` declarations by their condition. */
  readonly assumed: ReadonlyMap<string, Declared>;
}

export function declare(file: File): Declarations {
  const taken = new Map<string, number>();
  const byName = new Map<string, Declared[]>();
  const assumed = new Map<string, Declared>();
  const all = file.items.map((item) => {
    const name = nameOf(item.declaration);
    const stem = name?.text ?? item.text;
    const count = (taken.get(stem) ?? 0) + 1;
    taken.set(stem, count);
    const declared: Declared = { id: count === 1 ? stem : `${stem}~${count}`, item, ...(name ? { name } : {}) };
    if (name) byName.set(name.text, [...(byName.get(name.text) ?? []), declared]);
    const { declaration } = item;
    if (declaration.kind === 'assume' && declaration.name.kind === 'name' && !assumed.has(declaration.name.text)) {
      assumed.set(declaration.name.text, declared);
    }
    return declared;
  });
  return { all, byName, assumed };
}

/** The name that a declaration introduces. */
export function nameOf(declaration: Declaration): Name | undefined {
  switch (declaration.kind) {
    case 'let':
    case 'gas':
    case 'line':
    case 'site':
    case 'thing':
      return declaration.name.kind === 'name' ? declaration.name : undefined;
    case 'use':
    case 'display':
    case 'assume':
    case 'require':
    case 'stray':
      return undefined;
  }
}
