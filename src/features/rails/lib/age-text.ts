import { type Parsed, parseQuantity } from '@shared/units/parse';

/** Mean year of the calendar: 10 years are 87 660 h. */
export const HOURS_A_YEAR = 8766;

const YEARS = /\s*(?:a|y|yr|yrs|year|years)$/i;
const HOURS = /\s*(?:h|hr|hrs|hour|hours)$/i;

/** Reads an age in hours: a bare number and `10 a` or `10 years` are years, `87660 h` is hours. */
export function parseAge(text: string): Parsed {
  const clean = text.trim();
  if (clean === '') return { ok: false, reason: 'type an age, 0 for new' };
  const isHours = HOURS.test(clean);
  const parsed = parseQuantity(clean.replace(isHours ? HOURS : YEARS, ''), '');
  if (!parsed.ok) return { ok: false, reason: `${parsed.reason}: write years, or hours as 5000 h` };
  return isHours ? parsed : { ok: true, value: parsed.value * HOURS_A_YEAR };
}

/** What stands in the field for an age, so that reading it gives the age back: in years where those are short. */
export function ageInput(age_h: number): string {
  const years = String(Number((age_h / HOURS_A_YEAR).toPrecision(3)));
  return Number(years) * HOURS_A_YEAR === age_h ? years : `${age_h} h`;
}

/** `10 years`, `5000 h`: below half a year in hours. */
export function ageText(age_h: number): string {
  const years = Number((age_h / HOURS_A_YEAR).toPrecision(3));
  if (years < 0.5) return `${Math.round(age_h)}\u00a0h`;
  return `${years}\u00a0${years === 1 ? 'year' : 'years'}`;
}
