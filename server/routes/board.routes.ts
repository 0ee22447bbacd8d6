import { createBoardSchema, setMemberSchema, updateBoardSchema } from '@shared/schemas/board.schema';
import { setBoardSetupSchema } from '@shared/schemas/board-setup.schema';
import { pageQuerySchema, versionQuerySchema } from '@shared/schemas/common.schema';
import { createBoard, deleteBoard, listBoards, readBoard, updateBoard } from '../services/board.service';
import { removeMember, setMember } from '../services/member.service';
import { saveSetup } from '../services/setup.service';
import { created, done, route } from './route';

export const boardRoutes = [
  route('get', '/boards', {
    access: 'signed-in',
    query: pageQuerySchema,
    handle: ({ ctx, actor, query }) => listBoards(ctx, actor, query),
  }),
  route('post', '/boards', {
    access: 'signed-in',
    body: createBoardSchema,
    handle: async ({ ctx, actor, body }) => created(await createBoard(ctx, actor, body)),
  }),
  route('get', '/boards/:boardId', {
    access: 'signed-in',
    handle: ({ ctx, actor, params }) => readBoard(ctx, actor, params.boardId),
  }),
  route('patch', '/boards/:boardId', {
    access: 'signed-in',
    body: updateBoardSchema,
    handle: ({ ctx, actor, params, body }) => updateBoard(ctx, actor, params.boardId, body),
  }),
  route('delete', '/boards/:boardId', {
    access: 'signed-in',
    query: versionQuerySchema,
    handle: async ({ ctx, actor, params, query }) => {
      await deleteBoard(ctx, actor, params.boardId, query.version);
      return done();
    },
  }),
  route('put', '/boards/:boardId/setup', {
    access: 'signed-in',
    body: setBoardSetupSchema,
    handle: ({ ctx, actor, params, body }) => saveSetup(ctx, actor, params.boardId, body),
  }),
  route('put', '/boards/:boardId/members/:personId', {
    access: 'signed-in',
    body: setMemberSchema,
    handle: ({ ctx, actor, params, body }) =>
      setMember(ctx, actor, params.boardId, params.personId, body.role),
  }),
  route('delete', '/boards/:boardId/members/:personId', {
    access: 'signed-in',
    handle: ({ ctx, actor, params }) => removeMember(ctx, actor, params.boardId, params.personId),
  }),
];
