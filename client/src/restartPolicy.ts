import { CloseAction, ErrorAction } from 'vscode-languageclient';
import type { ErrorHandler } from 'vscode-languageclient';

const MAX_RESTARTS = 4;
const WINDOW_MS = 3 * 60 * 1000;

/**
 * Brings a lost server back, but not for ever: a server that dies at every start would spin. Every answer is marked as
 * handled, which keeps the library from raising a toast.
 */
export function restartAFewTimes(now: () => number): ErrorHandler {
  let restarts: readonly number[] = [];
  return {
    error: (_error, _message, count) => ({
      action: (count ?? 0) <= 3 ? ErrorAction.Continue : ErrorAction.Shutdown,
      handled: true,
    }),
    closed() {
      const time = now();
      restarts = [...restarts.filter((earlier) => time - earlier < WINDOW_MS), time];
      return { action: restarts.length > MAX_RESTARTS ? CloseAction.DoNotRestart : CloseAction.Restart, handled: true };
    },
  };
}
