/**
 * Quantities that carry their unit in the type. The brand is optional, so that a literal may be
 * passed where a quantity is wanted, but an inductance never where a capacitance is.
 */
declare const unit: unique symbol;
export type Quantity<U extends string> = number & { readonly [unit]?: U };

export type Ohm = Quantity<'Ω'>;
export type Henry = Quantity<'H'>;
export type Farad = Quantity<'F'>;
export type Hertz = Quantity<'Hz'>;
export type Volt = Quantity<'V'>;
export type Ampere = Quantity<'A'>;
export type Second = Quantity<'s'>;
export type Metre = Quantity<'m'>;

/** Units that a person may type or read; `''` is a pure number, `%` a percentage. */
export type UnitSymbol =
  | 'Ω'
  | 'H'
  | 'F'
  | 'Hz'
  | 'V'
  | 'A'
  | 's'
  | 'm'
  | 'mm'
  | 'mm²'
  | 'W'
  | 'J'
  | 'C'
  | '%'
  | 'dB'
  | '';
