import { ApiError } from '@/lib/problem';
import { CURVES } from './curve-fields';

/** A refusal whose faults inside a curve (`bias_curve[2][1]`) stand at the curve's field, with the point named. */
export function atCurves(error: unknown): unknown {
  if (!(error instanceof ApiError)) return error;
  const errors = error.problem.errors?.map((fault) => {
    const [, name, point] = /^(\w+)\[(\d+)\]/.exec(fault.path) ?? [];
    return name in CURVES ? { path: name, message: `point ${Number(point) + 1}: ${fault.message}` } : fault;
  });
  return new ApiError({ ...error.problem, ...(errors && { errors }) });
}
