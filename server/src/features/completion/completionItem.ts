import type { Span } from '../../syntax/nodes';

export type CompletionKind =
  | 'keyword'
  | 'kind'
  | 'key'
  | 'name'
  | 'property'
  | 'unit'
  | 'gas'
  | 'function'
  | 'constant'
  | 'word'
  | 'condition'
  | 'quantity'
  | 'file';

/** One thing that could be written at the cursor. */
export interface Suggestion {
  readonly label: string;
  readonly kind: CompletionKind;
  /** One short line beside the label. */
  readonly detail: string;
  /** Markdown. */
  readonly documentation?: string;
  readonly insertText: string;
  /** Whether the text to insert has tab stops. */
  readonly snippet: boolean;
}

export interface CompletionItem extends Suggestion {
  /** What the text replaces: the word being typed. Offsets of the file. */
  readonly replace: Span;
  /** Sorts the items in the order in which they are meant. */
  readonly sortText: string;
}

/** A suggestion that inserts its own label unless told otherwise. */
export function suggestion(
  kind: CompletionKind,
  label: string,
  detail: string,
  { documentation, insert = label, snippet }: { documentation?: string; insert?: string; snippet?: string } = {},
): Suggestion {
  return {
    label,
    kind,
    detail,
    ...(documentation === undefined ? {} : { documentation }),
    insertText: snippet ?? insert,
    snippet: snippet !== undefined,
  };
}
