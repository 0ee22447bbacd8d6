/** Why the engine refuses: `field` names what is wrong in the caller's terms, e.g. `lines[2].esr_ohm`. */
export class EngineError extends Error {
  readonly field: string;
  readonly frequency_Hz?: number;

  constructor(field: string, message: string, frequency_Hz?: number) {
    super(message);
    this.name = 'EngineError';
    this.field = field;
    this.frequency_Hz = frequency_Hz;
  }
}
