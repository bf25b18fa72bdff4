import type { Disposable, Event } from 'vscode';

const LIMIT = 15_000;

/**
 * Waits until `look` returns something, looking now and after each `event`. Never sleeps: what changes without
 * an event is not what the editor tests wait for.
 */
export function until<T>(event: Event<unknown>, look: () => T | undefined, what: string): Promise<T> {
  return new Promise((resolve, reject) => {
    const disposables: Disposable[] = [];
    const settle = (finish: () => void) => {
      clearTimeout(timer);
      for (const disposable of disposables) disposable.dispose();
      finish();
    };
    const timer = setTimeout(() => settle(() => reject(new Error(`${what}: not within ${LIMIT / 1000} s`))), LIMIT);
    const check = () => {
      const found = look();
      if (found !== undefined) settle(() => resolve(found));
    };
    disposables.push(event(check));
    check();
  });
}
