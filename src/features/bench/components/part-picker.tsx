import type { Part } from '@shared/schemas/part.schema';
import { formatQuantity, formatVolts } from '@shared/units/format';
import { useDeferredValue, useState } from 'react';
import { Dialog } from '@/components/ui/dialog';
import { Failure } from '@/components/ui/failure';
import { Field } from '@/components/ui/field';
import { Input } from '@/components/ui/input';
import { Table, Td, Th } from '@/components/ui/table';
import { usePartChoice } from '../api/part-choice';
import { partName } from '../lib/part-name';

interface PartPickerProps {
  open: boolean;
  voltage_V: number;
  onPick: (part: Part) => void;
  onClose: () => void;
}

/** Finds a part in the library and puts it into the bank. Shows only what is rated for the rail. */
export function PartPicker({ open, voltage_V, onPick, onClose }: PartPickerProps) {
  const [text, setText] = useState('');
  const q = useDeferredValue(text.trim());
  const choice = usePartChoice(q, voltage_V, open);
  const parts = (choice.data?.items ?? []).filter((part) => part.state !== 'retired');
  return (
    <Dialog title="Add a part to the bank" open={open} onClose={onClose} wide>
      <Field label="find" hint={`rated for ${formatVolts(voltage_V)} or more, not retired`}>
        {(control) => (
          <Input
            {...control}
            value={text}
            placeholder="part number, dielectric or case, e.g. X7R 0402"
            onChange={(event) => setText(event.target.value)}
            onKeyDown={(event) => {
              if (event.key === 'Enter' && parts.length > 0) onPick(parts[0]);
            }}
          />
        )}
      </Field>
      {choice.isError && (
        <Failure error={choice.error} what="the parts" retry={() => void choice.refetch()} />
      )}
      {choice.data && parts.length === 0 && (
        <p className="text-stone">
          No part fits “{text}”. Shorten what you look for, or add the part to the library.
        </p>
      )}
      {parts.length > 0 && (
        <div className="max-h-[50vh] overflow-y-auto">
          <Table
            caption="parts that fit"
            head={
              <>
                <Th>part</Th>
                <Th>number</Th>
                <Th numeric>rated</Th>
                <Th numeric>ESR</Th>
                <Th numeric>ESL</Th>
                <Th>state</Th>
                <Th>
                  <span className="sr-only">choose</span>
                </Th>
              </>
            }
          >
            {parts.map((part) => (
              <tr key={part.id} className="hover:bg-wash">
                <Td className="font-semibold whitespace-nowrap">{partName(part)}</Td>
                <Td>{part.partNumber}</Td>
                <Td numeric>{formatQuantity(part.rated_voltage_V, 'V', { trim: true })}</Td>
                <Td numeric>{formatQuantity(part.esr_ohm, 'Ω')}</Td>
                <Td numeric>{formatQuantity(part.esl_H, 'H')}</Td>
                <Td className={part.state === 'draft' ? 'text-brass' : undefined}>{part.state}</Td>
                <Td>
                  <button
                    type="button"
                    className="font-semibold text-deep underline-offset-4 hover:underline"
                    onClick={() => onPick(part)}
                    aria-label={`add ${part.partNumber}`}
                  >
                    add
                  </button>
                </Td>
              </tr>
            ))}
          </Table>
        </div>
      )}
    </Dialog>
  );
}
