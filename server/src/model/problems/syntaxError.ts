import { defineProblem } from './problem';

export const syntaxError = defineProblem<{ expected: string; after?: string } | { unexpected: string }>({
  code: 'syntax-error',
  severity: 'error',
  title: 'The text cannot be read',
  doc: 'Something is missing, or something stands where nothing can. The rest of the file is read as if this place were left out.',
  message: (args) => {
    if ('unexpected' in args) return `unexpected “${shortened(args.unexpected)}”`;
    return `expected ${args.expected}${args.after ? ` after ${args.after}` : ''}`;
  },
});

function shortened(text: string): string {
  const line = text.split('\n', 1)[0]?.trim() ?? '';
  return line.length > 30 ? `${line.slice(0, 29)}…` : line;
}
