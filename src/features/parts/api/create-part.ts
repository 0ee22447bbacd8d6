import { type PartFields, partSchema } from '@shared/schemas/part.schema';
import { useMutation, useQueryClient } from '@tanstack/react-query';
import { request } from '@/lib/api-client';
import { takePart } from './part';

export function useCreatePart() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: PartFields) => request('POST', '/parts', partSchema, { body }),
    onSuccess: (part) => takePart(client, part),
  });
}
