import { describe, expect, it } from 'vitest';
import { z } from 'zod';
import { idSchema, nameSchema, versionSchema } from './common.schema';
import { createPartSchema } from './part.schema';
import { inviteSchema } from './person.schema';
import { searchSettingsSchema } from './rail.schema';
import { documentLineSchema, railDocumentSchema } from './rail-document.schema';
import { planeGeometrySchema, railSpecSchema, sourceSchema } from './rail-spec.schema';

const messages = (schema: z.ZodType, value: unknown): string[] =>
  schema.safeParse(value).error?.issues.map((issue) => issue.message) ?? [];

const geometry = { length_m: 0.1, width_m: 0.1, spacing_m: 1e-4, relative_permittivity: 4 };

describe('what schemas say', () => {
  it.each<[string, z.ZodType, unknown, string]>([
    [
      'a number above its limit',
      planeGeometrySchema,
      { ...geometry, relative_permittivity: 1001 },
      'must be at most 1000',
    ],
    ['a large limit', documentLineSchema, { part: 'A', count: 100_001 }, 'count must be at most 100 000'],
    ['a text that is too long', inviteSchema.shape.email, 'x'.repeat(201), 'at most 200 characters'],
    ['an identifier that is none', idSchema, 'x', 'is not a valid identifier'],
    ['text for a number', versionSchema, '1', 'must be a number'],
    ['not a number', z.number(), Number.NaN, 'must be a number'],
    ['a fraction', versionSchema, 1.5, 'must be a whole number'],
    ['a number below its limit', versionSchema, 0, 'must be at least 1'],
    ['a negative number', searchSettingsSchema.shape.distance_m, -1, 'must not be negative'],
    ['a number for text', nameSchema, 1, 'must be text'],
    ['nothing', nameSchema, undefined, 'is missing'],
    ['a wrong word', createPartSchema.shape.termination, 'hard', 'must be one of standard, soft'],
    ['a wrong format', railDocumentSchema.shape.format, 'x', 'must be millpond-rail'],
    ['an unknown kind', sourceSchema, { kind: 'battery' }, 'is none of the kinds that are known here'],
    [
      'an empty list of candidates',
      searchSettingsSchema.shape.candidateIds,
      Array.from({ length: 501 }, () => '4f1c3b9e-0000-4000-8000-000000000000'),
      'at most 500 entries',
    ],
    ['an unknown field', inviteSchema, { email: 'a@b.example', name: 'A', x: 1 }, 'x is not a known field'],
  ])('of %s', (_, schema, value, message) => {
    expect(messages(schema, value).join('; ')).toContain(message);
  });

  it('keeps a schema’s own words', () => {
    expect(messages(nameSchema, '')).toEqual(['must not be empty']);
    expect(messages(documentLineSchema, { part: 'A', count: 0.5 })[0]).toBe('count must be a whole number');
  });

  it('never leaves a validator’s raw text, whatever is sent for a rail', () => {
    const odd: unknown[] = [null, [], '', 'x'.repeat(300), -1, 1e308, Number.NaN, true, {}, undefined];
    const fields = Object.keys(railSpecSchema.shape);
    const said = fields.flatMap((field) =>
      odd.flatMap((value) => messages(railSpecSchema, { [field]: value })),
    );
    for (const message of said) expect(message).not.toMatch(/Invalid|Too (big|small)|expected|received/);
  });
});
