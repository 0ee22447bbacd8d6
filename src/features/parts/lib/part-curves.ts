import { documentPart } from '@shared/rail/document';
import type { PartInCorner } from '@shared/rail/in-service';
import type { Part } from '@shared/schemas/part.schema';
import type { DocumentPart } from '@shared/schemas/rail-document.schema';
import { decadesAround } from '@/components/chart/axis';
import { branchCurve, lowestPoint, magnitude_ohm, partBranch, partInSituation } from './branch-curve';
import { orRefusal } from './refusal';
import type { Situation } from './situation';

export type Curve = readonly (readonly [frequency_Hz: number, impedance_ohm: number])[];

export interface PartCurves {
  band: [number, number];
  impedance: [number, number];
  /** As mounted, in service; empty where the engine refuses the situation. */
  service: Curve;
  /** As mounted, with catalogue values. */
  catalogue: Curve;
  alone: Curve;
  /** Points of the measured table, of the part alone. */
  measured: Curve;
  serviceLowest: readonly [number, number] | null;
  catalogueLowest: readonly [number, number] | null;
}

/** Decades around the mounted part's resonance: the catalogue's, so that the paper keeps still while one drags. */
function bandOf(part: DocumentPart): [number, number] {
  const inductance_H = part.esl_H + part.mount_H;
  const omega = inductance_H > 0 ? 1 / Math.sqrt(inductance_H * part.capacitance_F) : 1 / part.capacitance_F;
  const f0 = omega / (2 * Math.PI);
  return decadesAround(f0 / 300, f0 * 100);
}

/** Where the mounted part is lowest by its catalogue values; null where nowhere, or where the engine refuses them. */
export function lowestOf(part: Part): PartCurves['catalogueLowest'] {
  const document = documentPart(part);
  const answer = orRefusal(() => branchCurve(partBranch(document, 'mounted'), bandOf(document), 0));
  return 'value' in answer ? lowestPoint(answer.value) : null;
}

/** The curves of one part's page. Throws EngineError where the part's own catalogue values are refused. */
export function partCurves(part: DocumentPart, at: Situation): PartCurves {
  const band = bandOf(part);
  const mounted = partBranch(part, 'mounted');
  const top = Math.max(...band.map((f) => magnitude_ohm(mounted, f)));
  const bare = Math.min(...branchCurve(mounted, band, 0).map(([, z]) => z));
  const impedance = decadesAround(Math.max(bare / 1.5, top / 1e6), top);
  const curve = (branchPart: PartInCorner, how: 'mounted' | 'alone') =>
    branchCurve(partBranch(branchPart, how), band, impedance[0]);
  const catalogue = curve(part, 'mounted');
  const inSituation = orRefusal(() => curve(partInSituation(part, at), 'mounted'));
  const service = 'value' in inSituation ? inSituation.value : [];
  return {
    band,
    impedance,
    service,
    catalogue,
    alone: curve(part, 'alone'),
    measured: (part.impedance_table ?? []).map(([f, re, im]) => [f, Math.hypot(re, im)]),
    serviceLowest: service.length > 0 ? lowestPoint(service) : null,
    catalogueLowest: lowestPoint(catalogue),
  };
}
