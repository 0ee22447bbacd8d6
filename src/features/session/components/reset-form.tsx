import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import { Button } from '@/components/ui/button';
import { showServerFaults } from '@/lib/server-faults';
import type { useSetPassword } from '../api/reset';
import { PasswordFields } from './password-fields';
import { resetFormSchema } from './password-form.schema';

export function ResetForm({ email, save }: { email: string; save: ReturnType<typeof useSetPassword> }) {
  const form = useForm({
    resolver: zodResolver(resetFormSchema),
    defaultValues: { password: '', repeat: '' },
  });
  const { errors } = form.formState;
  return (
    <form
      noValidate
      className="flex flex-col gap-4"
      onSubmit={form.handleSubmit(({ password }) =>
        save.mutate(
          { password },
          { onError: (error) => showServerFaults(error, ['password'], form.setError) },
        ),
      )}
    >
      <input type="hidden" autoComplete="username" value={email} readOnly />
      <PasswordFields
        label="new password"
        fault={errors.password?.message}
        repeatFault={errors.repeat?.message}
        password={form.register('password')}
        repeat={form.register('repeat')}
      />
      <div>
        <Button type="submit" variant="primary" disabled={save.isPending}>
          {save.isPending ? 'Saving …' : 'Set the password'}
        </Button>
      </div>
    </form>
  );
}
