import type { EdgeResponse } from './edge-response';
import type { LoadCurrent } from './load-current';
import { fewestSwings } from './swings';

/** A load that is switched on and off: [time in s, 1 or 0], off before the first. */
export type Switching = (readonly [time_s: number, level: 0 | 1])[];

/** Share of the bound that swings too small to matter may leave out together. */
export const LEAVE_OUT = 1e-3;
/** Width in which a jump of the edge response is caught, as a share of the rise time. */
const NOTCH = 1e-5;
const MOST_EDGES = 2000;

/** In which direction the voltage is driven. */
export type Direction = 'fall' | 'rise';

/**
 * The switching that brings the voltage furthest down or up right after its last moment `peak_s`: the load is on for just as long
 * ago as the edge response goes that way, so that every run of it adds up. Swings so small that all of them add less than
 * LEAVE_OUT are passed over; `longest_s` is how far back a run without end may begin. Time 0 is the first edge. `jumps`: the edge
 * response jumps, up when the edge begins and down when it ends (`rise_s`).
 */
export function worstSwitching(
  { turns }: EdgeResponse,
  direction: Direction,
  longest_s: number,
  rise_s: number,
  jumps: boolean,
): { edges: Switching; peak_s: number } {
  const sign = direction === 'fall' ? 1 : -1;
  const placed = turns.map(([, ohm], i) => {
    const at_s = placeOf(turns, i, rise_s, jumps ? NOTCH * rise_s : 0);
    return { at_s: Number.isFinite(at_s) ? at_s : Math.max(longest_s, turns[i - 1]?.[0] ?? 0), ohm };
  });
  const kept = fewestSwings(placed, sign, LEAVE_OUT, MOST_EDGES);
  const runs = kept
    .slice(1)
    .flatMap((turn, i): [from_s: number, to_s: number][] =>
      sign * (turn.ohm - kept[i].ohm) > 0 ? [[kept[i].at_s, turn.at_s]] : [],
    );
  const peak_s = runs[runs.length - 1]?.[1] ?? 0;
  const edges = runs.reverse().flatMap(([from_s, to_s]): Switching => {
    // A fall ends with the load on, a rise with the load going.
    if (from_s === 0 && direction === 'fall') return [[peak_s - to_s, 1]];
    return [
      [peak_s - to_s, 1],
      [peak_s - from_s, 0],
    ];
  });
  return { edges, peak_s };
}

/** How long ago a turn is in the load: a jump is moved so far that a notch of that width catches it. */
function placeOf(turns: EdgeResponse['turns'], i: number, rise_s: number, notch_s: number): number {
  const after_s = turns[i][0];
  if (after_s === 0 && i > 0) return notch_s;
  const isBeforeJump = after_s === rise_s && turns[i - 1]?.[0] !== rise_s;
  return isBeforeJump ? after_s - notch_s : after_s;
}

/**
 * The load current of a switching whose edges take `rise_s`: the 0/1 signal averaged over the last `rise_s`, times `step_A`. Edges
 * closer than that overlap, and the current does not get all the way.
 */
export function smoothed(edges: Switching, step_A: number, rise_s: number): LoadCurrent {
  if (edges.length === 0) return [[0, 0]];
  if (rise_s === 0)
    return edges.flatMap(([time_s, level]) => [
      [time_s, step_A * (1 - level)],
      [time_s, step_A * level],
    ]);
  const slope = step_A / rise_s;
  const bends = edges.flatMap(([time_s, level]) => {
    const change = level === 1 ? slope : -slope;
    return [
      { time_s, change },
      { time_s: time_s + rise_s, change: -change },
    ];
  });
  bends.sort((a, b) => a.time_s - b.time_s);
  const corners: [number, number][] = [];
  let current_A = 0;
  let now = 0;
  let last_s = bends[0].time_s;
  for (const { time_s, change } of bends) {
    current_A += now * (time_s - last_s);
    corners.push([time_s, Math.min(step_A, Math.max(0, current_A))]);
    now += change;
    last_s = time_s;
  }
  return corners.filter(([time_s], i) => i === 0 || time_s > corners[i - 1][0]);
}
