import { type Problem, problemSchema } from '@shared/schemas/common.schema';

/** The server said no; `problem` is what it said (RFC 9457). */
export class ApiError extends Error {
  readonly status: number;
  readonly problem: Problem;

  constructor(problem: Problem) {
    super(problem.detail ?? problem.title);
    this.name = 'ApiError';
    this.status = problem.status;
    this.problem = problem;
  }

  /** The message for a field path such as `spec.name`, if the server named that field. */
  fieldMessage(path: string): string | undefined {
    return this.problem.errors?.find((error) => error.path === path)?.message;
  }
}

/** The server could not be reached at all. */
export class NetworkError extends Error {
  constructor() {
    super('the server cannot be reached');
    this.name = 'NetworkError';
  }
}

/** What was asked for is not there, or not for this person: asking again does not help. */
export const isGone = (error: unknown): boolean => error instanceof ApiError && error.status === 404;

/** The problem in a few words; `otherwise` where the server did not say it. */
export const titleOf = (error: unknown, otherwise: string): string =>
  error instanceof ApiError ? error.problem.title : otherwise;

export async function problemOf(response: Response): Promise<ApiError> {
  const body: unknown = await response.json().catch(() => null);
  const parsed = problemSchema.safeParse(body);
  return new ApiError(
    parsed.success
      ? parsed.data
      : {
          type: 'about:blank',
          title: response.statusText || 'the server answered in an unknown way',
          status: response.status,
        },
  );
}

/** One sentence for a person, whatever went wrong. */
export function messageOf(error: unknown): string {
  if (error instanceof ApiError) {
    const faults = error.problem.errors?.map((fault) =>
      fault.path ? `${fault.path}: ${fault.message}` : fault.message,
    );
    return faults && faults.length > 0 ? `${error.message} (${faults.join('; ')})` : error.message;
  }
  if (error instanceof Error) return error.message;
  return 'something unexpected went wrong';
}
