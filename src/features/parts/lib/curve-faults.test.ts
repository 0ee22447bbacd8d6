import { describe, expect, it } from 'vitest';
import { ApiError } from '@/lib/problem';
import { atCurves } from './curve-faults';

describe('faults inside a curve', () => {
  it('stand at the curve’s field with the point named; others stay', () => {
    const error = new ApiError({
      type: 'about:blank',
      title: 'not understood',
      status: 422,
      errors: [
        { path: 'bias_curve[2][0]', message: 'voltage must rise from point to point' },
        { path: 'partNumber', message: 'must not be empty' },
      ],
    });
    const moved = atCurves(error);
    expect(moved instanceof ApiError && moved.problem.errors).toEqual([
      { path: 'bias_curve', message: 'point 3: voltage must rise from point to point' },
      { path: 'partNumber', message: 'must not be empty' },
    ]);
  });

  it('leaves everything else alone', () => {
    const other = new Error('no network');
    expect(atCurves(other)).toBe(other);
  });
});
