import { readFileSync, readdirSync } from 'node:fs';
import { readAnnotations } from './annotations';
import { readSections } from './markdown';

/** A text to try things on, with where it comes from. */
export interface Specimen {
  readonly source: string;
  readonly text: string;
}

/** The sample files. */
export function samples(): readonly Specimen[] {
  return filesBelow('samples', '.gas').map((source) => ({ source, text: readFileSync(source, 'utf8') }));
}

/** Every document of the specification and of the syntax pages, the broken ones included. */
export function documents(): readonly Specimen[] {
  return ['test/spec', 'test/syntax'].flatMap((folder) => filesBelow(folder, '.md').flatMap(documentsOf));
}

function documentsOf(source: string): readonly Specimen[] {
  return readSections(readFileSync(source, 'utf8')).flatMap(({ heading, blocks }) =>
    blocks
      .filter(({ word }) => word === 'gas' || word === 'file')
      .map(({ lines }) => ({ source: `${source}: ${heading}`, text: readAnnotations(lines).text })),
  );
}

function filesBelow(folder: string, ending: string): readonly string[] {
  return readdirSync(folder, { recursive: true, encoding: 'utf8' })
    .filter((file) => file.endsWith(ending))
    .map((file) => `${folder}/${file}`)
    .sort();
}
