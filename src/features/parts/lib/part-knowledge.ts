import { ageingRate, REFERENCE_AGE_H } from '@shared/engine/service/ageing';
import { biasFactor } from '@shared/engine/service/bias';
import { readDielectric } from '@shared/engine/service/dielectric';
import { USUAL_ESL_PERCENT, USUAL_ESR_PERCENT } from '@shared/engine/service/parasitics';
import { temperatureFactor } from '@shared/engine/service/temperature';
import { documentPart } from '@shared/rail/document';
import type { Part } from '@shared/schemas/part.schema';
import { formatQuantity } from '@shared/units/format';
import { knownTemperatures } from './capacitance-curves';
import { orRefusal } from './refusal';
import { celsiusText } from './situation';

/** What is known of a part's behaviour in one respect; `estimated` where something else stands in. */
export interface Knowledge {
  text: string;
  estimated: boolean;
}

const known = (text: string): Knowledge => ({ text, estimated: false });
const percent = (value: number) => formatQuantity(value, '%', { trim: true });
const points = (list: readonly unknown[]) => `${list.length} points`;

/** What an estimate says of itself, or why it says nothing. */
function fromEngine(make: () => { basis: string; estimated: boolean }): Knowledge {
  const answer = orRefusal(make);
  return 'value' in answer
    ? { text: answer.value.basis.replace(/^estimated /, ''), estimated: answer.value.estimated }
    : { text: answer.refusal, estimated: true };
}

export function overBias(part: Part): Knowledge {
  if (part.bias_curve) return known(`curve, ${points(part.bias_curve)}`);
  return fromEngine(() => biasFactor(documentPart(part), part.rated_voltage_V / 2));
}

/** Away from the references of 20 and 25 °C, where there would be nothing to estimate. */
const SOMEWHERE_WARM_C = 60;

export function overTemperature(part: Part): Knowledge {
  if (part.temperature_curve) return known(`curve, ${points(part.temperature_curve)}`);
  return fromEngine(() => temperatureFactor(documentPart(part), SOMEWHERE_WARM_C));
}

export function temperatureRange(part: Part): Knowledge {
  const [low, high] = knownTemperatures(documentPart(part));
  const text = `${celsiusText(low).replace('\u00a0°C', '')} … ${celsiusText(high)}`;
  if (part.temperature_curve) return known(`${text}, by its curve`);
  const code = part.technology === 'ceramic' ? readDielectric(part.dielectric) : null;
  return code ? known(`${text}, by its code`) : { text: `${text}, not stated`, estimated: true };
}

export function ageing(part: Part): Knowledge {
  const answer = orRefusal(() => ageingRate(documentPart(part)));
  if ('refusal' in answer) return { text: answer.refusal, estimated: true };
  const { percentPerDecade, basis, estimated } = answer.value;
  if (percentPerDecade === 0) return { text: estimated ? basis : 'none', estimated };
  const rate = `${percent(percentPerDecade)} a decade of hours, from ${REFERENCE_AGE_H} h on`;
  return { text: estimated ? `${rate}, ${basis}` : rate, estimated };
}

export function impedanceModel(part: Part): Knowledge {
  if (part.impedance_table) return known(`measured, ${points(part.impedance_table)}`);
  if (part.esr_table) return known(`ESR over frequency, ${points(part.esr_table)}`);
  return known('C, ESR and ESL');
}

const spread = (own: number | null, usual: number): Knowledge =>
  own === null
    ? { text: `±${percent(usual)}, the usual`, estimated: true }
    : known(own === 0 ? 'none' : `±${percent(own)}`);

export const esrSpread = (part: Part): Knowledge => spread(part.esr_tolerance_percent, USUAL_ESR_PERCENT);
export const eslSpread = (part: Part): Knowledge => spread(part.esl_tolerance_percent, USUAL_ESL_PERCENT);

/** In which respects an estimate stands in for what the maker would know, as words for a sentence; ageing only of what ages. */
export function estimatedRespects(part: Part): string[] {
  const respects = [
    ['bias', overBias(part)],
    ['temperature', overTemperature(part)],
    ...(part.technology === 'ceramic' ? [['ageing', ageing(part)] as const] : []),
  ] as const;
  return respects.flatMap(([name, { estimated }]) => (estimated ? [name] : []));
}

/** Ceramics that lose with voltage, temperature and age: Class II and III, and those whose code says nothing. */
export const isLossy = (part: Pick<Part, 'technology' | 'dielectric'>): boolean =>
  part.technology === 'ceramic' && readDielectric(part.dielectric)?.class !== 1;
