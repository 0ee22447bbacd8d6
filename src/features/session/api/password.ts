import { useMutation } from '@tanstack/react-query';
import { command } from '@/lib/api-client';

export const useChangePassword = () =>
  useMutation({
    mutationFn: (body: { currentPassword: string; password: string }) =>
      command('PUT', '/session/password', { body }),
  });
