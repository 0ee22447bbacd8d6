import type { ServiceFactor, ServiceValues } from '@shared/engine/service/in-service';
import type { PartBehaviour } from '@shared/engine/service/part-behaviour';
import { temperatureFactor } from '@shared/engine/service/temperature';
import { formatQuantity } from '@shared/units/format';
import { ageText, CATALOGUE, celsiusText, type Situation } from './situation';
import { volts } from './volts';

export interface ChainTerm {
  kind: ServiceFactor['kind'];
  name: string;
  /** The factor to as many decimals as the chain needs. */
  text: string;
  estimated: boolean;
  /** Where the factor comes from, with the condition that it stands for. */
  basis: string;
}

/** `22 µF × bias 0.52 × cold 0.93 × aged 0.95 × tolerance 0.8 = 8.09 µF`. */
export interface FactorChain {
  start: string;
  terms: ChainTerm[];
  result: string;
}

const MOST_DECIMALS = 8;
const farad = (value: number): string => formatQuantity(value, 'F');
const catalogue = (value: number): string => formatQuantity(value, 'F', { digits: 4, trim: true });

/** As few decimals (two or more) as let the numbers that one reads multiply to the engine's result, digit for digit. */
export function chainDecimals(capacitance_F: number, factors: readonly number[], result_F: number): number {
  const start = Number(capacitance_F.toPrecision(4));
  for (let decimals = 2; decimals < MOST_DECIMALS; decimals++) {
    const product = factors.reduce((c, factor) => c * Number(factor.toFixed(decimals)), start);
    if (farad(product) === farad(result_F)) return decimals;
  }
  return MOST_DECIMALS;
}

const HOT_C = 60;

function warmth(temperature_C: number): string {
  if (temperature_C < CATALOGUE.temperature_C) return 'cold';
  if (temperature_C === CATALOGUE.temperature_C) return 'temperature';
  return temperature_C < HOT_C ? 'warm' : 'hot';
}

const NAMES: Record<ServiceFactor['kind'], (at: Situation) => string> = {
  bias: () => 'bias',
  temperature: ({ temperature_C }) => warmth(temperature_C),
  ageing: ({ age_h }) => (ageText(age_h) === 'new' ? 'new' : 'aged'),
  tolerance: () => 'tolerance',
};

const CONDITIONS: Record<ServiceFactor['kind'], (at: Situation) => string> = {
  bias: ({ voltage_V }) => volts(voltage_V),
  temperature: ({ temperature_C }) => celsiusText(temperature_C),
  ageing: ({ age_h }) => (ageText(age_h) === 'new' ? '' : ageText(age_h)),
  tolerance: () => '',
};

/** `0.85 … 1.15` where only limits are known. */
function limits(part: PartBehaviour, { temperature_C }: Situation): string {
  const { low, high } = temperatureFactor(part, temperature_C);
  const write = (factor: number) => String(Number(factor.toFixed(3)));
  return write(high) === write(low) ? '' : `${write(low)} … ${write(high)}`;
}

/** The engine's factors as an engineer reads them. */
export function factorChain(part: PartBehaviour, at: Situation, values: ServiceValues): FactorChain {
  const decimals = chainDecimals(
    part.capacitance_F,
    values.factors.map(({ factor }) => factor),
    values.capacitance_F,
  );
  return {
    start: catalogue(part.capacitance_F),
    terms: values.factors.map(({ kind, factor, estimated, basis }) => ({
      kind,
      name: NAMES[kind](at),
      text: String(Number(factor.toFixed(decimals))),
      estimated,
      basis: [
        CONDITIONS[kind](at),
        basis.replace(/^estimated /, ''),
        kind === 'temperature' && limits(part, at),
      ]
        .filter(Boolean)
        .join(', '),
    })),
    result: farad(values.capacitance_F),
  };
}

/** The chain in one line, for those who hear it. */
export const chainText = ({ start, terms, result }: FactorChain): string =>
  `${start} × ${terms.map(({ name, text, estimated }) => `${name} ${estimated ? '≈ ' : ''}${text}`).join(' × ')} = ${result}`;
