import type { Declared } from '../../model/declare';
import { kindOfWord } from '../../model/kinds/list';
import type { Declaration } from '../../syntax/nodes';
import { bold, plainText, shortened } from './hoverMarkdown';

/** `**residual**, a state of N2` */
export function titleOf({ item, name }: Declared): string {
  const { declaration, text } = item;
  const what = plainText(titleWords(declaration, text));
  return name === undefined ? bold(declaration.word.text) : `${bold(shortened(name.text, 100))}, ${what}`;
}

function titleWords(declaration: Declaration, text: string): string {
  switch (declaration.kind) {
    case 'let':
      return 'a named value';
    case 'gas':
      return 'a gas';
    case 'line':
      return 'a line of passages';
    case 'site': {
      const { start } = declaration.state.span;
      return shortened(`a site: ${text.slice(start, declaration.geometry.span.end)}`, 100);
    }
    case 'thing': {
      const { head, word } = declaration;
      const of = head ? ` ${text.slice(head.span.start, head.span.end)}` : '';
      return shortened(`${kindOfWord(word.text)?.title ?? word.text}${of}`, 100);
    }
    default:
      return declaration.word.text;
  }
}
