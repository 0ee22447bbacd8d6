import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { NetworkError } from './problem';
import { createReconnect } from './reconnect';

beforeEach(() => {
  vi.useFakeTimers();
});
afterEach(() => {
  vi.useRealTimers();
});

function setUp() {
  const state = { isThere: false, resumed: 0, knocks: 0 };
  const reconnect = createReconnect({
    resume: () => {
      state.resumed++;
    },
    isThere: async () => {
      state.knocks++;
      return state.isThere;
    },
  });
  return { state, reconnect };
}

describe('createReconnect', () => {
  it('knocks until the server answers, resumes once, and rests', async () => {
    const { state, reconnect } = setUp();
    for (let i = 0; i < 3; i++) reconnect.failed(new NetworkError());
    await vi.advanceTimersByTimeAsync(9000);
    expect(state).toMatchObject({ knocks: 2, resumed: 0 });
    state.isThere = true;
    await vi.advanceTimersByTimeAsync(60_000);
    expect(state).toMatchObject({ knocks: 3, resumed: 1 });
  });

  it('takes the hint that the network is back at once', async () => {
    const { state, reconnect } = setUp();
    reconnect.failed(new NetworkError());
    state.isThere = true;
    reconnect.hint();
    await vi.advanceTimersByTimeAsync(0);
    expect(state).toMatchObject({ knocks: 1, resumed: 1 });
  });

  it('does nothing any more once stopped, even with a knock under way', async () => {
    const { state, reconnect } = setUp();
    state.isThere = true;
    reconnect.failed(new NetworkError());
    reconnect.hint();
    reconnect.stop();
    await vi.advanceTimersByTimeAsync(60_000);
    expect(state.resumed).toBe(0);
  });

  it('leaves other errors and needless hints alone', async () => {
    const { state, reconnect } = setUp();
    reconnect.failed(new Error('refused'));
    reconnect.hint();
    await vi.advanceTimersByTimeAsync(60_000);
    expect(state.knocks).toBe(0);
  });
});
