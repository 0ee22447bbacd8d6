import { EngineError } from '../engine/errors';
import { compileRail } from '../engine/rail';
import {
  type LineSpread,
  runYield,
  type YieldOptions,
  type YieldProgress,
  type YieldResult,
} from '../engine/yield';
import type { RailDocument } from '../schemas/rail-document.schema';
import { conditionsOf } from './conditions';
import { type Corner, type End, IN_SERVICE } from './corner';
import { documentIn, serviceValues } from './in-service';
import { networkOf } from './network';
import { targetMask } from './target-mask';

/** A yield with its members named by bank line. */
export interface RailYield extends Omit<YieldResult, 'influence'> {
  seed: number;
  influence: { line: number; part: string; value: 'capacitance' | 'esr' | 'esl'; share: number }[];
}

/**
 * Yield of a rail in service over its parts' tolerances (those that its conditions name), at the usual temperature and full age:
 * Monte Carlo with progress. Throws EngineError where nothing varies.
 */
export function* railYield(
  document: RailDocument,
  options: YieldOptions,
): Generator<YieldProgress, RailYield> {
  const serving = documentIn(document, IN_SERVICE);
  const rail = compileRail(networkOf(serving));
  const spreads = spreadsOf(document, rail.members);
  const isMoving = spreads.some((one) =>
    [one.capacitance, one.esr, one.esl].some(([low, high]) => high > low),
  );
  if (!isMoving) throw new EngineError('conditions.vary', 'no tolerance varies: there is nothing to draw');
  const result = yield* runYield(rail, spreads, document.rail.band_Hz, targetMask(document.rail), options);
  return {
    ...result,
    seed: options.seed,
    influence: result.influence.map(({ member, value, share }) => ({
      line: rail.members[member].line,
      part: rail.members[member].id,
      value,
      share,
    })),
  };
}

const NONE: readonly [number, number] = [1, 1];

function spreadsOf(document: RailDocument, members: ReturnType<typeof compileRail>['members']): LineSpread[] {
  const { vary } = conditionsOf(document.rail).conditions;
  const parts = new Map(document.parts.map((part) => [part.id, part]));
  return members.flatMap((member, index) => {
    const part = member.role === 'line' ? parts.get(member.id) : undefined;
    if (!part || member.count === 0) return [];
    const at = (end: End) => {
      const corner: Corner = { ...IN_SERVICE, capacitance: end, esr: end, esl: end };
      const { factors, esr_factor, esl_factor } = serviceValues(part, document.rail, corner);
      // The band of a temperature code is no tolerance: only the letter's own ends count here.
      const capacitance = factors.find((one) => one.kind === 'tolerance')?.factor ?? 1;
      return { capacitance, esr: esr_factor, esl: esl_factor };
    };
    const [low, high] = [at('low'), at('high')];
    const range = (value: 'capacitance' | 'esr' | 'esl') =>
      vary.includes(value) ? ([low[value], high[value]] as const) : NONE;
    return [
      {
        member: index,
        capacitance: range('capacitance'),
        esr: range('esr'),
        esl: range('esl'),
        esl_H: part.esl_H,
      },
    ];
  });
}
