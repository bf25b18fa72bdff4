// Solves the kinetic equation for every entry of the tables and writes them as TypeScript: npm run tables.
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { pathToFileURL } from 'node:url';
import { build } from 'esbuild';
import prettier from 'prettier';

const here = import.meta.dirname;
const folder = mkdtempSync(path.join(tmpdir(), 'tables-'));
try {
  const outfile = path.join(folder, 'tabulate.mjs');
  await build({
    entryPoints: [path.join(here, 'tabulate.ts')],
    outfile,
    bundle: true,
    format: 'esm',
    logLevel: 'warning',
  });
  const { tabulate } = await import(pathToFileURL(outfile).href);
  for (const section of ['tube', 'plates']) {
    const file = path.join(here, `${section}Table.ts`);
    const text = [
      "import type { KineticTable } from './kineticTable';",
      '',
      '/** Generated from the kinetic equation by generate.mjs; see kineticTable.ts for what it holds. */',
      `export const ${section}Table: KineticTable = ${JSON.stringify(tabulate(section))};`,
      '',
    ].join('\n');
    const options = await prettier.resolveConfig(file);
    writeFileSync(file, await prettier.format(text, { ...options, filepath: file }));
    console.log(`${section}: written`);
  }
} finally {
  rmSync(folder, { recursive: true });
}
