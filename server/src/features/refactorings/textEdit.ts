import type { Span } from '../../syntax/nodes';

/** A change of the file: a stretch of it and what stands there instead. */
export interface TextEdit extends Span {
  readonly text: string;
}

/** What a refactoring does. */
export interface Refactoring {
  readonly title: string;
  readonly edits: readonly TextEdit[];
}
