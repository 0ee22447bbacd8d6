import { describe, expect, it } from 'vitest';
import { railDocumentSchema } from '../schemas/rail-document.schema';
import { analyseDocument } from './analyse';
import { farthestDistance } from './farthest';
import { mixProblem } from './mix-problem';
import { placementCsv } from './placement-csv';
import { nextBlock, revisionRail } from './revision';
import { summariseRail } from './summary';

const ID = '00000000-0000-4000-8000-000000000001';
const document = railDocumentSchema.parse({
  format: 'millpond-rail',
  version: 1,
  rail: {
    name: 'VDD',
    voltage_V: 1.2,
    target: { kind: 'flat', impedance_ohm: 0.05 },
    band_Hz: [1e4, 4e7],
    source: { kind: 'rl', resistance_ohm: 0.002, inductance_H: 3e-8 },
    plane: {
      capacitance_F: 1e-9,
      resistance_ohm: 1e-3,
      inductance_H: 1e-11,
      geometry: { length_m: 0.08, width_m: 0.06, spacing_m: 4e-4, relative_permittivity: 4.2 },
    },
  },
  parts: [
    {
      id: 'BULK-100U',
      capacitance_F: 1e-4,
      esr_ohm: 0.012,
      esl_H: 1.5e-9,
      mount_H: 8e-10,
      unit_cost: 0.4,
      area_mm2: 20,
    },
    {
      id: 'SMALL-1U',
      capacitance_F: 1e-6,
      esr_ohm: 0.015,
      esl_H: 3e-10,
      mount_H: 5e-10,
      unit_cost: 0.02,
      area_mm2: 1,
      case: '0402',
    },
  ],
  bank: [
    { part: 'BULK-100U', count: 2, distance_m: 0.02, side: 'top' },
    { part: 'SMALL-1U', count: 6, distance_m: 0.005, side: 'bottom', mount_H: 4e-10 },
  ],
});

describe('what a revision keeps of a rail', () => {
  const kept = revisionRail(ID, document, 101);

  it('has one instance a capacitor, designators in one run', () => {
    expect(kept.instances).toHaveLength(8);
    expect(kept.instances.map((one) => one.designator)).toEqual(
      [101, 102, 103, 104, 105, 106, 107, 108].map((n) => `C${n}`),
    );
    expect(kept.instances[2]).toMatchObject({
      partNumber: 'SMALL-1U',
      side: 'bottom',
      mount_H: 4e-10,
      caseSize: '0402',
    });
  });

  it('is the same when computed anew from its own document', () => {
    const again = revisionRail(ID, railDocumentSchema.parse(JSON.parse(JSON.stringify(kept.document))), 101);
    expect(again).toEqual(kept);
  });

  it('sums parts, cost and area, and leaves a sum out where a part has none', () => {
    expect(kept.summary).toMatchObject({ parts: 8, kinds: 2, holds: true, error: null });
    expect(kept.summary.cost).toBeCloseTo(0.92, 12);
    expect(kept.summary.area_mm2).toBeCloseTo(46, 12);
    const { unit_cost: _price, ...bulk } = document.parts[0];
    expect(summariseRail({ ...document, parts: [bulk, document.parts[1]] })).toMatchObject({
      cost: null,
      parts: 8,
    });
  });

  it('says why there is no result instead of throwing', () => {
    const open = {
      ...document,
      bank: [],
      rail: { ...document.rail, plane: undefined, source: { kind: 'open' as const } },
    };
    expect(summariseRail(open)).toMatchObject({
      holds: null,
      tightest: null,
      error: expect.stringContaining('nothing feeds'),
    });
    expect(revisionRail(ID, open, 1)).toMatchObject({ peaks: [], instances: [] });
  });
});

