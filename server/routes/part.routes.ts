import {
  createPartSchema,
  partQuerySchema,
  setPartStateSchema,
  updatePartSchema,
} from '@shared/schemas/part.schema';
import { createPart, readPart, setPartState, updatePart } from '../services/part.service';
import { listParts, partFacets } from '../services/part-list.service';
import { created, route } from './route';

export const partRoutes = [
  route('get', '/parts', {
    access: 'signed-in',
    query: partQuerySchema,
    handle: ({ ctx, query }) => listParts(ctx, query),
  }),
  route('post', '/parts', {
    access: 'signed-in',
    body: createPartSchema,
    handle: async ({ ctx, actor, body }) => created(await createPart(ctx, actor, body)),
  }),
  route('get', '/parts/facets', { access: 'signed-in', handle: ({ ctx }) => partFacets(ctx) }),
  route('get', '/parts/:partId', {
    access: 'signed-in',
    handle: ({ ctx, params }) => readPart(ctx, params.partId),
  }),
  route('patch', '/parts/:partId', {
    access: 'signed-in',
    body: updatePartSchema,
    handle: ({ ctx, actor, params, body }) => updatePart(ctx, actor, params.partId, body),
  }),
  route('put', '/parts/:partId/state', {
    access: 'signed-in',
    body: setPartStateSchema,
    handle: ({ ctx, actor, params, body }) => setPartState(ctx, actor, params.partId, body),
  }),
];
