import { describe, expect, it } from 'vitest';
import { type Answer, done } from './answer';
import { LatestOnly } from './latest-only';
import { WorkerHost, type WorkerSeat } from './worker-host';

/** Work whose answers are given by hand. */
function byHand() {
  const open: { request: number; answer: (answer: Answer<string>) => void }[] = [];
  const latest = new LatestOnly<number, string>(
    (request) => new Promise((resolve) => open.push({ request, answer: resolve })),
  );
  return { latest, open };
}

describe('the newest request wins', () => {
  it('drops those that wait behind it and the answer of the one that runs', async () => {
    const { latest, open } = byHand();
    const first = latest.run(1);
    const second = latest.run(2);
    const third = latest.run(3);
    await expect(second).resolves.toEqual({ status: 'stale' });
    open[0].answer(done('one'));
    await expect(first).resolves.toEqual({ status: 'stale' });
    expect(open[1].request).toBe(3);
    open[1].answer(done('three'));
    await expect(third).resolves.toEqual(done('three'));
  });

  it('answers a lone request and goes on after it', async () => {
    const { latest, open } = byHand();
    const one = latest.run(1);
    open[0].answer(done('one'));
    await expect(one).resolves.toEqual(done('one'));
    const two = latest.run(2);
    open[1].answer(done('two'));
    await expect(two).resolves.toEqual(done('two'));
  });
});

describe('a worker that breaks', () => {
  interface Api {
    work(): Promise<Answer<number>>;
  }
  function hostWith(apis: Api[]) {
    const crashes: ((message: string) => void)[] = [];
    const ended: number[] = [];
    let made = 0;
    const host = new WorkerHost<Api>((): WorkerSeat<Api> => {
      const index = made++;
      return {
        api: apis[index],
        onCrash: (listener) => {
          crashes[index] = listener;
        },
        end: () => ended.push(index),
      };
    });
    return { host, crashes, ended, made: () => made };
  }

  it('fails what waits, with its message, and the next call starts a fresh one', async () => {
    const { host, crashes, ended, made } = hostWith([
      { work: () => new Promise(() => {}) },
      { work: async () => done(7) },
    ]);
    const waiting = host.call((api) => api.work());
    crashes[0]('out of memory');
    await expect(waiting).resolves.toMatchObject({
      status: 'failed',
      message: expect.stringContaining('out of memory'),
    });
    expect(ended).toEqual([0]);
    await expect(host.call((api) => api.work())).resolves.toEqual(done(7));
    expect(made()).toBe(2);
  });

  it('turns what the worker throws into a failed answer and keeps the worker', async () => {
    const { host, made } = hostWith([{ work: () => Promise.reject(new Error('bad request')) }]);
    await expect(host.call((api) => api.work())).resolves.toMatchObject({
      status: 'failed',
      message: expect.stringContaining('bad request'),
    });
    expect(made()).toBe(1);
  });

  it('is made only when it is first needed', async () => {
    const { host, made } = hostWith([{ work: async () => done(1) }]);
    expect(made()).toBe(0);
    host.dispose();
    await host.call((api) => api.work());
    expect(made()).toBe(1);
  });
});
