import { readDielectric } from '../engine/service/dielectric';
import type { DocumentPart, RailDocument } from '../schemas/rail-document.schema';
import { formatQuantity, formatVolts } from '../units/format';
import { conditionsOf } from './conditions';
import { mostCapacitance_F } from './time';

export interface Caution {
  kind:
    | 'voltage'
    | 'energy'
    | 'rating'
    | 'derating'
    | 'cracks'
    | 'losses'
    | 'polarity'
    | 'cold'
    | 'temperature'
    | 'distance'
    | 'state'
    | 'inrush';
  title: string;
  text: string;
}

/** Above this DC voltage a rail is treated as a hazard to touch (product sketch, cautions). */
export const TOUCH_LIMIT_V = 60;
/**
 * From here on a discharge through a person or a tool can hurt whatever the voltage: 350 mJ is the energy limit of a limited-current
 * circuit (IEC 60950 2.4 as quoted on a product-safety mailing list, Sept 2002).
 */
export const HURTING_ENERGY_J = 0.35;
/** Share of the rating up to which solid tantalum with MnO2 should be used at 85 °C (a maker's answer of 18 Aug 2015, as quoted). */
const TANTALUM_SHARE = 0.5;
/** Below this the ESR of wet aluminium electrolytics begins to rise steeply (common practice). */
const COLD_C = 0;
/** Start-up ramp for which the mean inrush current is stated where the specification gives none. */
const RAMP_s = 1e-3;
const POLARISED = new Set(['polymer', 'tantalum', 'aluminium']);
/** Ceramics of Class I (EIA-198, IEC 60384-8): they hardly lose capacitance. */
const CLASS_I = /^(C0G|COG|NP0|U2J|C0H|U1)/i;

/** Ceramics whose inch case code is 1206 or larger crack when the board bends. */
export const isLargeCeramic = (part: Pick<DocumentPart, 'technology' | 'case'>): boolean =>
  part.technology === 'ceramic' && /^\d{4}$/.test(part.case ?? '') && Number(part.case) >= 1206;

/** Soft terminations take up more of the bending before the ceramic cracks; they do not rule cracks out. */
export const hasSoftTermination = (part: Pick<DocumentPart, 'termination'>): boolean =>
  part.termination === 'soft';

export const isPolarised = (part: Pick<DocumentPart, 'technology'>): boolean =>
  POLARISED.has(part.technology ?? '');

const names = (parts: readonly DocumentPart[]) => parts.map((part) => part.id).join(', ');

const KEEP = 'from edges, score lines, connectors and screws';

function bendingText(large: readonly DocumentPart[]): string {
  const soft = large.filter(hasSoftTermination);
  const hard = large.filter((part) => !hasSoftTermination(part));
  const sentences: string[] = [];
  if (hard.length > 0)
    sentences.push(`${names(hard)}: keep ${KEEP}, or choose a part with soft terminations.`);
  if (soft.length > 0)
    sentences.push(
      `${names(soft)}: soft terminations bear more bending; keep ${soft.length > 1 ? 'them' : 'it'} ${KEEP} all the same.`,
    );
  if (large.length > 0)
    sentences.push(
      'A crack can end as an open part or as a short, hard or of a few ohms that heats: the missing-part check covers the open one only.',
    );
  return sentences.join(' ');
}

/** The parts that the bank really uses, each with its count. */
function used(document: Pick<RailDocument, 'parts' | 'bank'>): { part: DocumentPart; count: number }[] {
  return document.parts
    .map((part) => ({
      part,
      count: document.bank.reduce((sum, line) => (line.part === part.id ? sum + line.count : sum), 0),
    }))
    .filter(({ count }) => count > 0);
}

/** Parts whose dielectric is not made for the rail's temperatures. */
function rangeCautions(rail: RailDocument['rail'], parts: readonly DocumentPart[]): Caution[] {
  const { coldest_C, hottest_C } = conditionsOf(rail).conditions;
  const outside = parts.flatMap((part) => {
    const code = part.technology === 'ceramic' ? readDielectric(part.dielectric ?? '') : null;
    return code && (coldest_C < code.low_C || hottest_C > code.high_C) ? [{ part, code }] : [];
  });
  if (outside.length === 0) return [];
  const made = outside.map(
    ({ part, code }) => `${part.id} (${code.code}: ${degrees(code.low_C)} to ${degrees(code.high_C)} °C)`,
  );
  return [
    {
      kind: 'temperature',
      title: 'outside its temperature range',
      text: `${made.join(', ')}: the rail goes from ${degrees(coldest_C)} to ${degrees(hottest_C)} °C. Beyond the range nothing is known; what is shown there is held at its end.`,
    },
  ];
}

const degrees = (celsius: number): string => String(celsius).replace('-', '−');

