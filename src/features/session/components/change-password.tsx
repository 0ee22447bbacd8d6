import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import { Button } from '@/components/ui/button';
import { Field } from '@/components/ui/field';
import { Input } from '@/components/ui/input';
import { Notice } from '@/components/ui/notice';
import { messageOf } from '@/lib/problem';
import { showServerFaults } from '@/lib/server-faults';
import { useChangePassword } from '../api/password';
import { PasswordFields } from './password-fields';
import { changeFormSchema } from './password-form.schema';

const EMPTY = { currentPassword: '', password: '', repeat: '' };

export function ChangePassword({ email }: { email: string }) {
  const change = useChangePassword();
  const form = useForm({ resolver: zodResolver(changeFormSchema), defaultValues: EMPTY });
  const { errors } = form.formState;
  const isShown = Object.keys(errors).length > 0;
  return (
    <form
      noValidate
      className="flex max-w-sm flex-col gap-4"
      onSubmit={form.handleSubmit(({ currentPassword, password }) =>
        change.mutate(
          { currentPassword, password },
          {
            onSuccess: () => form.reset(EMPTY),
            onError: (error) => showServerFaults(error, ['currentPassword', 'password'], form.setError),
          },
        ),
      )}
    >
      <input type="hidden" autoComplete="username" value={email} readOnly />
      <Field label="current password" error={errors.currentPassword?.message}>
        {(control) => (
          <Input
            {...control}
            type="password"
            autoComplete="current-password"
            {...form.register('currentPassword')}
          />
        )}
      </Field>
      <PasswordFields
        label="new password"
        fault={errors.password?.message}
        repeatFault={errors.repeat?.message}
        password={form.register('password')}
        repeat={form.register('repeat')}
      />
      {change.isError && !isShown && <Notice tone="error">{messageOf(change.error)}</Notice>}
      {change.isSuccess && (
        <p role="status" className="text-reed">
          ▽ Changed. Your other sessions have ended.
        </p>
      )}
      <div>
        <Button type="submit" disabled={change.isPending}>
          {change.isPending ? 'Saving …' : 'Change the password'}
        </Button>
      </div>
    </form>
  );
}
