import type { BankSum } from '@shared/engine/bank-sum';
import { branchAdmittance } from '@shared/engine/branch';
import { type Curve, partOf, sampleRail, sweepCurve, withPoints } from '@shared/engine/curve';
import { HOLD_TOLERANCE, holds, surfaceMaxima, type Tightest } from '@shared/engine/headroom';
import { makersAt } from '@shared/engine/makers';
import { boardShorted } from '@shared/engine/package-reach';
import { peaksOfCurve } from '@shared/engine/peaks';
import { cavityResonances } from '@shared/engine/plane';
import { type CompiledRail, compileRail } from '@shared/engine/rail';
import { memberShares, type UnitAdmittance } from '@shared/engine/shares';
import { isExtrapolated } from '@shared/engine/table';
import { targetAt } from '@shared/engine/target';
import { bankFigures } from '@shared/rail/bank-figures';
import { partIn, serviceValues } from '@shared/rail/in-service';
import { lineModel, networkWith } from '@shared/rail/network';
import { describedPeak } from '@shared/rail/revision';
import { targetMask } from '@shared/rail/target-mask';
import { guard } from '../host/guard';
import type { AnalysisApi, BenchAnalysis, BenchBreak, BenchMember, BenchRequest } from './analysis.interface';

/** Everything the bench shows of a rail, computed in one pass. Plain class: runs in a worker or in the same process. */
export class Analysis implements AnalysisApi {
  private samples: KeptSamples | null = null;

  async analyse(request: BenchRequest) {
    return guard(() => {
      const { analysis, samples } = analyseBench(request, this.samples);
      this.samples = samples;
      return analysis;
    });
  }
}

/** Admittances over the sweep's starting points, good for every bank that differs in its counts alone. */
export interface KeptSamples {
  key: string;
  bank: BankSum;
}

export function analyseBench(
  request: BenchRequest,
  kept: KeptSamples | null,
): { analysis: BenchAnalysis; samples: KeptSamples } {
  const start = performance.now();
  const { spec, lines, corner, span_Hz } = request;
  const models = lines.map((line) =>
    lineModel(spec, corner ? partIn(line.part, spec, corner) : line.part, {
      count: line.count,
      ...(line.mount_H !== null && { mount_H: line.mount_H }),
      ...(line.distance_m !== null && { distance_m: line.distance_m }),
    }),
  );
  const rail = compileRail(networkWith(spec, models));
  const target = targetMask(spec);
  const band = spec.band_Hz;
  const samples = samplesFor(rail, request, [...band, ...target.frequency_Hz], kept);
  const sweep = sweepCurve(rail, span_Hz[0], span_Hz[1], { samples: samples.bank });
  const surface = surfaceMaxima(rail, band, target, partOf(sweep, band));
  const tightest = surface.reduce((worst, next) => (next.headroom_dB < worst.headroom_dB ? next : worst));
  const exact = peaksOfCurve(rail, sweep);
  const curve = withPoints(
    rail,
    sweep,
    [...surface, ...exact].map((one) => one.frequency_Hz),
  );
  const { frequency_Hz } = curve;
  const geometry = spec.plane?.geometry;
  const cavities = geometry
    ? cavityResonances(geometry.length_m, geometry.width_m, geometry.relative_permittivity)
    : [];
  const analysis: BenchAnalysis = {
    frequency_Hz,
    magnitude_ohm: curve.logMagnitude.map(Math.exp),
    target_ohm: frequency_Hz.map((f) => (f >= band[0] && f <= band[1] ? targetAt(target, f) : Number.NaN)),
    floor_ohm: boardShorted(rail, frequency_Hz),
    members: membersOver(rail, curve, samples.bank, models, request),
    peaks: exact.map((peak) => describedPeak(peak, target, band)),
    breaks: breaksOf(rail, surface),
    tightest,
    holds: holds(tightest),
    figures: bankFigures({
      parts: lines.map((line) => line.part),
      bank: lines.map((line) => ({ part: line.part.id, count: line.count })),
    }),
    cavity_Hz: cavities.filter((f) => f >= span_Hz[0] && f <= span_Hz[1]).sort((a, b) => a - b),
    extrapolated: continuesTable(rail, curve),
    elapsed_ms: performance.now() - start,
  };
  return { analysis, samples };
}

/** The kept samples with this bank's counts, or new ones where anything but a count has changed. */
function samplesFor(
  rail: CompiledRail,
  { spec, lines, corner, span_Hz }: BenchRequest,
  include_Hz: readonly number[],
  kept: KeptSamples | null,
): KeptSamples {
  const key = JSON.stringify([spec, span_Hz, corner, lines.map((line) => ({ ...line, count: 0 }))]);
  if (kept?.key !== key) return { key, bank: sampleRail(rail, span_Hz[0], span_Hz[1], { include_Hz }) };
  kept.bank.setCounts(rail.members.map((member) => member.count));
  return kept;
}

function membersOver(
  rail: CompiledRail,
  curve: Curve,
  samples: BankSum,
  models: readonly { inductance_H: number; capacitance_F: number }[],
  { lines, spec, corner }: BenchRequest,
): BenchMember[] {
  // Of the capacitance: that is what stands beside the mark.
  const estimated = lines.map(
    (line) => corner !== null && serviceValues(line.part, spec, corner).factors.some((one) => one.estimated),
  );
  const unit: UnitAdmittance = (member, point, out) => {
    const sample = curve.sample[point];
    if (sample < 0) return branchAdmittance(rail.members[member].branch, curve.frequency_Hz[point], out);
    out[0] = samples.units[member].g[sample];
    out[1] = samples.units[member].b[sample];
  };
  return memberShares(rail, curve.frequency_Hz, unit).map(({ member, re, im, impedance_ohm }) => {
    // Not Math.hypot: ten times as slow, and nothing here comes near overflow.
    const share = re.map((value, i) => Math.sqrt(value * value + im[i] * im[i]));
    if (member < 0) return { role: 'die', id: 'die', line: -1, magnitude_ohm: null, share, ...NO_PART };
    const { role, id, line, count } = rail.members[member];
    return {
      role,
      id,
      line,
      magnitude_ohm: count > 0 ? impedance_ohm : null,
      share,
      ...(line < 0
        ? NO_PART
        : {
            inductance_H: models[line].inductance_H,
            capacitance_F: models[line].capacitance_F,
            estimated: estimated[line],
          }),
    };
  });
}

const NO_PART = { inductance_H: null, capacitance_F: null, estimated: false };

function breaksOf(rail: CompiledRail, surface: readonly Tightest[]): BenchBreak[] {
  return surface
    .filter((point) => point.impedance_ohm > point.target_ohm * (1 + HOLD_TOLERANCE))
    .sort((a, b) => a.headroom_dB - b.headroom_dB)
    .map((point) => ({ ...point, ...makersAt(rail, point.frequency_Hz) }));
}

function continuesTable(rail: CompiledRail, curve: Curve): boolean {
  const ends = [curve.frequency_Hz[0], curve.frequency_Hz[curve.frequency_Hz.length - 1]];
  return rail.members.some(
    ({ branch }) => branch.kind === 'table' && ends.some((f) => isExtrapolated(branch.table, f)),
  );
}
