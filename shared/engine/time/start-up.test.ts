import { describe, expect, it } from 'vitest';
import { dischargeTime, hotPlugCurrent, startUp, voltageLeft } from './start-up';

const refused = (work: () => unknown, field: string) =>
  expect(work).toThrow(expect.objectContaining({ name: 'EngineError', field }));

describe('start-up', () => {
  const input = { capacitance_F: 1e-3, voltage_V: 2, soft_start_s: 1e-3 };

  it('charges Q = C·V at I = Q/t and stores C·V²/2', () => {
    expect(startUp(input)).toEqual({
      charge_C: 2e-3,
      energy_J: 2e-3,
      current_A: 2,
      within_limit: null,
      needed_s: null,
    });
  });

  it('says whether the limit allows it, and how long a soft start it needs', () => {
    expect(startUp({ ...input, current_limit_A: 2 })).toMatchObject({ within_limit: true, needed_s: 1e-3 });
    expect(startUp({ ...input, current_limit_A: 1 })).toMatchObject({ within_limit: false, needed_s: 2e-3 });
  });

  it('charges nothing without capacitance', () => {
    expect(startUp({ ...input, capacitance_F: 0 }).current_A).toBe(0);
  });

  it('refuses what makes no sense, by field', () => {
    refused(() => startUp({ ...input, capacitance_F: -1 }), 'start_up.capacitance_F');
    refused(() => startUp({ ...input, voltage_V: Number.NaN }), 'start_up.voltage_V');
    refused(() => startUp({ ...input, soft_start_s: 0 }), 'start_up.soft_start_s');
    refused(() => startUp({ ...input, current_limit_A: 0 }), 'start_up.current_limit_A');
    refused(() => hotPlugCurrent(5, 0), 'resistance_ohm');
    refused(() => dischargeTime(1, 1, 1, 2), 'to_V');
    refused(() => dischargeTime(1, 1, 1, 0), 'to_V');
    refused(() => voltageLeft(0, 1, 1, 1), 'capacitance_F');
  });
});

describe('discharge', () => {
  it('takes as long as the voltage left says', () => {
    const after_s = dischargeTime(1e-3, 50, 12, 3);
    expect(voltageLeft(1e-3, 50, 12, after_s)).toBeCloseTo(3, 12);
    expect(dischargeTime(1e-3, 50, 12, 12)).toBe(0);
  });
});
