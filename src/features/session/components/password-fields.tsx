import type { UseFormRegisterReturn } from 'react-hook-form';
import { Field } from '@/components/ui/field';
import { Input } from '@/components/ui/input';

interface Props {
  label?: string;
  fault?: string;
  repeatFault?: string;
  password: UseFormRegisterReturn;
  repeat: UseFormRegisterReturn;
}

/** A new password, typed twice. */
export function PasswordFields({ label = 'password', fault, repeatFault, password, repeat }: Props) {
  return (
    <>
      <Field label={label} hint="At least 12 characters; a few plain words together do well." error={fault}>
        {(control) => <Input {...control} type="password" autoComplete="new-password" {...password} />}
      </Field>
      <Field label={`${label}, once more`} error={repeatFault}>
        {(control) => <Input {...control} type="password" autoComplete="new-password" {...repeat} />}
      </Field>
    </>
  );
}
