import { mailPageSchema } from '@shared/schemas/mail.schema';
import { queryOptions, useQuery } from '@tanstack/react-query';
import { request } from '@/lib/api-client';

/** Mails that the server sent or kept, newest first. */
export const mailsQuery = queryOptions({
  queryKey: ['mail'],
  queryFn: ({ signal }) => request('GET', '/mail?limit=200', mailPageSchema, { signal }),
  refetchInterval: 15_000,
});
export const useMails = () => useQuery(mailsQuery);
