import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import { Button } from '@/components/ui/button';
import { Field } from '@/components/ui/field';
import { Input } from '@/components/ui/input';
import { TextLink } from '@/components/ui/text-link';
import { paths } from '@/config/paths';
import { showServerFaults } from '@/lib/server-faults';
import { useAcceptInvitation } from '../api/invitation';
import { PasswordFields } from './password-fields';
import { invitationFormSchema } from './password-form.schema';
import { TokenFailure } from './token-failure';

interface Props {
  token: string;
  name: string;
  email: string;
  onAccepted: () => void;
}

export function InvitationForm({ token, name, email, onAccepted }: Props) {
  const accept = useAcceptInvitation(token);
  const form = useForm({
    resolver: zodResolver(invitationFormSchema),
    defaultValues: { name, password: '', repeat: '' },
  });
  const { errors } = form.formState;
  return (
    <form
      noValidate
      className="flex flex-col gap-4"
      onSubmit={form.handleSubmit((values) =>
        accept.mutate(
          { name: values.name, password: values.password },
          {
            onSuccess: onAccepted,
            onError: (error) => showServerFaults(error, ['name', 'password'], form.setError),
          },
        ),
      )}
    >
      <input type="hidden" autoComplete="username" value={email} readOnly />
      <Field label="your name, as colleagues see it" error={errors.name?.message}>
        {(control) => <Input {...control} autoComplete="name" {...form.register('name')} />}
      </Field>
      <PasswordFields
        fault={errors.password?.message}
        repeatFault={errors.repeat?.message}
        password={form.register('password')}
        repeat={form.register('repeat')}
      />
      {accept.isError && (
        <TokenFailure error={accept.error} what="invitation">
          If you have accepted it already, <TextLink to={paths.signIn()}>sign in</TextLink>.
        </TokenFailure>
      )}
      <div>
        <Button type="submit" variant="primary" disabled={accept.isPending}>
          {accept.isPending ? 'One moment …' : 'Accept and go in'}
        </Button>
      </div>
    </form>
  );
}
