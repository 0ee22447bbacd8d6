import type { RailWithParts } from '@shared/schemas/rail.schema';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { ApiError, NetworkError } from '@/lib/problem';
import { type RailEdit, RailSaver, type SaveState } from './rail-saver';

const ID = '00000000-0000-4000-8000-000000000001';

function rail(version: number): RailWithParts {
  return {
    rail: {
      id: ID,
      boardId: ID,
      position: 0,
      version,
      updatedAt: '2026-12-01T12:00:00.000Z',
      updatedBy: { id: ID, name: 'Ines' },
      spec: {
        name: 'VDD',
        voltage_V: 1,
        target: { kind: 'flat', impedance_ohm: 0.01 },
        band_Hz: [1e4, 1e7],
        source: { kind: 'rl', resistance_ohm: 1e-3, inductance_H: 1e-8 },
        observe: 'pins',
      },
      bank: [],
      search: { minimise: 'parts', candidateIds: null, max_kinds: null, max_per_part: 80, distance_m: null },
      summary: {
        engineVersion: '1',
        holds: null,
        tightest: null,
        catalogue: null,
        worst: null,
        missing: null,
        parts: 0,
        kinds: 0,
        cost: 0,
        area_mm2: 0,
        error: null,
      },
    },
    parts: [],
  };
}

const line = (count: number): RailEdit => ({
  bank: [{ partId: ID, count, mount_H: null, recipeId: null, distance_m: null, side: 'top', locked: false }],
});

function saver(
  send: (body: RailEdit & { version: number }) => Promise<RailWithParts>,
  kept: string | null = null,
) {
  const states: SaveState[] = [];
  const saved: RailWithParts[] = [];
  let stored = kept;
  const it = new RailSaver({
    send,
    version: 3,
    savedAt: 0,
    store: {
      read: () => stored,
      write: (text) => {
        stored = text;
      },
    },
    onState: (state) => states.push(state),
    onSaved: (answer) => saved.push(answer),
  });
  return { it, states, saved, stored: () => stored };
}

beforeEach(() => void vi.useFakeTimers());
afterEach(() => void vi.useRealTimers());

describe('saving a rail', () => {
  it('gathers quick edits into one save and goes on from the new version', async () => {
    const send = vi.fn(async (body: { version: number }) => rail(body.version + 1));
    const { it: one, states } = saver(send);
    for (let i = 1; i <= 4; i++) one.edit(line(i));
    await vi.advanceTimersByTimeAsync(400);
    expect(send).toHaveBeenCalledTimes(1);
    expect(send.mock.calls[0][0]).toMatchObject({ version: 3, ...line(4) });
    one.edit(line(9));
    await vi.advanceTimersByTimeAsync(400);
    expect(send.mock.calls[1][0]).toMatchObject({ version: 4 });
    expect(states.at(-1)?.kind).toBe('saved');
  });

  it('keeps an edit while the server is away and sends it again by itself', async () => {
    let away = true;
    const send = vi.fn(async (body: { version: number }) => {
      if (away) throw new NetworkError();
      return rail(body.version + 1);
    });
    const { it: one, states, stored } = saver(send);
    one.edit(line(2));
    await vi.advanceTimersByTimeAsync(400);
    expect(states.at(-1)?.kind).toBe('offline');
    expect(stored()).toContain('"count":2');
    away = false;
    await vi.advanceTimersByTimeAsync(2000);
    expect(states.at(-1)?.kind).toBe('saved');
    expect(stored()).toBeNull();
  });

  it('stops at a conflict and lets one choose', async () => {
    let newer = true;
    const send = vi.fn(async (body: { version: number }) => {
      if (newer)
        throw new ApiError({
          type: 'about:blank',
          title: 'conflict',
          status: 409,
          current: rail(7),
          changedBy: { id: ID, name: 'Ines' },
        });
      return rail(body.version + 1);
    });
    const { it: one, states } = saver(send);
    one.edit(line(2));
    await vi.advanceTimersByTimeAsync(400);
    expect(states.at(-1)).toMatchObject({ kind: 'conflict', changedBy: { name: 'Ines' } });
    one.edit(line(3));
    await vi.advanceTimersByTimeAsync(5000);
    expect(send).toHaveBeenCalledTimes(1);
    newer = false;
    one.settle('mine');
    await vi.advanceTimersByTimeAsync(10);
    expect(send.mock.calls[1][0]).toMatchObject({ version: 7, ...line(3) });
  });

  it('waits for a new session and goes on then', async () => {
    let out = true;
    const send = vi.fn(async (body: { version: number }) => {
      if (out) throw new ApiError({ type: 'about:blank', title: 'signed out', status: 401 });
      return rail(body.version + 1);
    });
    const { it: one, states } = saver(send);
    one.edit(line(2));
    await vi.advanceTimersByTimeAsync(400);
    expect(states.at(-1)?.kind).toBe('signed-out');
    out = false;
    one.resume();
    await vi.advanceTimersByTimeAsync(10);
    expect(states.at(-1)?.kind).toBe('saved');
  });

  it('sends what a closed page left behind', async () => {
    const send = vi.fn(async (body: RailEdit & { version: number }) => rail(body.version + 1));
    const { it: one } = saver(send, JSON.stringify({ version: 2, edit: line(5) }));
    expect(one.restore()).toEqual(line(5));
    await vi.advanceTimersByTimeAsync(400);
    expect(send.mock.calls[0][0]).toMatchObject({ version: 2, ...line(5) });
  });
});
