import { type ReactNode, useId } from 'react';

interface FieldProps {
  label: string;
  hint?: ReactNode;
  error?: string;
  /** Receives the ids that tie label, hint and error to the control. */
  children: (control: { id: string; 'aria-describedby'?: string; 'aria-invalid'?: true }) => ReactNode;
}

/** A labelled control with its hint and, at the field, what is wrong with it. */
export function Field({ label, hint, error, children }: FieldProps) {
  const id = useId();
  const note = error || hint ? `${id}-note` : undefined;
  return (
    <div className="flex flex-col gap-1">
      <label htmlFor={id} className="section-head">
        {label}
      </label>
      {children({
        id,
        ...(note && { 'aria-describedby': note }),
        ...(error && { 'aria-invalid': true as const }),
      })}
      {error ? (
        <p id={note} className="text-small text-kingfisher">
          ▲ {error}
        </p>
      ) : (
        hint && (
          <p id={note} className="text-small text-stone">
            {hint}
          </p>
        )
      )}
    </div>
  );
}
