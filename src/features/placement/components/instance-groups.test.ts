import type { RevisionRail } from '@shared/schemas/revision.schema';
import { describe, expect, it } from 'vitest';
import { layoutCautions, railGroups, sharedReason } from './instance-groups';

const instance = (designator: string, partNumber: string) => ({
  designator,
  partNumber,
  value: '',
  caseSize: '',
  side: 'top' as const,
  rail: 'R',
  mount_H: 0,
  distance_m: null,
  farthest_m: null,
  farthestReason: null,
});
const part = (id: string, technology: string, caseSize: string, termination?: 'soft') => ({
  id,
  capacitance_F: 1e-6,
  esr_ohm: 0.01,
  esl_H: 1e-9,
  mount_H: 0,
  technology,
  case: caseSize,
  ...(termination && { termination }),
});
const rail = (railId: string, parts: ReturnType<typeof part>[], placed: string[]): RevisionRail => ({
  railId,
  document: {
    format: 'millpond-rail',
    version: 1,
    rail: {
      name: railId,
      voltage_V: 1,
      target: { kind: 'flat', impedance_ohm: 0.01 },
      band_Hz: [1e4, 1e7],
      source: { kind: 'open' },
      observe: 'pins',
    },
    parts,
    bank: [],
  },
  summary: {
    engineVersion: '1',
    holds: null,
    tightest: null,
    catalogue: null,
    worst: null,
    missing: null,
    parts: 0,
    kinds: 0,
    cost: null,
    area_mm2: null,
    error: null,
  },
  peaks: [],
  checks: null,
  instances: placed.map((id, i) => instance(`C${i}`, id)),
});

describe('placement by rail', () => {
  const results = [
    rail('one', [part('BIG', 'ceramic', '1210'), part('IDLE', 'ceramic', '2220')], ['BIG', 'BIG']),
    rail(
      'two',
      [
        part('BIG', 'ceramic', '1210'),
        part('SOFT', 'ceramic', '1210', 'soft'),
        part('POL', 'polymer', '7343'),
      ],
      ['POL', 'SOFT'],
    ),
    rail('three', [], []),
  ];

  it('leaves out rails with nothing to place', () => {
    expect(railGroups(results).map((group) => group.railId)).toEqual(['one', 'two']);
  });

  it('names each part to be careful with once, and only parts that are placed', () => {
    expect(layoutCautions(results)).toEqual({ cracks: ['BIG'], bends: ['SOFT'], polarised: ['POL'] });
  });

  it('says a remark once only where it holds for all', () => {
    const short = { ...instance('C1', 'A'), farthestReason: 'the rail is short as planned' };
    expect(sharedReason({ instances: [short, { ...short, designator: 'C2' }] })).toBe(short.farthestReason);
    expect(sharedReason({ instances: [short, { ...short, farthest_m: 0.01 }] })).toBeNull();
    expect(sharedReason({ instances: [short, instance('C2', 'A')] })).toBeNull();
  });
});
