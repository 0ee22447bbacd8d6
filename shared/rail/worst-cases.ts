import { EngineError } from '../engine/errors';
import { holds, type Tightest, tightestHeadroom } from '../engine/headroom';
import { impedanceOver } from '../engine/impedance-over';
import { intervalBound } from '../engine/interval';
import { compileRail } from '../engine/rail';
import type { DocumentPart, RailDocument } from '../schemas/rail-document.schema';
import { conditionsOf } from './conditions';
import { type Corner, cornerName, cornersOf } from './corner';
import { documentIn, type PartInCorner, partIn, tableShift } from './in-service';
import { networkOf } from './network';
import { targetMask } from './target-mask';

/** Headroom of a rail at one corner of its conditions. */
export interface CornerResult {
  corner: Corner;
  name: string;
  tightest: Tightest;
  holds: boolean;
}

/** Headroom of a rail whose parts are already what they are to be. Throws EngineError naming the field at fault. */
export function headroomOf(document: RailDocument): { tightest: Tightest; holds: boolean } {
  const tightest = tightestHeadroom(
    compileRail(networkOf(document)),
    document.rail.band_Hz,
    targetMask(document.rail),
  );
  return { tightest, holds: holds(tightest) };
}

/** Every corner of the rail's conditions, each exact at its own refined peaks, the worst first. */
export function cornerResults(document: RailDocument): CornerResult[] {
  return cornersOf(conditionsOf(document.rail).conditions)
    .map((corner) => ({ corner, name: cornerName(corner), ...headroomOf(documentIn(document, corner)) }))
    .sort((a, b) => a.tightest.headroom_dB - b.tightest.headroom_dB);
}

/** |Z| over a list of frequencies between its least and its most. */
export interface Envelope {
  /** Over all corners that move all parts alike, ohm. */
  low_ohm: Float64Array;
  high_ohm: Float64Array;
  /** No mixture of parts, each anywhere in its own range, lies above this (ohm); never below `high_ohm`. */
  bound_ohm: Float64Array;
}

/** The envelope of |Z| over the corners, and the bound for parts that differ from each other. */
export function envelopeOver(document: RailDocument, frequency_Hz: Float64Array): Envelope {
  const n = frequency_Hz.length;
  const low_ohm = new Float64Array(n).fill(Number.POSITIVE_INFINITY);
  const high_ohm = new Float64Array(n);
  for (const corner of cornersOf(conditionsOf(document.rail).conditions)) {
    const { re_ohm, im_ohm } = impedanceOver(
      compileRail(networkOf(documentIn(document, corner))),
      frequency_Hz,
    );
    for (let i = 0; i < n; i++) {
      const z = Math.sqrt(re_ohm[i] * re_ohm[i] + im_ohm[i] * im_ohm[i]);
      if (z < low_ohm[i]) low_ohm[i] = z;
      if (z > high_ohm[i]) high_ohm[i] = z;
    }
  }
  const [lowest, highest] = extremes(document);
  const bound_ohm = intervalBound(
    compileRail(networkOf(lowest)),
    compileRail(networkOf(highest)),
    frequency_Hz,
  ).map((bound, i) => Math.max(bound, high_ohm[i]));
  return { low_ohm, high_ohm, bound_ohm };
}

/** The rail with every part at the least, and at the most, that its C, ESR and ESL come to over all corners. */
export function extremes(document: RailDocument): [RailDocument, RailDocument] {
  const corners = cornersOf(conditionsOf(document.rail).conditions);
  const pairs = document.parts.map((part) =>
    rangeOf(
      part,
      corners.map((corner) => partIn(part, document.rail, corner)),
    ),
  );
  return [
    { ...document, parts: pairs.map(([low]) => low) },
    { ...document, parts: pairs.map(([, high]) => high) },
  ];
}

function rangeOf(part: DocumentPart, selves: readonly PartInCorner[]): [PartInCorner, PartInCorner] {
  const end = (pick: (...values: number[]) => number): PartInCorner => {
    const capacitance_F = pick(...selves.map((self) => self.capacitance_F));
    const esr_ohm = pick(...selves.map((self) => self.esr_ohm));
    const esl_H = pick(...selves.map((self) => self.esl_H));
    const factor = part.esr_ohm > 0 ? esr_ohm / part.esr_ohm : 1;
    return {
      ...part,
      capacitance_F,
      esr_ohm,
      esl_H,
      ...(part.esr_table && {
        esr_table: part.esr_table.map(([f, r]): [number, number] => [f, r * factor]),
      }),
      ...(part.impedance_table && {
        table_shift: tableShift(
          part.impedance_table,
          capacitance_F / part.capacitance_F,
          factor,
          part.esl_H > 0 ? esl_H / part.esl_H : 1,
        ),
      }),
    };
  };
  return [end(Math.min), end(Math.max)];
}

/** One line's answer when one of its capacitors is open. */
export interface MissingPart {
  /** Index into the document's bank. */
  line: number;
  part: string;
  /** null: nothing is left that could carry the current. */
  tightest: Tightest | null;
  holds: boolean;
}

/**
 * Every single capacitor open, each re-solved exactly, the one that hurts most first. Capacitors of one line are equal, so one
 * answer a line covers them all. Parts are taken as the document has them: give it the rail in service.
 */
export function missingParts(document: RailDocument): MissingPart[] {
  return document.bank
    .map((line, index) => ({ line: index, part: line.part, ...withOneOpen(document, index) }))
    .filter((one) => document.bank[one.line].count > 0)
    .sort((a, b) => headroomDB(a.tightest) - headroomDB(b.tightest));
}

const headroomDB = (tightest: Tightest | null) => tightest?.headroom_dB ?? Number.NEGATIVE_INFINITY;

function withOneOpen(document: RailDocument, index: number): Pick<MissingPart, 'tightest' | 'holds'> {
  const bank = document.bank.flatMap((line, i) => {
    if (i !== index) return [line];
    return line.count > 1 ? [{ ...line, count: line.count - 1 }] : [];
  });
  try {
    return headroomOf({ ...document, bank });
  } catch (error) {
    if (error instanceof EngineError && error.field === 'bank') return { tightest: null, holds: false };
    throw error;
  }
}
