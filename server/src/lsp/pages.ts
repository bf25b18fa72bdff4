import { problemCoded } from '../model/problems/list';

/** The scheme of addresses whose text the server writes. */
const scheme = 'tenuity';

/** Where the page of a problem's code is, for clients that open such addresses. */
export function pageAddress(code: string): string {
  return `${scheme}:/problems/${code}.md`;
}

/** The page of a problem's code, as Markdown. */
export function problemPage(code: string): string | null {
  const kind = problemCoded(code);
  return kind ? `# ${kind.title}\n\n\`${kind.code}\` · ${kind.severity}\n\n${kind.doc}\n` : null;
}
