import { mountRecipeSchema } from '@shared/schemas/board-setup.schema';
import { describe, expect, it } from 'vitest';
import { microstrip_HPerM } from './microstrip';
import { type MountShape, mountInductance } from './mount';
import { viaPair_H } from './via';

const fault = (field: string) => expect.objectContaining({ name: 'EngineError', field });
const recipe: MountShape = {
  trace_length_m: 0.4e-3,
  trace_width_m: 0.5e-3,
  via_drill_m: 0.25e-3,
  via_spacing_m: 1e-3,
  via_pairs: 2,
  coupling: 0.3,
};
const where = { traceHeight_m: 1e-4, viaDepth_m: 3e-4 };
/** As read: no-break spaces become plain ones. */
const plain = (text: string) => text.replaceAll('\u00a0', ' ');

describe('mount', () => {
  it('is its traces and its vias, with what each costs and how it was reckoned', () => {
    const { total_H, segments } = mountInductance(recipe, where);
    const [traces, vias] = segments;
    expect(segments.map((one) => one.part)).toEqual(['traces', 'vias']);
    expect(traces.inductance_H).toBeCloseTo(0.8e-3 * microstrip_HPerM(0.5e-3, 1e-4), 20);
    expect(vias.inductance_H).toBeCloseTo(0.65 * viaPair_H(3e-4, 1e-3, 0.25e-3), 20);
    expect(total_H).toBe(traces.inductance_H + vias.inductance_H);
    expect(traces.share + vias.share).toBeCloseTo(1, 14);
    expect(plain(traces.formula)).toBe('2 · 0.4 mm · L′(w 0.5 mm, h 0.1 mm)');
    expect(plain(vias.formula)).toBe('μ₀/π · 0.3 mm · acosh(1 mm / 0.25 mm) · (1 + 1 · 0.3) / 2');
    expect(plain(mountInductance({ ...recipe, via_pairs: 1 }, where).segments[1].formula)).toBe(
      'μ₀/π · 0.3 mm · acosh(1 mm / 0.25 mm)',
    );
    // An ordinary mount close over its plane: a few tenths of a nanohenry.
    expect(total_H).toBeGreaterThan(0.2e-9);
    expect(total_H).toBeLessThan(0.5e-9);
  });

  it('has no traces with the via in the pad and no vias down to the outer copper itself', () => {
    const inPad = mountInductance({ ...recipe, trace_length_m: 0 }, where);
    expect(inPad.segments.map((one) => one.share)).toEqual([0, 1]);
    const onPlane = mountInductance(recipe, { ...where, viaDepth_m: 0 });
    expect(onPlane.segments.map((one) => one.share)).toEqual([1, 0]);
    const nothing = mountInductance({ ...recipe, trace_length_m: 0 }, { ...where, viaDepth_m: 0 });
    expect(nothing.total_H).toBe(0);
    expect(nothing.segments.map((one) => one.share)).toEqual([0, 0]);
  });

  it('takes a board’s recipe as it is stored', () => {
    const stored = mountRecipeSchema.parse({
      id: '018f2d3e-7c4a-7b21-9c55-3f1d2a6b8c90',
      name: 'ordinary',
      ...recipe,
    });
    expect(mountInductance(stored, where)).toEqual(mountInductance(recipe, where));
  });

  it.each([
    ['trace_length_m', -1e-3],
    ['trace_width_m', 0],
    ['via_drill_m', 0],
    ['via_spacing_m', 0.25e-3],
    ['via_pairs', 0],
    ['via_pairs', 1.5],
    ['coupling', 1.01],
    ['coupling', Number.NaN],
  ])('names the recipe’s %s when it is %d', (field, value) =>
    expect(() => mountInductance({ ...recipe, [field]: value }, where)).toThrow(fault(field)),
  );

  it('names the height and the depth', () => {
    expect(() => mountInductance(recipe, { ...where, traceHeight_m: 0 })).toThrow(fault('traceHeight_m'));
    expect(() => mountInductance(recipe, { ...where, viaDepth_m: -1e-4 })).toThrow(fault('viaDepth_m'));
  });
});
