const MICRO = 1e6;
const MILLI = 1000;

const plain = (value: number): string => String(Number(value.toPrecision(12)));

/** A thickness as fabricators write it, and as its field reads it back: `18 µm`, `550 µm`, `1.2 mm`. */
export function thicknessText(metres: number): string {
  return metres < 1e-3 ? `${plain(metres * MICRO)} µm` : `${plain(metres * MILLI)} mm`;
}

/** A length on the board for its field: `0.3 mm`. */
export const lengthText = (metres: number): string => `${plain(metres * MILLI)} mm`;
