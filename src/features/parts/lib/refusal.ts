import { EngineError } from '@shared/engine/errors';

const NAMES: Readonly<Record<string, string>> = {
  voltage_V: 'bias',
  temperature_C: 'temperature',
  age_h: 'age',
  capacitance_F: 'capacitance',
  esr_ohm: 'ESR',
  esl_H: 'ESL',
  bias_curve: 'bias curve',
  temperature_curve: 'temperature curve',
  ageing_percent_per_decade: 'ageing',
  esr_tolerance_percent: 'ESR tolerance',
  esl_tolerance_percent: 'ESL tolerance',
};

/** Why the engine says no, with what it is about in front: the message alone says `must not be negative`. */
export function refusalText(error: EngineError): string {
  const [, field, point] = /^(\w+)(?:\[(\d+)\])?/.exec(error.field) ?? [];
  const name = NAMES[field];
  if (name === undefined) return error.message;
  return `${name}${point === undefined ? '' : `, point ${Number(point) + 1}`}: ${error.message}`;
}

/** What `make` gives, or the sentence with which the engine refuses. Anything else that goes wrong is thrown on. */
export function orRefusal<T>(make: () => T): { value: T } | { refusal: string } {
  try {
    return { value: make() };
  } catch (error) {
    if (error instanceof EngineError) return { refusal: refusalText(error) };
    throw error;
  }
}
