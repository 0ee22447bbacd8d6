import { MINUS } from '@shared/units/format';
import { type Parsed, parseQuantity } from '@shared/units/parse';

/** Reads a temperature: `-40`, `−40`, `85 °C`; a bare number is in °C. */
export function parseCelsius(text: string): Parsed {
  const clean = text.trim().replace(/\s*°?\s*C$/i, '');
  return clean === '' ? { ok: false, reason: 'type a temperature' } : parseQuantity(clean, '');
}

/** `−40 °C`, to a tenth. */
export const celsiusText = (temperature_C: number): string =>
  `${String(Number(temperature_C.toFixed(1))).replace('-', MINUS)}\u00a0°C`;
