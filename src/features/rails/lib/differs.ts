import type { SpecForm } from './spec-form';

/** True when something is typed differently from where the form started. */
export function differs(form: SpecForm, start: SpecForm): boolean {
  const { vary, ...typed } = form;
  const { vary: varied, ...began } = start;
  const at = new Map<string, string | boolean>(Object.entries(began));
  // The order in which boxes were ticked says nothing.
  return (
    Object.entries(typed).some(([field, value]) => at.get(field) !== value) ||
    vary.length !== varied.length ||
    vary.some((one) => !varied.includes(one))
  );
}
