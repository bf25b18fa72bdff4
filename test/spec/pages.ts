import { readdirSync } from 'node:fs';

const FOLDER = 'test/spec';
const PROBLEMS = `${FOLDER}/problems`;

/** Every page of the specification. */
export function pages(): readonly string[] {
  return markdownBelow(FOLDER);
}

/** The pages of the problems, each with the code that its name says. */
export function problemPages(): readonly { readonly code: string; readonly path: string }[] {
  return markdownBelow(PROBLEMS).map((path) => ({ path, code: path.slice(PROBLEMS.length + 1, -'.md'.length) }));
}

function markdownBelow(folder: string): readonly string[] {
  return readdirSync(folder, { recursive: true, encoding: 'utf8' })
    .filter((file) => file.endsWith('.md'))
    .map((file) => `${folder}/${file}`)
    .sort();
}
