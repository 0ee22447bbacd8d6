import { EngineError } from '@shared/engine/errors';
import { describe, expect, it } from 'vitest';
import { orRefusal, refusalText } from './refusal';

describe('what the engine refuses', () => {
  it('is said with what it is about', () => {
    expect(refusalText(new EngineError('voltage_V', 'must not be negative'))).toBe(
      'bias: must not be negative',
    );
    expect(refusalText(new EngineError('bias_curve[2]', 'the factor must be above zero'))).toBe(
      'bias curve, point 3: the factor must be above zero',
    );
    expect(refusalText(new EngineError('rated_voltage_V', '7 V is above its rating of 6.3 V'))).toBe(
      '7 V is above its rating of 6.3 V',
    );
  });

  it('is caught, and nothing else is', () => {
    expect(orRefusal(() => 3)).toEqual({ value: 3 });
    const refuse = () => {
      throw new EngineError('age_h', 'must not be negative');
    };
    expect(orRefusal(refuse)).toEqual({ refusal: 'age: must not be negative' });
    const breakDown = () => {
      throw new TypeError('broken');
    };
    expect(() => orRefusal(breakDown)).toThrow(TypeError);
  });
});
