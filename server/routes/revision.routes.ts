import { pageQuerySchema } from '@shared/schemas/common.schema';
import { cutRevisionSchema } from '@shared/schemas/revision.schema';
import {
  cutRevision,
  listRevisions,
  placementList,
  readRevision,
  revisionDocument,
} from '../services/revision.service';
import { attachment, created, route } from './route';

export const revisionRoutes = [
  route('get', '/boards/:boardId/revisions', {
    access: 'signed-in',
    query: pageQuerySchema,
    handle: ({ ctx, actor, params, query }) => listRevisions(ctx, actor, params.boardId, query),
  }),
  route('post', '/boards/:boardId/revisions', {
    access: 'signed-in',
    body: cutRevisionSchema,
    handle: async ({ ctx, actor, params, body }) =>
      created(await cutRevision(ctx, actor, params.boardId, body.note)),
  }),
  route('get', '/boards/:boardId/revisions/:letter', {
    access: 'signed-in',
    handle: ({ ctx, actor, params }) => readRevision(ctx, actor, params.boardId, params.letter),
  }),
  route('get', '/boards/:boardId/revisions/:letter/placement.csv', {
    access: 'signed-in',
    handle: async ({ ctx, actor, params }) => {
      const { text, fileName } = await placementList(ctx, actor, params.boardId, params.letter);
      return attachment(text, fileName, 'text/csv; charset=utf-8');
    },
  }),
  route('get', '/boards/:boardId/revisions/:letter/document.json', {
    access: 'signed-in',
    handle: async ({ ctx, actor, params }) => {
      const { text, fileName } = await revisionDocument(ctx, actor, params.boardId, params.letter);
      return attachment(text, fileName, 'application/json');
    },
  }),
];
