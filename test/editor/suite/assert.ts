// Assertions for the editor tests, which also run in a Web Worker, where node:assert does not exist.

export function ok(value: unknown, what: string): asserts value {
  if (!value) throw new Error(`${what}: expected something, got ${show(value)}`);
}

export function equal<T>(actual: T, expected: T, what: string): void {
  if (actual !== expected) throw new Error(`${what}: expected ${show(expected)}, got ${show(actual)}`);
}

export function notEqual<T>(actual: T, unwanted: T, what: string): void {
  if (actual === unwanted) throw new Error(`${what}: expected anything but ${show(unwanted)}`);
}

export function match(actual: string, pattern: RegExp, what: string): void {
  if (!pattern.test(actual)) throw new Error(`${what}: expected ${pattern}, got ${show(actual)}`);
}

/** Also of undefined, of which JSON makes nothing. */
function show(value: unknown): string {
  return value === undefined ? 'undefined' : JSON.stringify(value);
}
