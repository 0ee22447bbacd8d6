import { readFileSync } from 'node:fs';
import type { LineModel } from '@shared/engine/network';
import { flatTarget } from '@shared/engine/target';
import type { MixProblem } from '@shared/search/problem';

interface CasePart {
  id: string;
  capacitance_F: number;
  esr_ohm: number;
  esl_H: number;
  mount_H: number;
  unit_cost: number;
  area_mm2: number;
}

interface CaseDocument {
  rail: {
    target: { impedance_ohm: number };
    band_Hz: [number, number];
    source: { kind: 'rl'; resistance_ohm: number; inductance_H: number };
  };
  parts: CasePart[];
  search: { minimise: 'parts' | 'cost' | 'area' };
}

const lineOf = (part: CasePart): LineModel => ({
  id: part.id,
  count: 0,
  esr_ohm: part.esr_ohm,
  capacitance_F: part.capacitance_F,
  inductance_H: part.esl_H + part.mount_H,
});

/** Search case 1 … 4 of the fixtures as a problem: an rl source, a flat target, every part a candidate. */
export function searchCase(number: number): MixProblem {
  const path = new URL(`../fixtures/search/search-${number}.json`, import.meta.url);
  const { rail, parts, search }: CaseDocument = JSON.parse(readFileSync(path, 'utf8'));
  return {
    network: { source: rail.source, lines: [], observe: 'pins' },
    candidates: parts.map((part) => ({
      id: part.id,
      line: lineOf(part),
      cost: part.unit_cost,
      area_mm2: part.area_mm2,
    })),
    band_Hz: rail.band_Hz,
    target: flatTarget(rail.target.impedance_ohm),
    minimise: search.minimise,
  };
}
