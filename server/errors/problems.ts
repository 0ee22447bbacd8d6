import type { Problem } from '@shared/schemas/common.schema';

export interface Fault {
  path: string;
  message: string;
}

/** An answer that is not the one asked for. Services throw it; the mapper turns it into problem details. */
export class ProblemError extends Error {
  constructor(
    readonly status: number,
    readonly slug: string,
    readonly title: string,
    readonly detail?: string,
    readonly extra: Record<string, unknown> = {},
    readonly headers: Record<string, string> = {},
  ) {
    super(detail ?? title);
    this.name = 'ProblemError';
  }

  toProblem(): Problem {
    return {
      type: `urn:millpond:problem:${this.slug}`,
      title: this.title,
      status: this.status,
      ...(this.detail === undefined ? {} : { detail: this.detail }),
      ...this.extra,
    };
  }
}

export const signedOut = () =>
  new ProblemError(401, 'signed-out', 'You are signed out', 'Sign in and try again.');

export const forbidden = (detail: string) => new ProblemError(403, 'forbidden', 'Not allowed', detail);

export const notFound = (what: string) =>
  new ProblemError(404, 'not-found', 'Not found', `There is no such ${what}.`);

export const conflict = (detail: string) => new ProblemError(409, 'conflict', 'Not possible now', detail);

export const badRequest = (detail: string, errors?: Fault[]) =>
  new ProblemError(400, 'bad-request', 'The request cannot be read', detail, errors ? { errors } : {});

/** The values sent are wrong; each fault names its field. */
export const invalid = (errors: Fault[]) =>
  new ProblemError(422, 'invalid', 'Some values are wrong', undefined, { errors });

/** Someone saved in between: the newer state goes along, with who made it and when. */
export const stale = (current: unknown, changedBy: { id: string; name: string } | null, changedAt: string) =>
  new ProblemError(
    409,
    'stale',
    'Changed meanwhile',
    changedBy ? `${changedBy.name} saved a newer state.` : 'A newer state was saved.',
    { current, changedBy, changedAt },
  );
