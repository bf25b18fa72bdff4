import { LSPErrorCodes, ResponseError } from 'vscode-languageserver';
import type { CancellationToken } from 'vscode-languageserver';

/** Makes handlers that the connection can call: they never throw, whatever the feature behind them does. */
export interface Guard {
  /** A fault is logged and the fallback answered. A request that is no longer wanted is not worked on. */
  request<P, R>(
    name: string,
    fallback: R,
    answer: (params: P) => R | Promise<R>,
  ): (params: P, token: CancellationToken) => Promise<R | ResponseError<never>>;
  /** A fault is logged and the notification passed over. */
  notification<P>(name: string, take: (params: P) => void): (params: P) => void;
  /** For faults of work that nothing waits for. */
  report(name: string, error: unknown): void;
}

interface GuardOptions {
  /** Told of every fault in one text: the request's name and the stack. */
  readonly log: (message: string) => void;
  /** `throw` is for tests. */
  readonly faults?: 'log' | 'throw';
}

export function createGuard({ log, faults = 'log' }: GuardOptions): Guard {
  const report = (name: string, error: unknown) => {
    log(`${name}: ${describe(error)}`);
    if (faults === 'throw') throw error;
  };
  return {
    report,
    request: (name, fallback, answer) => async (params, token) => {
      const cancelled = new ResponseError<never>(LSPErrorCodes.RequestCancelled, `${name} was cancelled`);
      if (token.isCancellationRequested) return cancelled;
      const calledOff = new Promise<typeof cancelled>((resolve) => {
        token.onCancellationRequested(() => resolve(cancelled));
      });
      try {
        return await Promise.race([answer(params), calledOff]);
      } catch (error) {
        report(name, error);
        return fallback;
      }
    },
    notification: (name, take) => (params) => {
      try {
        take(params);
      } catch (error) {
        report(name, error);
      }
    },
  };
}

function describe(error: unknown): string {
  return error instanceof Error ? (error.stack ?? error.message) : String(error);
}
