import { z } from 'zod';
import { boardSetupSchema } from './board-setup.schema';
import {
  idSchema,
  isoDateSchema,
  nameSchema,
  noteSchema,
  pageOf,
  personRefSchema,
  versionSchema,
} from './common.schema';

export const boardRoleSchema = z.enum(['engineer', 'reviewer', 'layout']);
export type BoardRole = z.infer<typeof boardRoleSchema>;

/** What the signed-in person may do on this board; decided by the server, shown by the client. */
export const boardRightsSchema = z.object({
  edit: z.boolean(),
  comment: z.boolean(),
  placement: z.boolean(),
  trace: z.boolean(),
  signOff: z.boolean(),
  /** Change the board's name and people, delete it. */
  manage: z.boolean(),
});
export type BoardRights = z.infer<typeof boardRightsSchema>;

export const boardSummarySchema = z.object({
  id: idSchema,
  name: z.string(),
  description: z.string(),
  owner: personRefSchema,
  version: versionSchema,
  createdAt: isoDateSchema,
  updatedAt: isoDateSchema,
  /** null: an administrator who is not on the board. */
  myRole: boardRoleSchema.nullable(),
  rights: boardRightsSchema,
  rails: z.object({ total: z.int(), hold: z.int(), short: z.int(), unknown: z.int() }),
  latestRevision: z.object({ letter: z.string(), createdAt: isoDateSchema }).nullable(),
  /** Rails that differ from the latest revision, new and deleted ones included (all of them, when there is none). */
  changedRails: z.int(),
});
export type BoardSummary = z.infer<typeof boardSummarySchema>;
export const boardPageSchema = pageOf(boardSummarySchema);

export const boardMemberSchema = z.object({
  person: personRefSchema.extend({ email: z.string(), disabled: z.boolean() }),
  role: boardRoleSchema,
});
export type BoardMember = z.infer<typeof boardMemberSchema>;

export const boardDetailSchema = boardSummarySchema.extend({
  members: z.array(boardMemberSchema),
  setup: boardSetupSchema,
  /** Of the setup alone, so that stack-up and name do not get into each other's way. */
  setupVersion: versionSchema,
});
export type BoardDetail = z.infer<typeof boardDetailSchema>;

export const createBoardSchema = z.strictObject({ name: nameSchema, description: noteSchema.default('') });
export const updateBoardSchema = z.strictObject({
  version: versionSchema,
  name: nameSchema.optional(),
  description: noteSchema.optional(),
});
export const setMemberSchema = z.strictObject({ role: boardRoleSchema });
