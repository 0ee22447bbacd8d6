import { formatQuantity } from '@shared/units/format';
import type { UnitSymbol } from '@shared/units/quantity';
import { alignDecimal } from '@/lib/align-decimal';

interface Props {
  value: number | null | undefined;
  unit: UnitSymbol;
  digits?: number;
  /** Characters kept free behind the decimal point, the point included. */
  fraction?: number;
}

/** A quantity for a column of figures: set flush right, its decimal point stands under those above. */
export function Decimal({ value, unit, digits = 3, fraction = 3 }: Props) {
  const text = formatQuantity(value, unit, { digits, trim: true });
  const room = {
    fraction,
    unit: unit === '' ? 0 : /²$|^mm$|^%$|^dB$/.test(unit) ? unit.length : unit.length + 1,
  };
  return <span className="whitespace-pre">{alignDecimal(text, room)}</span>;
}
