import { expect, it } from 'vitest';
import { toProblemError } from './problem-mapper';

const sqlite = (code: string) =>
  Object.assign(new Error('failed'), { driverError: Object.assign(new Error(code), { code }) });

it.each([
  [sqlite('SQLITE_BUSY'), 503],
  [sqlite('SQLITE_BUSY_SNAPSHOT'), 503],
  [sqlite('SQLITE_CONSTRAINT_UNIQUE'), 409],
  [Object.assign(new Error('too large'), { status: 413 }), 413],
  [Object.assign(new Error('odd'), { status: 418 }), 500],
  [new Error('a fault of ours'), 500],
  ['not even an error', 500],
])('maps %s to %i', (error, status) => {
  const problem = toProblemError(error);
  expect(problem.status).toBe(status);
  if (status === 500) expect(JSON.stringify(problem.toProblem())).not.toContain('fault of ours');
});
