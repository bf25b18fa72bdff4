// What VS Code's web worker extension host loads as `extensionTestsPath`: mocha's browser build, and the results
// as one marked line on the console, since a worker has no files.
import { collectResults, throwOnFailure } from './results';

const MARK = 'tenuity-test-results ';

export async function run(): Promise<void> {
  // Not at the top: mocha's browser build puts itself in the place of this module's exports.
  await import('mocha/mocha.js');
  mocha.setup({ ui: 'bdd', reporter: 'spec', color: false, timeout: 20_000 });
  await import('./tests');

  const results = await collectResults(mocha.run());
  console.log(MARK + JSON.stringify(results));
  throwOnFailure(results);
}
