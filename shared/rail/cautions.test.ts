import { describe, expect, it } from 'vitest';
import type { DocumentPart } from '../schemas/rail-document.schema';
import type { RailSpec } from '../schemas/rail-spec.schema';
import { railCautions } from './cautions';

const rail: RailSpec = {
  name: 'VBUS_72',
  voltage_V: 72,
  target: { kind: 'flat', impedance_ohm: 0.1 },
  band_Hz: [1e3, 1e6],
  source: { kind: 'rl', resistance_ohm: 0.01, inductance_H: 1e-8 },
  observe: 'pins',
};
const part = (id: string, more: Partial<DocumentPart>): DocumentPart => ({
  id,
  capacitance_F: 1e-6,
  esr_ohm: 0.01,
  esl_H: 1e-9,
  mount_H: 0,
  ...more,
});
const kinds = (parts: DocumentPart[], voltage_V = 72) =>
  railCautions({
    rail: { ...rail, voltage_V },
    parts,
    bank: parts.map((one) => ({ part: one.id, count: 2 })),
  }).map((caution) => caution.kind);

describe('railCautions', () => {
  it('warns above 60 V with the stored energy, not at 60 V', () => {
    const [first] = railCautions({ rail, parts: [part('A', {})], bank: [{ part: 'A', count: 2 }] });
    // ½ · 2 µF · 72² = 5.18 mJ
    expect(first.kind).toBe('voltage');
    expect(first.text).toContain('5.18\u00a0mJ');
    expect(kinds([part('A', {})], 60)).not.toContain('voltage');
  });

  it('names large ceramics from 1206 on, and polymers not among them', () => {
    expect(kinds([part('A', { technology: 'ceramic', case: '1206', dielectric: 'C0G' })])).toContain(
      'cracks',
    );
    expect(kinds([part('A', { technology: 'ceramic', case: '0805', dielectric: 'C0G' })])).not.toContain(
      'cracks',
    );
    expect(kinds([part('A', { technology: 'polymer', case: '7343' })])).toEqual([
      'voltage',
      'polarity',
      'inrush',
    ]);
  });

  it('asks for soft terminations only where a part has none', () => {
    const large = { technology: 'ceramic', case: '1210', dielectric: 'C0G' };
    const text = (parts: DocumentPart[]) =>
      railCautions({ rail, parts, bank: parts.map((one) => ({ part: one.id, count: 1 })) }).find(
        (one) => one.kind === 'cracks',
      )?.text;
    const hard = part('HARD', { ...large, termination: 'standard' });
    const soft = part('SOFT', { ...large, termination: 'soft' });
    expect(text([hard])).toBe(
      'HARD: keep from edges, score lines, connectors and screws, or choose a part with soft terminations. A crack can end as an open part or as a short, hard or of a few ohms that heats: the missing-part check covers the open one only.',
    );
    expect(text([soft])).toContain('A crack can end');
    expect(text([soft])).toMatch(/^SOFT: soft terminations bear more bending; keep it from edges/);
    expect(text([hard, soft])).toMatch(/^HARD: keep .* SOFT: soft terminations bear/);
    expect(text([part('UNSAID', large)])).toContain('choose a part with soft terminations');
  });

  it('tells Class II from Class I and finds parts rated below the rail', () => {
    expect(kinds([part('A', { technology: 'ceramic', dielectric: 'X7R' })])).toContain('losses');
    expect(kinds([part('A', { technology: 'ceramic', dielectric: 'C0G' })])).not.toContain('losses');
    expect(kinds([part('A', { rated_voltage_V: 50 })])).toContain('rating');
    expect(kinds([part('A', { rated_voltage_V: 100 })])).not.toContain('rating');
  });

  it('says nothing about parts that the bank does not use, and nothing of an empty bank but its voltage', () => {
    const idle = part('A', { technology: 'ceramic', case: '1210' });
    expect(railCautions({ rail, parts: [idle], bank: [] }).map((one) => one.kind)).toEqual(['voltage']);
  });

  it('warns of tantalum above half its rating, and of energy that hurts below 60 V', () => {
    const tantalum = part('T', { technology: 'tantalum', rated_voltage_V: 10 });
    expect(kinds([tantalum], 5)).not.toContain('derating');
    expect(kinds([tantalum], 5.1)).toContain('derating');
    // ½ · 2 · 1000 µF · 24² = 0.576 J; at 12 V 0.144 J
    const bulk = part('B', { capacitance_F: 1e-3 });
    expect(kinds([bulk], 24)).toContain('energy');
    expect(kinds([bulk], 12)).not.toContain('energy');
  });

  it('holds the inrush against the regulator’s limit where it is known', () => {
    const start_up = { soft_start_s: 5e-3, current_limit_A: 1.2 };
    const inrush = (capacitance_F: number) =>
      railCautions({
        // 470 µF to 12 V in 5 ms: 1.128 A (published-checks inr-own)
        rail: { ...rail, voltage_V: 12, start_up },
        parts: [part('A', { capacitance_F })],
        bank: [{ part: 'A', count: 1 }],
      }).find((one) => one.kind === 'inrush')?.text;
    expect(inrush(470e-6)).toBeUndefined();
    expect(inrush(680e-6)).toContain('1.63\u00a0A, more than the limit of 1.2\u00a0A');
  });
});
