import { versionQuerySchema } from '@shared/schemas/common.schema';
import { createRailSchema, orderRailsSchema, updateRailSchema } from '@shared/schemas/rail.schema';
import { fileSafe } from '../services/file-name';
import {
  createRail,
  deleteRail,
  exportRail,
  listRails,
  readRail,
  updateRail,
} from '../services/rail.service';
import { orderRails } from '../services/rail-order.service';
import { attachment, created, done, route } from './route';

export const railRoutes = [
  route('get', '/boards/:boardId/rails', {
    access: 'signed-in',
    handle: ({ ctx, actor, params }) => listRails(ctx, actor, params.boardId),
  }),
  route('post', '/boards/:boardId/rails', {
    access: 'signed-in',
    body: createRailSchema,
    handle: async ({ ctx, actor, params, body }) =>
      created(await createRail(ctx, actor, params.boardId, body)),
  }),
  route('put', '/boards/:boardId/rails/order', {
    access: 'signed-in',
    body: orderRailsSchema,
    handle: ({ ctx, actor, params, body }) => orderRails(ctx, actor, params.boardId, body.railIds),
  }),
  route('get', '/boards/:boardId/rails/:railId', {
    access: 'signed-in',
    handle: ({ ctx, actor, params }) => readRail(ctx, actor, params.boardId, params.railId),
  }),
  route('patch', '/boards/:boardId/rails/:railId', {
    access: 'signed-in',
    body: updateRailSchema,
    handle: ({ ctx, actor, params, body }) => updateRail(ctx, actor, params.boardId, params.railId, body),
  }),
  route('delete', '/boards/:boardId/rails/:railId', {
    access: 'signed-in',
    query: versionQuerySchema,
    handle: async ({ ctx, actor, params, query }) => {
      await deleteRail(ctx, actor, params.boardId, params.railId, query.version);
      return done();
    },
  }),
  route('get', '/boards/:boardId/rails/:railId/document', {
    access: 'signed-in',
    handle: async ({ ctx, actor, params }) => {
      const document = await exportRail(ctx, actor, params.boardId, params.railId);
      const name = `${fileSafe(document.rail.name)}.rail.json`;
      return attachment(`${JSON.stringify(document, null, 2)}\n`, name, 'application/json');
    },
  }),
];
