import { stackupSchema } from '@shared/schemas/board-setup.schema';
import { describe, expect, it } from 'vitest';
import { heightToPlane, planePair, planePairs, type StackLayer } from './stackup';

const fault = (field: string, message: string) =>
  expect.objectContaining({ name: 'EngineError', field, message: expect.stringContaining(message) });
const copper = (name: string, use: 'signal' | 'plane', thickness_m = 35e-6): StackLayer => ({
  kind: 'copper',
  name,
  thickness_m,
  use,
});
const dielectric = (thickness_m: number, relative_permittivity: number): StackLayer => ({
  kind: 'dielectric',
  name: 'sheet',
  thickness_m,
  relative_permittivity,
});
const board: StackLayer[] = [
  copper('top', 'signal'),
  dielectric(1e-4, 4),
  copper('ground', 'plane'),
  dielectric(5e-5, 3.2),
  dielectric(1.5e-4, 4.8),
  copper('power', 'plane', 18e-6),
  dielectric(1e-3, 4.4),
  copper('inner', 'signal', 18e-6),
  dielectric(2e-4, 4),
  copper('ground 2', 'plane'),
  dielectric(1.2e-4, 4),
  copper('bottom', 'signal'),
];

describe('plane pair of a stack-up', () => {
  it('has the height of its dielectrics and their permittivity in series', () => {
    const pair = planePair(board, 'ground', 'power');
    expect(pair.spacing_m).toBeCloseTo(2e-4, 16);
    expect(pair.relative_permittivity).toBeCloseTo(2e-4 / (5e-5 / 3.2 + 1.5e-4 / 4.8), 12);
    expect(pair.depthFromTop_m).toBeCloseTo(1e-4, 16);
    // Dielectrics and the coppers between power and bottom, face to face.
    expect(pair.depthFromBottom_m).toBeCloseTo(1e-3 + 18e-6 + 2e-4 + 35e-6 + 1.2e-4, 16);
  });

  it('has no depth where a plane is the outer copper', () => {
    const two = [copper('a', 'plane'), dielectric(2e-4, 4.2), copper('b', 'plane')];
    expect(planePair(two, 'a', 'b')).toEqual({
      spacing_m: 2e-4,
      relative_permittivity: expect.closeTo(4.2, 12),
      depthFromTop_m: 0,
      depthFromBottom_m: 0,
    });
  });

  it('takes a board’s stack-up as it is stored', () => {
    const { layers } = stackupSchema.parse({ layers: board });
    expect(planePair(layers, 'ground', 'power')).toEqual(planePair(board, 'ground', 'power'));
  });

  it('is refused with what is wrong about it', () => {
    expect(() => planePair(board, 'earth', 'power')).toThrow(
      fault('upperName', 'no copper layer called earth'),
    );
    expect(() => planePair(board, 'ground', 'sheet')).toThrow(fault('lowerName', 'called sheet'));
    expect(() => planePair(board, 'ground', 'ground')).toThrow(fault('lowerName', 'both planes'));
    expect(() => planePair(board, 'power', 'ground')).toThrow(fault('lowerName', 'ground lies above power'));
    expect(() => planePair(board, 'top', 'ground')).toThrow(fault('upperName', 'top is a signal layer'));
    expect(() => planePair(board, 'ground', 'inner')).toThrow(fault('lowerName', 'inner is a signal layer'));
    expect(() => planePair(board, 'power', 'ground 2')).toThrow(fault('lowerName', 'inner lies between'));
    expect(() => planePair(board, 'ground', 'ground 2')).toThrow(fault('lowerName', 'power lies between'));
    const touching = [copper('a', 'plane'), copper('b', 'plane')];
    expect(() => planePair(touching, 'a', 'b')).toThrow(fault('lowerName', 'touch'));
    const flat = [copper('a', 'plane'), dielectric(0, 4), copper('b', 'plane')];
    expect(() => planePair(flat, 'a', 'b')).toThrow(fault('layers[sheet].thickness_m', 'above zero'));
    const empty = [copper('a', 'plane'), dielectric(1e-4, 0), copper('b', 'plane')];
    expect(() => planePair(empty, 'a', 'b')).toThrow(
      fault('layers[sheet].relative_permittivity', 'above zero'),
    );
  });

  it('is offered wherever only dielectric lies between two planes', () => {
    expect(planePairs(board)).toEqual([
      { upper: 'ground', lower: 'power', ...planePair(board, 'ground', 'power') },
    ]);
    expect(planePairs([copper('a', 'signal'), dielectric(1e-4, 4), copper('b', 'plane')])).toEqual([]);
  });
});

describe('height over the nearest plane', () => {
  it('counts from each side’s outer copper, through whatever lies between', () => {
    expect(heightToPlane(board, 'top')).toBeCloseTo(1e-4, 16);
    expect(heightToPlane(board, 'bottom')).toBeCloseTo(1.2e-4, 16);
    const buried = [copper('t', 'signal'), dielectric(1e-4, 4), copper('s', 'signal'), ...board.slice(1)];
    expect(heightToPlane(buried, 'top')).toBeCloseTo(1e-4 + 35e-6 + 1e-4, 16);
    const outer = [copper('a', 'plane'), dielectric(2e-4, 4.2), copper('b', 'plane')];
    expect(heightToPlane(outer, 'top')).toBe(2e-4);
  });

  it('needs a plane', () => {
    const none = [copper('a', 'plane'), dielectric(2e-4, 4.2), copper('b', 'signal')];
    expect(() => heightToPlane(none, 'top')).toThrow(fault('layers', 'no plane lies below the top side'));
    expect(heightToPlane(none, 'bottom')).toBe(2e-4);
  });
});