/** What a person should know before trusting or touching this rail, in the order of harm. */
export function railCautions(document: Pick<RailDocument, 'rail' | 'parts' | 'bank'>): Caution[] {
  const { voltage_V } = document.rail;
  const bank = used(document);
  const parts = bank.map(({ part }) => part);
  const capacitance_F = bank.length > 0 ? mostCapacitance_F(document) : 0;
  const energy_J = 0.5 * capacitance_F * voltage_V ** 2;
  const cautions: Caution[] = [];
  const open = parts.filter((part) => part.state !== undefined && part.state !== 'approved');
  if (open.length > 0)
    cautions.push({
      kind: 'state',
      title: 'not approved',
      text: open.map((part) => `${part.id} is ${part.state === 'draft' ? 'a draft' : 'retired'}`).join('; '),
    });
  if (voltage_V > TOUCH_LIMIT_V)
    cautions.push({
      kind: 'voltage',
      title: 'above 60 V DC: energy and shock hazard',
      text: `The bank stores ${formatQuantity(energy_J, 'J')} (½CV² at the upper end of tolerances, unbiased). Discharge it before touching.`,
    });
  else if (energy_J >= HURTING_ENERGY_J)
    cautions.push({
      kind: 'energy',
      title: 'the bank stores enough to hurt',
      text: `${formatQuantity(energy_J, 'J')} (½CV² at the upper end of tolerances, unbiased): a slipped tool or a ring across it burns. Discharge it before working on the board.`,
    });
  const under = parts.filter(
    (part) => part.rated_voltage_V !== undefined && part.rated_voltage_V < voltage_V,
  );
  if (under.length > 0)
    cautions.push({
      kind: 'rating',
      title: 'rated below the rail',
      text: `${names(under)}: rated for less than ${formatVolts(voltage_V)}. Do not fit.`,
    });
  const stressed = parts.filter(
    (part) =>
      part.technology === 'tantalum' &&
      part.rated_voltage_V !== undefined &&
      voltage_V > TANTALUM_SHARE * part.rated_voltage_V &&
      voltage_V <= part.rated_voltage_V,
  );
  if (stressed.length > 0)
    cautions.push({
      kind: 'derating',
      title: 'tantalum above half its rating',
      text: `${names(stressed)}: solid tantalum is usually run at no more than half its rated voltage, less above 85 °C; see the maker’s rule.`,
    });
  cautions.push(...rangeCautions(document.rail, parts));
  const large = parts.filter(isLargeCeramic);
  if (large.length > 0)
    cautions.push({
      kind: 'cracks',
      title: 'large ceramics crack when the board bends',
      text: bendingText(large),
    });
  const polarised = parts.filter(isPolarised);
  if (polarised.length > 0)
    cautions.push({
      kind: 'polarity',
      title: 'polarised parts',
      text: `${names(polarised)}: check orientation and voltage derating.`,
    });
  const { coldest_C } = conditionsOf(document.rail).conditions;
  const drying = parts.filter((part) => part.technology === 'aluminium');
  if (drying.length > 0 && coldest_C < COLD_C)
    cautions.push({
      kind: 'cold',
      title: 'aluminium electrolytics in the cold',
      text: `${names(drying)}: their ESR rises several times below 0 °C and with age, which no corner here moves; see the maker’s curves for ${degrees(coldest_C)} °C.`,
    });
  const unplaced = document.bank.filter((line) => line.distance_m === undefined);
  if (document.rail.plane?.geometry && unplaced.length > 0)
    cautions.push({
      kind: 'distance',
      title: 'distance not planned',
      text: `${[...new Set(unplaced.map((line) => line.part))].join(', ')}: counted as if beside the load, without any path on the planes. Say how far away, or the headroom is too kind.`,
    });
  const lossy = parts.filter((part) => part.technology === 'ceramic' && !CLASS_I.test(part.dielectric ?? ''));
  if (lossy.length > 0)
    cautions.push({
      kind: 'losses',
      title: 'Class II dielectrics',
      text: `${names(lossy)}: capacitance falls with bias, temperature and age; in service shows how much, estimated where a part has no curve.`,
    });
  const inrush = inrushText(document.rail, capacitance_F);
  if (inrush !== null) cautions.push({ kind: 'inrush', title: 'inrush at start-up', text: inrush });
  return cautions;
}

/** What to mind about charging the bank; null when the regulator's limit is known and kept. */
function inrushText({ voltage_V, start_up }: RailDocument['rail'], capacitance_F: number): string | null {
  if (capacitance_F === 0) return null;
  const charge = `Charging ${formatQuantity(capacitance_F, 'F')} to ${formatVolts(voltage_V)}`;
  if (!start_up)
    return `${charge} in 1 ms, which is only assumed, takes ${formatQuantity((capacitance_F * voltage_V) / RAMP_s, 'A')} on average; state the regulator’s soft start and limit to have it checked.`;
  const current_A = (capacitance_F * voltage_V) / start_up.soft_start_s;
  if (current_A <= start_up.current_limit_A) return null;
  return `${charge} in ${formatQuantity(start_up.soft_start_s, 's', { trim: true })} takes ${formatQuantity(current_A, 'A')}, more than the limit of ${formatQuantity(start_up.current_limit_A, 'A', { trim: true })}: the regulator may not start, or start with a step.`;
}
