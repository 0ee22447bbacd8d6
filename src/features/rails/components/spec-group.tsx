import type { ReactNode } from 'react';

interface Props {
  title: string;
  /** What it is for, above the fields. */
  note?: ReactNode;
  /** Pictures and tables under the fields, as wide as the form. */
  below?: ReactNode;
  /** What the fields come to. */
  result?: string;
  children: ReactNode;
}

/** One subject of the form: its name at the left, its fields in a row, what they come to below. */
export function SpecGroup({ title, note, below, result, children }: Props) {
  return (
    <fieldset className="grid gap-x-8 gap-y-2 border-t py-5 md:grid-cols-[10rem_minmax(0,1fr)]">
      <legend className="float-left font-semibold md:w-40">{title}</legend>
      <div className="flex min-w-0 flex-col gap-4">
        {note && <p className="max-w-prose text-small text-stone">{note}</p>}
        <div className="grid grid-cols-1 gap-4 sm:grid-cols-2 xl:grid-cols-4">{children}</div>
        {below}
        {result && (
          <output className="font-semibold text-deep" aria-live="polite">
            {result}
          </output>
        )}
      </div>
    </fieldset>
  );
}
