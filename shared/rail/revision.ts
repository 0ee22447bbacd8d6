import { EngineError } from '../engine/errors';
import { findPeaks, type Peak } from '../engine/peaks';
import { compileRail } from '../engine/rail';
import { type TargetMask, targetAt } from '../engine/target';
import type { RailDocument } from '../schemas/rail-document.schema';
import type { Instance, RevisionPeak, RevisionRail } from '../schemas/revision.schema';
import { formatQuantity } from '../units/format';
import { checkRail } from './checks';
import { IN_SERVICE } from './corner';
import { farthestDistance } from './farthest';
import { documentIn } from './in-service';
import { networkOf } from './network';
import { summariseRail } from './summary';
import { targetMask } from './target-mask';

/**
 * What a revision keeps of one rail: its document, results by the shared engine, and its capacitors one by one. Peaks and farthest
 * distances are those in service, where the rail has a result there.
 */
export function revisionRail(railId: string, document: RailDocument, firstNumber: number): RevisionRail {
  const summary = summariseRail(document);
  const serving = summary.error === null ? documentIn(document, IN_SERVICE) : document;
  return {
    railId,
    document,
    summary,
    peaks: peaksOf(serving),
    instances: instancesOf(document, serving, firstNumber),
    checks: checkRail(document),
  };
}

/** Each rail's designators start at the next full hundred plus one: C101…, C201…, so that layout sees the rail. */
export function nextBlock(firstNumber: number, instances: number): number {
  return (Math.floor((firstNumber - 1 + Math.max(instances, 1) - 1) / 100) + 1) * 100 + 1;
}

function peaksOf(document: RailDocument): RevisionPeak[] {
  try {
    const rail = compileRail(networkOf(document));
    const target = targetMask(document.rail);
    return findPeaks(rail, ...document.rail.band_Hz).map((peak) =>
      describedPeak(peak, target, document.rail.band_Hz),
    );
  } catch (error) {
    if (error instanceof EngineError) return [];
    throw error;
  }
}

/** A peak with the target there (null outside the band). */
export function describedPeak(
  peak: Peak,
  target: TargetMask,
  band_Hz: readonly [number, number],
): RevisionPeak {
  const inBand = peak.frequency_Hz >= band_Hz[0] && peak.frequency_Hz <= band_Hz[1];
  return {
    frequency_Hz: peak.frequency_Hz,
    impedance_ohm: peak.impedance_ohm,
    target_ohm: inBand ? targetAt(target, peak.frequency_Hz) : null,
    inductive: peak.inductive,
    capacitive: peak.capacitive,
    q: peak.q !== null && Number.isFinite(peak.q) ? peak.q : null,
  };
}

function instancesOf(document: RailDocument, serving: RailDocument, firstNumber: number): Instance[] {
  const parts = new Map(document.parts.map((part) => [part.id, part]));
  let number = firstNumber;
  return document.bank.flatMap((line, index) => {
    const part = parts.get(line.part);
    if (!part) return [];
    const farthest = farthestDistance(serving, index);
    return Array.from({ length: line.count }, () => ({
      designator: `C${number++}`,
      partNumber: part.id,
      value: formatQuantity(part.capacitance_F, 'F', { trim: true }),
      caseSize: part.case ?? '',
      side: line.side ?? 'top',
      rail: document.rail.name,
      mount_H: line.mount_H ?? part.mount_H,
      ...(line.recipe && { recipe: line.recipe }),
      distance_m: line.distance_m ?? null,
      farthest_m: farthest.distance_m,
      farthestReason: farthest.reason,
    }));
  });
}
