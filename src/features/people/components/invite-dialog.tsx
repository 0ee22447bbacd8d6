import { zodResolver } from '@hookform/resolvers/zod';
import { inviteSchema } from '@shared/schemas/person.schema';
import { useForm } from 'react-hook-form';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { Field } from '@/components/ui/field';
import { Input, Select } from '@/components/ui/input';
import { Notice } from '@/components/ui/notice';
import { ApiError, messageOf } from '@/lib/problem';
import { showServerFaults } from '@/lib/server-faults';
import { useInvite } from '../api/invite';
import { SITE_ROLES } from './site-role-words';

interface Props {
  open: boolean;
  onClose: () => void;
  onInvited: (email: string) => void;
}

function InviteForm({ onClose, onInvited }: Omit<Props, 'open'>) {
  const invite = useInvite();
  const form = useForm({
    resolver: zodResolver(inviteSchema),
    defaultValues: { email: '', name: '', siteRole: 'member' as const },
  });
  const { errors } = form.formState;
  const isAtField = invite.error instanceof ApiError && invite.error.problem.errors !== undefined;
  return (
    <form
      noValidate
      className="flex flex-col gap-4"
      onSubmit={form.handleSubmit((values) =>
        invite.mutate(values, {
          onSuccess: (person) => onInvited(person.email),
          onError: (error) => showServerFaults(error, ['email', 'name', 'siteRole'], form.setError),
        }),
      )}
    >
      <Field label="e-mail" error={errors.email?.message}>
        {(control) => <Input {...control} type="email" {...form.register('email')} />}
      </Field>
      <Field label="name" hint="They may write it differently when they accept." error={errors.name?.message}>
        {(control) => <Input {...control} {...form.register('name')} />}
      </Field>
      <Field label="site role" error={errors.siteRole?.message}>
        {(control) => (
          <Select {...control} {...form.register('siteRole')}>
            {SITE_ROLES.map((role) => (
              <option key={role}>{role}</option>
            ))}
          </Select>
        )}
      </Field>
      {invite.isError && !isAtField && <Notice tone="error">{messageOf(invite.error)}</Notice>}
      <div className="flex gap-3">
        <Button type="submit" variant="primary" disabled={invite.isPending}>
          {invite.isPending ? 'Sending …' : 'Send the invitation'}
        </Button>
        <Button onClick={onClose}>Cancel</Button>
      </div>
    </form>
  );
}

export function InviteDialog({ open, onClose, onInvited }: Props) {
  return (
    <Dialog title="Invite a person" open={open} onClose={onClose}>
      <InviteForm onClose={onClose} onInvited={onInvited} />
    </Dialog>
  );
}
