import { zodResolver } from '@hookform/resolvers/zod';
import { signInSchema } from '@shared/schemas/person.schema';
import { useForm } from 'react-hook-form';
import { Button } from '@/components/ui/button';
import { Field } from '@/components/ui/field';
import { Input } from '@/components/ui/input';
import { Notice } from '@/components/ui/notice';
import { messageOf, titleOf } from '@/lib/problem';
import { useSignIn } from '../api/session';

export function SignInForm({ email = '', onSignedIn }: { email?: string; onSignedIn: () => void }) {
  const signIn = useSignIn();
  const form = useForm({ resolver: zodResolver(signInSchema), defaultValues: { email, password: '' } });
  const { errors } = form.formState;
  return (
    <form
      noValidate
      className="flex flex-col gap-4"
      onSubmit={form.handleSubmit((values) => signIn.mutate(values, { onSuccess: onSignedIn }))}
    >
      <Field label="e-mail" error={errors.email?.message}>
        {(control) => <Input {...control} type="email" autoComplete="username" {...form.register('email')} />}
      </Field>
      <Field label="password" error={errors.password?.message}>
        {(control) => (
          <Input
            {...control}
            type="password"
            autoComplete="current-password"
            {...form.register('password')}
          />
        )}
      </Field>
      {signIn.isError && (
        <Notice tone="error" title={`▲ ${titleOf(signIn.error, 'not signed in')}`}>
          {messageOf(signIn.error)}
        </Notice>
      )}
      <div>
        <Button type="submit" variant="primary" disabled={signIn.isPending}>
          {signIn.isPending ? 'Signing in …' : 'Sign in'}
        </Button>
      </div>
    </form>
  );
}
