import { type RailWithParts, railWithPartsSchema } from '@shared/schemas/rail.schema';
import { request } from '@/lib/api-client';
import type { RailEdit } from '../lib/rail-saver';

/** Sends an edit of a rail, made on the version it names. */
export function saveRail(
  boardId: string,
  railId: string,
  body: RailEdit & { version: number },
): Promise<RailWithParts> {
  return request('PATCH', `/boards/${boardId}/rails/${railId}`, railWithPartsSchema, { body });
}
