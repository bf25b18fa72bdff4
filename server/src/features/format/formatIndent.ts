import type { Declaration } from '../../syntax/nodes';
import type { Token } from '../tokens';

const STEP = 2;

/** How far each token is moved in, should it stand first on its line. */
export function indentsOf(declaration: Declaration, text: string, tokens: readonly Token[]): readonly string[] {
  const opening = new Set(
    declaration.kind === 'thing' ? declaration.block?.items.map(({ span }) => span.start) : undefined,
  );
  const brackets: Bracket[] = [];
  let line = 0;
  return tokens.map((token, index) => {
    const before = tokens[index - 1];
    const own = indentOf(token, { tokens, index, brackets, opening });
    if (before && text.slice(before.end, token.start).includes('\n')) line = own;
    if (token.kind === 'mark' && '{(['.includes(token.text))
      brackets.push({ mark: token.text, line: token.text === '{' ? 0 : line });
    else if (isClosing(token)) brackets.pop();
    return ' '.repeat(own);
  });
}

interface Bracket {
  readonly mark: string;
  /** How far the line is moved in that the bracket stands on. */
  readonly line: number;
}

interface Context {
  readonly tokens: readonly Token[];
  readonly index: number;
  readonly brackets: readonly Bracket[];
  /** Where the entries of the block start. */
  readonly opening: ReadonlySet<number>;
}

function indentOf(token: Token, context: Context): number {
  const bracket = context.brackets.at(-1);
  const inner = bracket ? bracket.line + STEP : 0;
  if (token.kind === 'comment') {
    const ahead = context.tokens.findIndex(({ kind }, index) => index > context.index && kind !== 'comment');
    const next = context.tokens[ahead];
    return !next || isClosing(next) ? inner : indentOf(next, { ...context, index: ahead });
  }
  if (context.index === 0) return 0;
  if (isClosing(token)) return bracket?.line ?? 0;
  if (bracket && bracket.mark !== '{') return inner;
  const begins = bracket ? context.opening.has(token.start) || isSeparator(token) : token.text === '{';
  return begins ? inner : inner + STEP;
}

function isClosing({ kind, text }: Token): boolean {
  return kind === 'mark' && '})]'.includes(text);
}

function isSeparator({ kind, text }: Token): boolean {
  return kind === 'mark' && ',;'.includes(text);
}
