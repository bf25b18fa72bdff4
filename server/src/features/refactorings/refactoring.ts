import type { TextEdit } from '../textEdit';

/** What a refactoring does. */
export interface Refactoring {
  readonly title: string;
  readonly edits: readonly TextEdit[];
}
