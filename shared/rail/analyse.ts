import { sweepCurve } from '../engine/curve';
import { holds, type Tightest, tightestHeadroom } from '../engine/headroom';
import { impedanceOver } from '../engine/impedance-over';
import { findPeaks } from '../engine/peaks';
import { type CompiledRail, compileRail } from '../engine/rail';
import type { RailDocument } from '../schemas/rail-document.schema';
import { networkOf } from './network';
import { targetMask } from './target-mask';

/** What the command `analyse` prints. */
export interface Analysis {
  frequency_Hz: number[];
  re_ohm: number[];
  im_ohm: number[];
  peaks: { frequency_Hz: number; impedance_ohm: number }[];
  tightest: Tightest;
  holds: boolean;
}

/**
 * Impedance at the document's `frequencies_Hz`, or at a refined sweep over the band; peaks over the whole span of those
 * frequencies; the tightest headroom over the band. Throws EngineError naming the field at fault.
 */
export function analyseDocument(document: RailDocument): Analysis {
  const rail = compileRail(networkOf(document));
  const band = document.rail.band_Hz;
  const asked = document.frequencies_Hz;
  const tightest = tightestHeadroom(rail, band, targetMask(document.rail));
  const points = asked ? impedanceAt(rail, asked) : impedanceOfSweep(rail, band);
  const low = asked ? Math.min(...spanOf(asked)) : band[0];
  const high = asked ? Math.max(...spanOf(asked)) : band[1];
  const peaks = high > low ? findPeaks(rail, low, high) : [];
  return {
    ...points,
    peaks: peaks.map(({ frequency_Hz, impedance_ohm }) => ({ frequency_Hz, impedance_ohm })),
    tightest,
    holds: holds(tightest),
  };
}

/** Lowest and highest of a list that may be too long to spread into Math.min. */
function spanOf(list: readonly number[]): [number, number] {
  return list.reduce<[number, number]>(
    ([low, high], f) => [Math.min(low, f), Math.max(high, f)],
    [Number.POSITIVE_INFINITY, Number.NEGATIVE_INFINITY],
  );
}

type Points = Pick<Analysis, 'frequency_Hz' | 're_ohm' | 'im_ohm'>;

function impedanceAt(rail: CompiledRail, frequencies: readonly number[]): Points {
  const { re_ohm, im_ohm } = impedanceOver(rail, frequencies);
  return { frequency_Hz: [...frequencies], re_ohm: Array.from(re_ohm), im_ohm: Array.from(im_ohm) };
}

function impedanceOfSweep(rail: CompiledRail, band: readonly [number, number]): Points {
  const curve = sweepCurve(rail, band[0], band[1]);
  return {
    frequency_Hz: Array.from(curve.frequency_Hz),
    re_ohm: Array.from(curve.re_ohm),
    im_ohm: Array.from(curve.im_ohm),
  };
}
