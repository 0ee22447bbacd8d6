import type { BoardSetup } from '../schemas/board-setup.schema';
import type { Part } from '../schemas/part.schema';
import type { BankLine, SearchSettings } from '../schemas/rail.schema';
import type { DocumentPart, RailDocument } from '../schemas/rail-document.schema';
import type { RailSpec } from '../schemas/rail-spec.schema';
import { ownMount_H } from './setup';

/** A library part as it stands in a document, known there by its part number. */
export function documentPart(part: Part): DocumentPart {
  return {
    id: part.partNumber,
    capacitance_F: part.capacitance_F,
    esr_ohm: part.esr_ohm,
    esl_H: part.esl_H,
    mount_H: part.mount_H,
    ...(part.unit_cost !== null && { unit_cost: part.unit_cost }),
    ...(part.area_mm2 !== null && { area_mm2: part.area_mm2 }),
    ...(part.description && { description: part.description }),
    technology: part.technology,
    ...(part.dielectric && { dielectric: part.dielectric }),
    case: part.caseSize,
    tolerance: part.tolerance,
    rated_voltage_V: part.rated_voltage_V,
    ...(part.height_mm !== null && { height_mm: part.height_mm }),
    termination: part.termination,
    ...(part.state !== 'approved' && { state: part.state }),
    ...(part.bias_curve !== null && { bias_curve: part.bias_curve }),
    ...(part.temperature_curve !== null && { temperature_curve: part.temperature_curve }),
    ...(part.ageing_percent_per_decade !== null && {
      ageing_percent_per_decade: part.ageing_percent_per_decade,
    }),
    ...(part.esr_table !== null && { esr_table: part.esr_table }),
    ...(part.impedance_table !== null && { impedance_table: part.impedance_table }),
    ...(part.esr_tolerance_percent !== null && { esr_tolerance_percent: part.esr_tolerance_percent }),
    ...(part.esl_tolerance_percent !== null && { esl_tolerance_percent: part.esl_tolerance_percent }),
  };
}

/**
 * A rail with its bank as one document. `parts` by id; lines of count 0 and lines whose part is not in `parts` are left
 * out. Lines with a recipe get the mounting inductance that it comes to on this board. With `search`, the candidates that are in
 * `parts` come along.
 */
export function railDocument(
  spec: RailSpec,
  bank: readonly BankLine[],
  parts: ReadonlyMap<string, Part>,
  setup: BoardSetup,
  search?: SearchSettings,
): RailDocument {
  const used = new Map<string, Part>();
  const lines: RailDocument['bank'] = [];
  for (const line of bank) {
    const part = parts.get(line.partId);
    if (!part || line.count === 0) continue;
    used.set(part.id, part);
    const mount = ownMount_H(line, spec, setup);
    lines.push({
      part: part.partNumber,
      count: line.count,
      ...(mount && { mount_H: mount.mount_H }),
      ...(mount?.recipe && { recipe: mount.recipe }),
      ...(line.distance_m !== null && { distance_m: line.distance_m }),
      side: line.side,
      ...(line.locked && { locked: true }),
    });
  }
  const candidates = (search?.candidateIds ?? []).flatMap((id) => parts.get(id) ?? []);
  for (const part of candidates) used.set(part.id, part);
  return {
    format: 'millpond-rail',
    version: 1,
    rail: spec,
    parts: [...used.values()].map(documentPart),
    bank: lines,
    ...(search &&
      candidates.length > 0 && {
        search: {
          minimise: search.minimise,
          candidates: candidates.map((part) => part.partNumber),
          ...(search.max_kinds !== null && { max_kinds: search.max_kinds }),
          max_per_part: search.max_per_part,
          ...newPartDistance(search, bank),
        },
      }),
  };
}

/** Where parts go that are new to the bank: as asked, else no nearer than its farthest line, so that no mix looks too good. */
function newPartDistance(search: SearchSettings, bank: readonly BankLine[]): { distance_m?: number } {
  const distance_m = newPartDistance_m(search, bank);
  return distance_m === null ? {} : { distance_m };
}

/** The distance in metres that the search gives to parts new to the bank; null where nothing is planned. */
export function newPartDistance_m(
  search: Pick<SearchSettings, 'distance_m'>,
  bank: readonly Pick<BankLine, 'distance_m'>[],
): number | null {
  if (search.distance_m !== null) return search.distance_m;
  const planned = bank.flatMap((line) => line.distance_m ?? []);
  return planned.length > 0 ? Math.max(...planned) : null;
}
