import { useRef, useState } from 'react';
import { Button } from '@/components/ui/button';
import { readSourceFile } from '../lib/source-file';
import type { SpecBinding } from './spec-binding';
import { PointsField } from './spec-fields';

/** The measured or simulated output impedance, typed or taken from a text file. */
export function SourceTableField({ bind }: { bind: SpecBinding }) {
  const input = useRef<HTMLInputElement>(null);
  const [said, setSaid] = useState<{ ok: boolean; text: string } | null>(null);
  const take = async (file: File | undefined) => {
    if (!file) return;
    const answer = await readSourceFile(file);
    setSaid({ ok: answer.ok, text: answer.ok ? answer.note : answer.reason });
    if (answer.ok) bind.set({ sourceTable: answer.text });
  };
  return (
    <div className="col-span-full flex max-w-xl flex-col gap-2">
      <PointsField
        bind={bind}
        field="sourceTable"
        label="points"
        hint="one a line: frequency, Re Z, Im Z, e.g. 10k 1m 3m"
      />
      <div className="flex flex-wrap items-center gap-x-4 gap-y-1">
        <Button onClick={() => input.current?.click()}>Read a CSV or text file</Button>
        <span className="text-small text-stone">up to 1 MB, 20 000 points; it stays in this form</span>
      </div>
      <input
        ref={input}
        type="file"
        accept=".csv,.txt,text/csv,text/plain"
        aria-label="file with the source’s points"
        tabIndex={-1}
        className="sr-only"
        onChange={(event) => {
          void take(event.target.files?.[0]);
          // The same file may be chosen again after it has been mended.
          event.target.value = '';
        }}
      />
      <p role="status" className={said?.ok === false ? 'text-kingfisher' : 'text-stone'}>
        {said && (said.ok ? said.text : `▲ ${said.text}`)}
      </p>
    </div>
  );
}
