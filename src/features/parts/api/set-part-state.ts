import { type PartState, partSchema } from '@shared/schemas/part.schema';
import { useMutation, useQueryClient } from '@tanstack/react-query';
import { request } from '@/lib/api-client';
import { takePart } from './part';

export function useSetPartState(partId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: { version: number; state: PartState }) =>
      request('PUT', `/parts/${partId}/state`, partSchema, { body }),
    onSuccess: (part) => takePart(client, part),
  });
}
