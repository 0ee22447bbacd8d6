import { formatQuantity, formatVolts } from '@shared/units/format';
import type { UnitSymbol } from '@shared/units/quantity';
import { alignDecimal, fractionRoom } from '@/lib/align-decimal';

type Value = number | null | undefined;

interface Props {
  value: Value;
  unit: UnitSymbol;
  digits?: number;
  /** Characters kept free behind the decimal point, the point included; `decimalRoom` finds what a column needs. */
  fraction?: number;
}

/** Units that stand without a prefix; volts nearly always do. */
const PLAIN = new Set<UnitSymbol>(['mm', 'mm²', '%', 'dB', '', 'V']);
const write = (value: Value, unit: UnitSymbol, digits: number) =>
  unit === 'V' && typeof value === 'number'
    ? formatVolts(value)
    : formatQuantity(value, unit, { digits, trim: true });

/** What to give as `fraction` to the cells of a column that shows `values`. */
export const decimalRoom = (values: readonly Value[], unit: UnitSymbol, digits = 3): number =>
  fractionRoom(values.map((value) => write(value, unit, digits)));

/** A quantity for a column of figures: set flush right, its decimal point stands under those above. */
export function Decimal({ value, unit, digits = 3, fraction = 3 }: Props) {
  const room = { fraction, unit: PLAIN.has(unit) ? unit.length : unit.length + 1 };
  return <span className="whitespace-pre">{alignDecimal(write(value, unit, digits), room)}</span>;
}
