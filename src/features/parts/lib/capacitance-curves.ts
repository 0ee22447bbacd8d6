import { readDielectric } from '@shared/engine/service/dielectric';
import { inService } from '@shared/engine/service/in-service';
import { temperatureFactor } from '@shared/engine/service/temperature';
import type { DocumentPart } from '@shared/schemas/rail-document.schema';
import { orRefusal } from './refusal';
import { CATALOGUE, type Situation } from './situation';

export interface CurvePoint {
  x: number;
  capacitance_F: number;
  /** Ends of the band where only limits are known; both equal to the value elsewhere. */
  low_F: number;
  high_F: number;
  estimated: boolean;
}

export interface CapacitanceCurve {
  range: readonly [number, number];
  /** With everything else as chosen. */
  chosen: CurvePoint[];
  /** With nothing else than this: the other conditions are those of the catalogue. */
  alone: CurvePoint[];
}

const STEPS = 120;

/** Even places over a range, and the curve's own points, so that its bends show. */
function places(
  [low, high]: readonly [number, number],
  own: readonly (readonly [number, number])[],
): number[] {
  const even = Array.from({ length: STEPS + 1 }, (_, i) => low + ((high - low) * i) / STEPS);
  even[STEPS] = high;
  const inside = own.map(([x]) => x).filter((x) => x > low && x < high);
  return [...new Set([...even, ...inside])].sort((a, b) => a - b);
}

function overBias(part: DocumentPart, at: Situation, xs: readonly number[]): CurvePoint[] {
  return xs.map((voltage_V) => {
    const { capacitance_F, factors } = inService(part, { ...at, voltage_V });
    const estimated = factors.some((one) => one.kind === 'bias' && one.estimated);
    return { x: voltage_V, capacitance_F, low_F: capacitance_F, high_F: capacitance_F, estimated };
  });
}

function overTemperature(part: DocumentPart, at: Situation, xs: readonly number[]): CurvePoint[] {
  return xs.map((temperature_C) => {
    const { capacitance_F, factors } = inService(part, { ...at, temperature_C });
    const used = factors.find((one) => one.kind === 'temperature')?.factor ?? 1;
    const { low, high, estimated } = temperatureFactor(part, temperature_C);
    return {
      x: temperature_C,
      capacitance_F,
      low_F: (capacitance_F / used) * low,
      high_F: (capacitance_F / used) * high,
      estimated,
    };
  });
}

/** C over DC bias from nothing to the rating. Throws EngineError as `inService` does. */
export function biasCurves(
  part: DocumentPart & { rated_voltage_V: number },
  at: Situation,
): CapacitanceCurve {
  const range = [0, part.rated_voltage_V] as const;
  const xs = places(range, part.bias_curve ?? []);
  return { range, chosen: overBias(part, at, xs), alone: overBias(part, CATALOGUE, xs) };
}

/** What is said of temperatures: the curve's, else the code's, else the usual −55 … 125 °C. */
export function knownTemperatures(
  part: Pick<DocumentPart, 'temperature_curve' | 'dielectric' | 'technology'>,
): readonly [number, number] {
  const curve = part.temperature_curve;
  if (curve) return [curve[0][0], curve[curve.length - 1][0]];
  const code = part.technology === 'ceramic' ? readDielectric(part.dielectric ?? '') : null;
  return code ? [code.low_C, code.high_C] : [-55, 125];
}

/** What the chart shows: the known range, widened to a temperature outside it, where an estimate stands in. */
export function shownTemperatures(part: DocumentPart, temperature_C: number): readonly [number, number] {
  const [low, high] = knownTemperatures(part);
  return [Math.min(low, temperature_C), Math.max(high, temperature_C)];
}

/**
 * C over temperature; without the chosen curve where the engine refuses the rest of the situation. Throws EngineError where it
 * refuses the part itself.
 */
export function temperatureCurves(part: DocumentPart, at: Situation): CapacitanceCurve {
  const range = shownTemperatures(part, at.temperature_C);
  const xs = places(range, part.temperature_curve ?? []);
  const chosen = orRefusal(() => overTemperature(part, at, xs));
  return {
    range,
    chosen: 'value' in chosen ? chosen.value : [],
    alone: overTemperature(part, CATALOGUE, xs),
  };
}

/** Stretches of points that are estimated or not, each beginning where the one before ends. */
export function stretches(points: readonly CurvePoint[]): { estimated: boolean; points: CurvePoint[] }[] {
  const found: { estimated: boolean; points: CurvePoint[] }[] = [];
  for (let i = 1; i < points.length; i++) {
    const [a, b] = [points[i - 1], points[i]];
    // A single point that is exact by definition (0 V, 25 °C) does not make the line between its neighbours known.
    const estimated = a.estimated || b.estimated;
    const last = found[found.length - 1];
    if (last?.estimated === estimated) last.points.push(b);
    else found.push({ estimated, points: [a, b] });
  }
  return found;
}
