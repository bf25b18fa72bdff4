/** A change of a stretch of the text. */
export interface TextEdit {
  readonly start: number;
  readonly end: number;
  readonly text: string;
}

/** The text with the edits made; they stand in order and count from `from`. */
export function applyEdits(text: string, edits: readonly TextEdit[], from = 0): string {
  const parts: string[] = [];
  let at = from;
  for (const edit of edits) {
    parts.push(text.slice(at - from, edit.start - from), edit.text);
    at = edit.end;
  }
  return parts.join('') + text.slice(at - from);
}
