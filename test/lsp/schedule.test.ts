import assert from 'node:assert/strict';
import type { Schedule } from '../../server/src/lsp/schedule';
import { createSchedule } from '../../server/src/lsp/schedule';

/** A schedule whose time stands still until the test moves it. */
function standing(steps: (uri: string) => Iterator<Promise<void> | undefined, void>) {
  const timers = new Set<() => void>();
  const log: string[] = [];
  let idle: () => void;
  const whenIdle = () => new Promise<void>((resolve) => (idle = resolve));
  const schedule: Schedule = createSchedule({
    runtime: {
      after: (_milliseconds, run) => {
        timers.add(run);
        return () => timers.delete(run);
      },
      breathe: () => Promise.resolve(),
    },
    work: steps,
    onFault: (uri, error) => log.push(`${uri}: ${String(error)}`),
    onIdle: () => {
      log.push('idle');
      idle();
    },
  });
  const elapse = async () => {
    const ended = whenIdle();
    for (const run of [...timers]) {
      timers.delete(run);
      run();
    }
    await ended;
  };
  return { schedule, log, elapse, timers };
}

describe('the schedule', () => {
  it('does the work once for many touches, and each file’s by itself', async () => {
    const { schedule, log, elapse } = standing(function* (uri) {
      log.push(uri);
      yield undefined;
    });
    for (const uri of ['a', 'b', 'a', 'a']) schedule.touch(uri);
    await elapse();
    assert.deepEqual(log, ['b', 'a', 'idle']);
  });

  it('stops between two steps when the file is touched again or dropped', async () => {
    const { schedule, log, elapse } = standing(function* (uri) {
      log.push(`${uri} begins`);
      if (uri === 'touched') schedule.touch(uri);
      if (uri === 'dropped') schedule.drop(uri);
      yield Promise.resolve();
      log.push(`${uri} ends`);
    });
    for (const uri of ['touched', 'dropped', 'left alone']) schedule.touch(uri);
    await elapse();
    assert.deepEqual(log, ['touched begins', 'dropped begins', 'left alone begins', 'left alone ends', 'idle']);
  });

  it('does nothing for a file that was dropped before its time', () => {
    const { schedule, timers } = standing(() => assert.fail('there is no work'));
    schedule.touch('a');
    schedule.drop('a');
    assert.equal(timers.size, 0);
  });

  it('goes on with the next file after a fault', async () => {
    const { schedule, log, elapse } = standing(function* (uri) {
      if (uri === 'bad') throw new Error('it broke');
      log.push(uri);
      yield undefined;
    });
    for (const uri of ['bad', 'good']) schedule.touch(uri);
    await elapse();
    assert.deepEqual(log, ['bad: Error: it broke', 'good', 'idle']);
  });
});