describe('the farthest distance', () => {
  it('is where the rail still holds, and a millimetre further it does not', () => {
    // 3 % above what the rail needs as planned: some room to move, not the whole board.
    const impedance_ohm = 1.03 * analyseDocument(document).tightest.impedance_ohm;
    const tight = {
      ...document,
      rail: { ...document.rail, target: { kind: 'flat' as const, impedance_ohm } },
    };
    const { distance_m, reason } = farthestDistance(tight, 1);
    expect(reason).toBeNull();
    const holdsAt = (d: number) => {
      const bank = tight.bank.map((line, i) => (i === 1 ? { ...line, distance_m: d } : line));
      return analyseDocument({ ...tight, bank }).holds;
    };
    expect(distance_m).toBeGreaterThan(0.005);
    expect(holdsAt(distance_m ?? 0)).toBe(true);
    expect(holdsAt((distance_m ?? 0) + 1e-3)).toBe(false);
  });

  it('is anywhere on the planes for a line that matters little, and none without planes or when the rail is short', () => {
    expect(farthestDistance(document, 0)).toMatchObject({
      reason: 'anywhere on the plane pair',
      distance_m: 0.1,
    });
    const bare = { ...document, rail: { ...document.rail, plane: undefined } };
    expect(farthestDistance(bare, 1)).toEqual({
      distance_m: null,
      reason: 'the plane pair is not described',
    });
    const short = {
      ...document,
      rail: { ...document.rail, target: { kind: 'flat' as const, impedance_ohm: 1e-3 } },
    };
    expect(farthestDistance(short, 1)).toEqual({ distance_m: null, reason: 'the rail is short as planned' });
  });
});

describe('designators', () => {
  it('begin each rail at the next hundred', () => {
    expect(nextBlock(101, 15)).toBe(201);
    expect(nextBlock(101, 0)).toBe(201);
    expect(nextBlock(101, 100)).toBe(201);
    expect(nextBlock(101, 101)).toBe(301);
    expect(nextBlock(201, 250)).toBe(501);
  });
});

describe('the placement list as CSV', () => {
  it('has a row an instance, quotes what needs it and defuses formulas', () => {
    const [one] = revisionRail(ID, document, 101).instances;
    const csv = placementCsv([{ ...one, rail: '=2+2', partNumber: 'A,"B"', distance_m: -0.001 }]);
    const [header, row, rest] = csv.split('\r\n');
    expect(header.split(',')).toContain('reference designator');
    expect(row).toContain('"A,""B"""');
    expect(row).toContain("'=2+2");
    expect(row).toContain(',-1.0,');
    expect(rest).toBe('');
    expect(csv).not.toMatch(/[\u00a0\u2212]/);
  });
});

describe('the problem that a document asks to be searched', () => {
  it('keeps locked lines, and mounts a candidate as the bank’s line of that part is', () => {
    const asked = {
      ...document,
      bank: [{ ...document.bank[0], locked: true }, document.bank[1]],
      search: {
        minimise: 'cost' as const,
        candidates: ['SMALL-1U', 'BULK-100U'],
        max_kinds: 2,
        distance_m: 0.03,
      },
    };
    const problem = mixProblem(asked);
    expect(problem.network.lines.map((line) => [line.id, line.count])).toEqual([['BULK-100U', 2]]);
    expect(problem).toMatchObject({ minimise: 'cost', maxKinds: 2 });
    const [small, bulk] = problem.candidates;
    // ESL 0.3 nH + its own mount 0.4 nH + the path to 5 mm, from μ₀h/2π·ln(d²/(r₁r₂)).
    expect(small.line.inductance_H).toBeCloseTo(
      3e-10 + 4e-10 + 8e-11 * Math.log(0.005 ** 2 / (1.5e-4 * 1.5e-3)),
      15,
    );
    expect(bulk.line.inductance_H).toBeCloseTo(
      1.5e-9 + 8e-10 + 8e-11 * Math.log(0.03 ** 2 / (1.5e-4 * 1.5e-3)),
      15,
    );
  });
});
