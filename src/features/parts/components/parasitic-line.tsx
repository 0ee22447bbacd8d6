import { formatQuantity } from '@shared/units/format';
import type { Knowledge } from '../lib/part-knowledge';

interface Props {
  name: 'ESR' | 'ESL';
  unit: 'Ω' | 'H';
  catalogue: number;
  factor: number;
  result: number;
  spread: Knowledge;
}

/** `ESR 4.2 mΩ × tolerance 1.3 = 5.46 mΩ`; nothing where the tolerance is in its middle. */
export function ParasiticLine({ name, unit, catalogue, factor, result, spread }: Props) {
  if (factor === 1) return null;
  const write = (value: number) => formatQuantity(value, unit);
  return (
    <p>
      <span className="text-stone">{name}</span> {write(catalogue)}{' '}
      <span className="text-stone">× tolerance</span> {Number(factor.toPrecision(3))}{' '}
      <span className="text-stone">=</span> <span className="font-semibold">{write(result)}</span>{' '}
      <span className={`text-small ${spread.estimated ? 'text-brass' : 'text-stone'}`}>
        {spread.estimated ? `≈ estimated, ${spread.text}` : spread.text}
      </span>
    </p>
  );
}
