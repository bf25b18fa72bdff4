// The pictures of the README. Each names the `file` below samples/ that is open, the `theme`, the window's `size`, and
// what is brought about before the picture is taken, in this order:
//   hover     { at, showing }  the pointer rests on a word until a text appears
//   caret     { at }           the caret is put on a word
//   fixes     { at }           the menu of quick fixes is open at a word
//   problems                   the Problems view is open and lists something
//   replace   { at, text }     a word is typed over
//   press     { key }          a key, as in 'Control+Space'
//   command   { title }        a command, by the palette
//   wait      { for }          a selector that must be on the screen
// A word is named by `{ line, word }`: a piece of the line's text, and the word in it.

const HINT = 'span[class*="dyn-rule-"]:not(:empty)';

export const scenes = [
  {
    name: 'record',
    file: 'load-lock.gas',
    theme: 'light',
    size: { width: 1000, height: 700 },
    show: [
      { kind: 'wait', for: HINT },
      { kind: 'hover', at: { line: 'state residual', word: 'residual' }, showing: 'mean_free_path' },
    ],
  },
  {
    name: 'fix',
    file: 'load-lock.gas',
    theme: 'light',
    size: { width: 1000, height: 640 },
    show: [
      { kind: 'wait', for: HINT },
      { kind: 'replace', at: { line: '3e-3 mbar', word: 'mbar' }, text: 'mm' },
      { kind: 'wait', for: '.squiggly-error' },
      { kind: 'fixes', at: { line: '3e-3 mm', word: 'mm' } },
    ],
  },
];
