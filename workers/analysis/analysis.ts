import { branchAdmittance } from '@shared/engine/branch';
import { type Curve, sweepCurve } from '@shared/engine/curve';
import { HOLD_TOLERANCE, holds, surfaceMaxima, type Tightest } from '@shared/engine/headroom';
import { peaksOfCurve } from '@shared/engine/peaks';
import { cavityResonances } from '@shared/engine/plane';
import { type CompiledRail, compileRail } from '@shared/engine/rail';
import { memberShares } from '@shared/engine/shares';
import { isExtrapolated } from '@shared/engine/table';
import { targetAt } from '@shared/engine/target';
import { bankFigures } from '@shared/rail/bank-figures';
import { lineModel, networkWith } from '@shared/rail/network';
import { describedPeak } from '@shared/rail/revision';
import { targetMask } from '@shared/rail/target-mask';
import { guard } from '../host/guard';
import type { AnalysisApi, BenchAnalysis, BenchBreak, BenchMember, BenchRequest } from './analysis.interface';

/** Everything the bench shows of a rail, computed in one pass. Plain class: runs in a worker or in the same process. */
export class Analysis implements AnalysisApi {
  async analyse(request: BenchRequest) {
    return guard(() => analyseBench(request));
  }
}

export function analyseBench({ spec, lines, span_Hz }: BenchRequest): BenchAnalysis {
  const start = performance.now();
  const models = lines.map((line) =>
    lineModel(spec, line.part, {
      count: line.count,
      ...(line.mount_H !== null && { mount_H: line.mount_H }),
      ...(line.distance_m !== null && { distance_m: line.distance_m }),
    }),
  );
  const rail = compileRail(networkWith(spec, models));
  const target = targetMask(spec);
  const band = spec.band_Hz;
  const corners = Array.from(target.frequency_Hz);
  const surface = surfaceMaxima(rail, band, target);
  const tightest = surface.reduce((worst, next) => (next.headroom_dB < worst.headroom_dB ? next : worst));
  const include = [...band, ...corners, ...surface.map((m) => m.frequency_Hz)];
  const curve = sweepCurve(rail, span_Hz[0], span_Hz[1], { include_Hz: include });
  const frequency_Hz = curve.frequency_Hz;
  const peaks = peaksOfCurve(rail, curve).map((peak) => describedPeak(peak, rail, target, band));
  const geometry = spec.plane?.geometry;
  const cavities = geometry
    ? cavityResonances(geometry.length_m, geometry.width_m, geometry.relative_permittivity)
    : [];
  return {
    frequency_Hz,
    magnitude_ohm: curve.logMagnitude.map(Math.exp),
    target_ohm: frequency_Hz.map((f) => (f >= band[0] && f <= band[1] ? targetAt(target, f) : Number.NaN)),
    members: membersOver(rail, frequency_Hz, models),
    peaks,
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
}

function membersOver(
  rail: CompiledRail,
  frequency_Hz: Float64Array,
  models: readonly { inductance_H: number }[],
): BenchMember[] {
  const y = new Float64Array(4);
  return memberShares(rail, frequency_Hz).map(({ member, re, im }) => {
    const share = re.map((value, i) => Math.hypot(value, im[i]));
    if (member < 0)
      return { role: 'die', id: 'die', line: -1, magnitude_ohm: null, share, inductance_H: null };
    const { role, id, line, branch, count } = rail.members[member];
    const each = Math.max(count, 1);
    const magnitude_ohm = frequency_Hz.map((f) => {
      branchAdmittance(branch, f, y, id);
      return 1 / (each * Math.hypot(y[0], y[1]));
    });
    return {
      role,
      id,
      line,
      magnitude_ohm,
      share,
      inductance_H: line < 0 ? null : models[line].inductance_H,
    };
  });
}

function breaksOf(rail: CompiledRail, surface: readonly Tightest[]): BenchBreak[] {
  const y = new Float64Array(4);
  return surface
    .filter((point) => point.impedance_ohm > point.target_ohm * (1 + HOLD_TOLERANCE))
    .sort((a, b) => a.headroom_dB - b.headroom_dB)
    .map((point) => {
      let inductiveMember: number | null = null;
      let capacitiveMember: number | null = null;
      let most = 0;
      let least = 0;
      rail.members.forEach((member, k) => {
        if (member.count === 0) return;
        branchAdmittance(member.branch, point.frequency_Hz, y);
        const b = member.count * y[1];
        if (b > most) {
          most = b;
          capacitiveMember = k;
        }
        if (b < least) {
          least = b;
          inductiveMember = k;
        }
      });
      const id = (k: number | null) => (k === null ? null : rail.members[k].id);
      return {
        ...point,
        inductiveMember,
        capacitiveMember,
        inductive: id(inductiveMember),
        capacitive: id(capacitiveMember),
      };
    });
}

function continuesTable(rail: CompiledRail, curve: Curve): boolean {
  const ends = [curve.frequency_Hz[0], curve.frequency_Hz[curve.frequency_Hz.length - 1]];
  return rail.members.some(
    ({ branch }) => branch.kind === 'table' && ends.some((f) => isExtrapolated(branch.table, f)),
  );
}
