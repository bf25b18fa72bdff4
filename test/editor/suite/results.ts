/** What one test came to; plain data, since it leaves the extension host as JSON. */
export type TestResult =
  | { readonly kind: 'passed'; readonly title: string; readonly milliseconds: number }
  | { readonly kind: 'failed'; readonly title: string; readonly message: string }
  | { readonly kind: 'skipped'; readonly title: string };

/** Everything that a run of mocha reports, once it has ended. */
export function collectResults(runner: Mocha.Runner): Promise<readonly TestResult[]> {
  const results: TestResult[] = [];
  runner.on('pass', (test) => {
    results.push({ kind: 'passed', title: test.fullTitle(), milliseconds: test.duration ?? 0 });
  });
  runner.on('fail', (test, error: unknown) => {
    results.push({ kind: 'failed', title: test.fullTitle(), message: describeError(error) });
  });
  runner.on('pending', (test) => {
    results.push({ kind: 'skipped', title: test.fullTitle() });
  });
  return new Promise((resolve) => runner.once('end', () => resolve(results)));
}

/** run() of a suite must throw for VS Code and its runners to see that it failed. */
export function throwOnFailure(results: readonly TestResult[]): void {
  const bad = results.filter((result) => result.kind !== 'passed');
  if (bad.length > 0) throw new Error(`not passed: ${bad.map((result) => result.title).join('; ')}`);
}

function describeError(error: unknown): string {
  return error instanceof Error ? (error.stack ?? error.message) : String(error);
}
