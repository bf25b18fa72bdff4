// What VS Code's Node extension host loads as `extensionTestsPath`, whether started by run.mjs or by
// runTests() of @vscode/test-electron. The results go to the file that TENUITY_TEST_RESULTS names, if it does.
import { writeFileSync } from 'node:fs';
import Mocha from 'mocha';
import { collectResults, throwOnFailure } from './results';

export async function run(): Promise<void> {
  const mocha = new Mocha({ ui: 'bdd', color: false, timeout: 20_000 });
  // Declares describe() and it(), which the bundled tests find as globals.
  mocha.suite.emit('pre-require', globalThis, '', mocha);
  await import('./tests');

  const results = await collectResults(mocha.run());
  const file = process.env['TENUITY_TEST_RESULTS'];
  if (file) writeFileSync(file, JSON.stringify(results));
  throwOnFailure(results);
}
