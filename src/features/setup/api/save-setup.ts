import { boardDetailSchema } from '@shared/schemas/board.schema';
import type { BoardSetup } from '@shared/schemas/board-setup.schema';
import { useMutation } from '@tanstack/react-query';
import { request } from '@/lib/api-client';

/** Saves stack-up and recipes as one; the answer is the board as it is then. Who shows boards and rails renews them. */
export const useSaveSetup = (boardId: string) =>
  useMutation({
    mutationFn: (body: { version: number; setup: BoardSetup }) =>
      request('PUT', `/boards/${boardId}/setup`, boardDetailSchema, { body }),
  });
