import { zodResolver } from '@hookform/resolvers/zod';
import { emailSchema } from '@shared/schemas/person.schema';
import { useForm } from 'react-hook-form';
import { z } from 'zod';
import { Button } from '@/components/ui/button';
import { Field } from '@/components/ui/field';
import { Input } from '@/components/ui/input';
import { Notice } from '@/components/ui/notice';
import { TextLink } from '@/components/ui/text-link';
import { paths } from '@/config/paths';
import { messageOf } from '@/lib/problem';
import { usePageTitle } from '@/lib/use-page-title';
import { useRequestReset } from '../api/reset';
import { DoorLayout } from './door-layout';

const formSchema = z.object({ email: emailSchema });

/** Asks for a link to set a new password. The answer is the same for every address. */
export function ForgottenPage() {
  usePageTitle('Forgotten password');
  const ask = useRequestReset();
  const form = useForm({ resolver: zodResolver(formSchema), defaultValues: { email: '' } });
  const back = (
    <p>
      <TextLink to={paths.signIn()}>Back to sign in</TextLink>
    </p>
  );
  if (ask.isSuccess)
    return (
      <DoorLayout title="Look into your mail">
        <p>
          If {ask.variables.email} belongs to someone here, a link to set a new password is on its way. It is
          good for a short time and for one use.
        </p>
        {back}
      </DoorLayout>
    );
  return (
    <DoorLayout title="Forgotten password" lead="We send you a link to set a new one.">
      <form
        noValidate
        className="flex flex-col gap-4"
        onSubmit={form.handleSubmit((values) => ask.mutate(values))}
      >
        <Field label="e-mail" error={form.formState.errors.email?.message}>
          {(control) => (
            <Input {...control} type="email" autoComplete="username" {...form.register('email')} />
          )}
        </Field>
        {ask.isError && <Notice tone="error">{messageOf(ask.error)}</Notice>}
        <div>
          <Button type="submit" variant="primary" disabled={ask.isPending}>
            {ask.isPending ? 'Sending …' : 'Send the link'}
          </Button>
        </div>
      </form>
      {back}
    </DoorLayout>
  );
}
