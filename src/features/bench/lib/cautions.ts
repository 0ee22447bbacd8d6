import type { Part } from '@shared/schemas/part.schema';
import type { BankLine } from '@shared/schemas/rail.schema';
import type { RailSpec } from '@shared/schemas/rail-spec.schema';
import { formatQuantity, formatVolts } from '@shared/units/format';

export interface Caution {
  title: string;
  text: string;
}

/** Above this direct voltage a rail can shock (extra-low voltage limit of common safety standards: 60 V DC). */
export const HAZARD_V = 60;
/** Cases whose longest side is 3.2 mm or more crack easily when the board bends (common practice). */
const LARGE_CASES = new Set(['1206', '1210', '1808', '1812', '1825', '2220', '2225']);

/** The usual cautions, where they apply to this rail and this bank. */
export function cautionsFor(
  spec: RailSpec,
  lines: readonly BankLine[],
  parts: ReadonlyMap<string, Part>,
  cavity_Hz: readonly number[],
): Caution[] {
  const used = lines.filter((line) => line.count > 0).flatMap((line) => parts.get(line.partId) ?? []);
  const cautions: Caution[] = [];
  if (spec.voltage_V > HAZARD_V) {
    const charge = lines.reduce(
      (sum, line) => sum + line.count * (parts.get(line.partId)?.capacitance_F ?? 0),
      0,
    );
    const energy = 0.5 * charge * spec.voltage_V ** 2;
    cautions.push({
      title: `above ${HAZARD_V} V DC`,
      text: `Shock hazard. The bank stores ½CV² = ${formatQuantity(energy, 'J')} at ${formatVolts(spec.voltage_V)}: discharge it and check before touching. The applicable safety standard comes first.`,
    });
  }
  const under = used.filter((part) => part.rated_voltage_V < spec.voltage_V);
  if (under.length > 0)
    cautions.push({
      title: 'rated below the rail',
      text: `${under.map((part) => part.partNumber).join(', ')}: rated voltage is below ${formatVolts(spec.voltage_V)}. Do not use.`,
    });
  const retired = used.filter((part) => part.state !== 'approved');
  if (retired.length > 0)
    cautions.push({
      title: 'not approved',
      text: retired
        .map((part) => `${part.partNumber} is ${part.state === 'draft' ? 'a draft' : 'retired'}`)
        .join('; '),
    });
  if (used.some((part) => part.technology === 'ceramic' && /^[XYZ]\d[A-Z]$/.test(part.dielectric)))
    cautions.push({
      title: 'Class II ceramics at catalogue values',
      text: 'Bias, temperature and age take capacitance away, often half of it near the rated voltage. The figures here do not contain that loss.',
    });
  if (used.some((part) => part.technology === 'ceramic' && LARGE_CASES.has(part.caseSize)))
    cautions.push({
      title: 'large ceramics',
      text: 'They crack when the board bends: keep them from edges, score lines, connectors and screws, or take soft terminations.',
    });
  if (
    used.some(
      (part) =>
        part.technology === 'tantalum' || part.technology === 'aluminium' || part.technology === 'polymer',
    )
  )
    cautions.push({
      title: 'polarised parts',
      text: 'Mind the orientation, the voltage derating, and the inrush into the bank at start-up against the regulator’s limit.',
    });
  const inBand = cavity_Hz.filter((f) => f <= spec.band_Hz[1]);
  if (inBand.length > 0)
    cautions.push({
      title: 'plane cavity in the band',
      text: `The plane pair resonates at ${inBand.map((f) => formatQuantity(f, 'Hz')).join(' and ')}: from there on the one-node model does not hold.`,
    });
  return cautions;
}
