import { z } from 'zod';

type Issue = z.core.$ZodRawIssue;

/** `20000` → `20 000`, `1e15` → `1e15`. */
function count(limit: number | bigint): string {
  const size = Math.abs(Number(limit));
  if (size >= 1e9) return Number(limit).toExponential().replace('e+', 'e');
  return size < 1e4 ? String(limit) : String(limit).replace(/\B(?=(\d{3})+$)/g, ' ');
}

const several = (limit: number | bigint, one: string, many: string) =>
  `${count(limit)} ${Number(limit) === 1 ? one : many}`;

const KINDS: Readonly<Record<string, string>> = {
  string: 'must be text',
  number: 'must be a number',
  int: 'must be a whole number',
  boolean: 'must be true or false',
  array: 'must be a list',
  tuple: 'must be a list',
  object: 'must be an object with named fields',
  record: 'must be an object with named fields',
  date: 'must be a date',
  null: 'must be empty',
};

const FORMATS: Readonly<Record<string, string>> = {
  email: 'is not an e-mail address',
  url: 'is not an address',
  uuid: 'is not a valid identifier',
  datetime: 'is not a date with time',
};

function tooBig({ origin, maximum, inclusive = true }: z.core.$ZodRawIssue<z.core.$ZodIssueTooBig>): string {
  if (origin === 'string') return `at most ${several(maximum, 'character', 'characters')}`;
  if (origin === 'array' || origin === 'set') return `at most ${several(maximum, 'entry', 'entries')}`;
  return inclusive ? `must be at most ${count(maximum)}` : `must be below ${count(maximum)}`;
}

function tooSmall({
  origin,
  minimum,
  inclusive = true,
}: z.core.$ZodRawIssue<z.core.$ZodIssueTooSmall>): string {
  const isText = origin === 'string';
  if (isText || origin === 'array' || origin === 'set') {
    if (Number(minimum) === 1) return 'must not be empty';
    return `at least ${isText ? several(minimum, 'character', 'characters') : several(minimum, 'entry', 'entries')}`;
  }
  if (inclusive) return Number(minimum) === 0 ? 'must not be negative' : `must be at least ${count(minimum)}`;
  return Number(minimum) === 0 ? 'must be above zero' : `must be above ${count(minimum)}`;
}

/** What is wrong and what the limit is, in words for a person; `undefined` leaves it to what zod says. */
export function plainMessage(issue: Issue): string | undefined {
  switch (issue.code) {
    case 'invalid_type':
      if (issue.input === undefined) return 'is missing';
      return KINDS[issue.expected] ?? 'is of the wrong kind';
    case 'too_big':
      return tooBig(issue as z.core.$ZodRawIssue<z.core.$ZodIssueTooBig>);
    case 'too_small':
      return tooSmall(issue as z.core.$ZodRawIssue<z.core.$ZodIssueTooSmall>);
    case 'invalid_format':
      return FORMATS[issue.format] ?? 'is not written as it has to be';
    case 'not_multiple_of':
      return `must be a multiple of ${count(issue.divisor)}`;
    case 'unrecognized_keys':
      return issue.keys.length === 1
        ? `${issue.keys[0]} is not a known field`
        : `${issue.keys.join(', ')} are not known fields`;
    case 'invalid_value':
      if (issue.input === undefined) return 'is missing';
      return issue.values.length === 1
        ? `must be ${String(issue.values[0])}`
        : `must be one of ${issue.values.map(String).join(', ')}`;
    case 'invalid_union':
      return issue.input === undefined ? 'is missing' : 'is none of the kinds that are known here';
    default:
      return undefined;
  }
}

// Once for all schemas, wherever they are read: form, server and command say the same. A schema's own message comes first.
z.config({ customError: plainMessage });
