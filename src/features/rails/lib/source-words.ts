import type { Source } from '@shared/schemas/rail-spec.schema';
import { formatQuantity } from '@shared/units/format';
import type { UnitSymbol } from '@shared/units/quantity';
import { liveBand, liveSource } from './live';
import { sourceMagnitude_ohm } from './source-curve';
import type { SpecForm } from './spec-form';

const q = (value: number, unit: UnitSymbol) => formatQuantity(value, unit, { trim: true });
type Band = readonly [number, number];
type Damped = Extract<Source, { kind: 'damped' }>;

/** The chosen source's asymptotes in words; empty until they can be said. */
export function sourceSentence(form: SpecForm): string {
  const source = liveSource(form);
  const band = liveBand(form);
  return source && band ? sourceText(source, band) : '';
}

export function sourceText(source: Source, band: Band): string {
  switch (source.kind) {
    case 'open':
      return 'no source: planes and bank alone carry the load';
    case 'rl':
      return seriesText(source.resistance_ohm, source.inductance_H);
    case 'damped':
      return dampedText(source) ?? endsText(source, band);
    case 'table':
      return tableText(source.points, band);
  }
}

/** From where an inductance outgrows a resistance, Hz. */
const corner_Hz = (ohm: number, henry: number) => ohm / (2 * Math.PI * henry);

function seriesText(ohm: number, henry: number): string {
  if (henry === 0) return `${q(ohm, 'Ω')} at every frequency`;
  if (ohm === 0) return `rising as ${q(henry, 'H')} all the way`;
  return `${q(ohm, 'Ω')} at DC, rising as ${q(henry, 'H')} from ${formatQuantity(corner_Hz(ohm, henry), 'Hz')}`;
}

const parallel = (a: number, b: number) => (a === 0 || b === 0 ? 0 : (a * b) / (a + b));

/** `592 µΩ at DC, 5.40 mΩ from 88.4 kHz`; null where there is no such level stretch between its rises. */
function dampedText(source: Damped): string | null {
  const { series_resistance_ohm: r0, inductor_resistance_ohm: rl, damping_ohm: r1 } = source;
  const { series_inductance_H: l0, inductance_H: l, damping_inductance_H: l1 } = source;
  if (l === 0 || r1 <= rl) return null;
  const level = r0 + r1;
  const from = corner_Hz(r1, l);
  const last_H = l0 + parallel(l, l1);
  const until = last_H > 0 ? corner_Hz(level, last_H) : Number.POSITIVE_INFINITY;
  if (until <= from) return null;
  const text = `${q(r0 + parallel(rl, r1), 'Ω')} at DC, ${q(level, 'Ω')} from ${formatQuantity(from, 'Hz')}`;
  return last_H > 0 ? `${text}, rising as ${q(last_H, 'H')} from ${formatQuantity(until, 'Hz')}` : text;
}

/** What any source comes to at both ends of the band. */
function endsText(source: Source, band: Band): string {
  const ends = sourceMagnitude_ohm(source, band);
  return ends ? band.map((f, i) => `${q(ends[i], 'Ω')} at ${q(f, 'Hz')}`).join(', ') : '';
}

/** How many points, what they cover, and where the band goes further than that. */
function tableText(points: readonly (readonly [number, number, number])[], [low, high]: Band): string {
  const [from, to] = [points[0][0], points[points.length - 1][0]];
  const text = `${points.length} points cover ${q(from, 'Hz')} to ${q(to, 'Hz')}`;
  const beyond = [low < from && `below ${q(from, 'Hz')}`, high > to && `above ${q(to, 'Hz')}`].filter(
    Boolean,
  );
  return beyond.length === 0
    ? `${text}: the whole band`
    : `${text}; ${beyond.join(' and ')} the series R–L–C that fits them best goes on`;
}
