import { type PartFields, partSchema } from '@shared/schemas/part.schema';
import { useMutation, useQueryClient } from '@tanstack/react-query';
import { request } from '@/lib/api-client';
import { takePart } from './part';

export function useUpdatePart(partId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: PartFields & { version: number }) =>
      request('PATCH', `/parts/${partId}`, partSchema, { body }),
    onSuccess: (part) => takePart(client, part),
  });
}
