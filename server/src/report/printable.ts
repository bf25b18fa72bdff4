/**
 * A text from a file as it may go to a terminal, in as many UTF-16 units. What would move the cursor, change colours or turn the
 * direction of writing is shown by a stand-in: a record must not be able to show other words than it holds.
 */
export function printable(text: string): string {
  return text.replace(DRIVING, (mark) => {
    if (mark === '\t') return ' ';
    const code = mark.charCodeAt(0);
    return code < 0x20 ? String.fromCharCode(CONTROL_PICTURES + code) : '\uFFFD';
  });
}

/** U+2400 and following picture the control characters. */
const CONTROL_PICTURES = 0x2400;

/** Control characters, marks of writing direction, line separators, and halves of surrogate pairs. */
const DRIVING = /[\p{Cc}\p{Cs}\p{Bidi_Control}\u2028\u2029]/gu;
