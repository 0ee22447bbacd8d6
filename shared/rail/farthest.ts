import { EngineError } from '../engine/errors';
import { HOLD_TOLERANCE, tightestHeadroom } from '../engine/headroom';
import { compileRail } from '../engine/rail';
import type { RailDocument } from '../schemas/rail-document.schema';
import { networkOf } from './network';
import { targetMask } from './target-mask';

export interface Farthest {
  /** Metres, rounded down to 0.1 mm; null with a reason. */
  distance_m: number | null;
  reason: string | null;
}

/** Growth from one tried distance to the next, and how finely the last step is halved (metres). */
const GROWTH = 1.5;
const RESOLUTION_M = 1e-4;

/**
 * The farthest that all capacitors of bank line `index` may sit from the load before the rail is short, the other lines
 * where they are planned. Found by going outwards from the planned distance (×1.5) and halving the first step that
 * fails; at most the plane pair's diagonal. Where the rail does not hold as planned, or the plane is not known, it says so.
 */
export function farthestDistance(document: RailDocument, index: number): Farthest {
  const geometry = document.rail.plane?.geometry;
  if (!geometry) return { distance_m: null, reason: 'the plane pair is not described' };
  const target = targetMask(document.rail);
  const planned = document.bank[index].distance_m ?? 0;
  const holdsAt = (distance_m: number): boolean => {
    const bank = document.bank.map((line, i) => (i === index ? { ...line, distance_m } : line));
    try {
      const rail = compileRail(networkOf({ ...document, bank }));
      const tightest = tightestHeadroom(rail, document.rail.band_Hz, target);
      return tightest.impedance_ohm <= tightest.target_ohm * (1 + HOLD_TOLERANCE);
    } catch (error) {
      if (error instanceof EngineError) return false;
      throw error;
    }
  };
  if (!holdsAt(planned)) return { distance_m: null, reason: 'the rail is short as planned' };
  const limit = Math.hypot(geometry.length_m, geometry.width_m);
  let good = planned;
  let bad = Math.max(planned, Math.sqrt(geometry.via_radius_m * geometry.load_radius_m));
  do {
    bad = Math.min(bad * GROWTH, limit);
    if (!holdsAt(bad)) break;
    good = bad;
  } while (bad < limit);
  if (good >= limit) return { distance_m: floorTenth(limit), reason: 'anywhere on the plane pair' };
  while (bad - good > RESOLUTION_M) {
    const middle = 0.5 * (good + bad);
    if (holdsAt(middle)) good = middle;
    else bad = middle;
  }
  return { distance_m: Math.max(planned, floorTenth(good)), reason: null };
}

const floorTenth = (metres: number) => Math.floor(metres * 1e4 + 1e-9) / 1e4;
