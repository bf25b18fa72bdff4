import type { Runtime } from './runtime';

/** Work on files that waits until the typing pauses: one file at a time, in slices that let requests through. */
export interface Schedule {
  /** The file has to be looked at anew; what is under way for it stops. */
  touch(uri: string, delay?: number): void;
  /** Nothing more is to be done for the file. */
  drop(uri: string): void;
}

interface ScheduleOptions {
  readonly runtime: Pick<Runtime, 'after' | 'breathe'>;
  /** The work on one file, in steps. What it awaits it yields. */
  readonly work: (uri: string) => Iterator<Promise<void> | undefined, void>;
  readonly onFault: (uri: string, error: unknown) => void;
  /** All that was waiting is done. */
  readonly onIdle: () => void;
}

/** Long enough that no problem flashes between two letters, short enough to feel at once. */
const typingPause = 120;
/** How long a slice may keep requests waiting, in milliseconds. */
const slice = 10;

export function createSchedule({ runtime, work, onFault, onIdle }: ScheduleOptions): Schedule {
  const timers = new Map<string, () => void>();
  const waiting = new Set<string>();
  /** Counts the touches of each file, so that work knows when it is overtaken. */
  const rounds = new Map<string, number>();
  let busy = false;

  const run = async (uri: string) => {
    const round = rounds.get(uri);
    const steps = work(uri);
    for (let start = Date.now(); ;) {
      const step = steps.next();
      if (step.done) return;
      if (step.value) await step.value;
      else if (Date.now() - start < slice) continue;
      await runtime.breathe();
      if (rounds.get(uri) !== round) {
        steps.return?.();
        return;
      }
      start = Date.now();
    }
  };

  const runAll = async () => {
    if (busy) return;
    busy = true;
    for (const uri of waiting) {
      waiting.delete(uri);
      await run(uri).catch((error: unknown) => onFault(uri, error));
      await runtime.breathe();
    }
    busy = false;
    onIdle();
  };

  const next = (uri: string) => rounds.set(uri, (rounds.get(uri) ?? 0) + 1);

  return {
    touch: (uri, delay = typingPause) => {
      next(uri);
      timers.get(uri)?.();
      timers.set(
        uri,
        runtime.after(delay, () => {
          timers.delete(uri);
          waiting.add(uri);
          void runAll();
        }),
      );
    },
    drop: (uri) => {
      next(uri);
      timers.get(uri)?.();
      timers.delete(uri);
      waiting.delete(uri);
    },
  };
}
