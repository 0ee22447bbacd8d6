import { type PartFacets, partStateSchema, technologySchema } from '@shared/schemas/part.schema';
import { useEffect, useState } from 'react';
import { Button } from '@/components/ui/button';
import { Field } from '@/components/ui/field';
import { Input, Select } from '@/components/ui/input';
import { QuantityInput } from '@/components/ui/quantity-input';
import { useDebounced } from '@/lib/use-debounced';
import { isFiltered, type PartFilter } from '../lib/part-filter';

type Change = Partial<PartFilter>;

interface Choice {
  value: string;
  count?: number;
}

interface ChoiceFieldProps {
  label: string;
  value: string | undefined;
  choices: readonly Choice[];
  onChange: (value: string | undefined) => void;
}

function ChoiceField({ label, value, choices, onChange }: ChoiceFieldProps) {
  const all = value && !choices.some((one) => one.value === value) ? [...choices, { value }] : choices;
  return (
    <Field label={label}>
      {(control) => (
        <Select
          {...control}
          value={value ?? ''}
          onChange={(event) => onChange(event.target.value || undefined)}
        >
          <option value="">any</option>
          {all.map((one) => (
            <option key={one.value} value={one.value}>
              {one.value}
              {one.count !== undefined && ` (${one.count})`}
            </option>
          ))}
        </Select>
      )}
    </Field>
  );
}

/** Free text that filters while one types, a moment after the last key. */
function TextFilter({ value, onChange }: { value: string; onChange: (q: string) => void }) {
  const [text, setText] = useState(value);
  const settled = useDebounced(text.trim());
  const [sent, setSent] = useState(value);
  if (value !== sent && value !== text.trim()) {
    setSent(value);
    setText(value);
  }
  useEffect(() => {
    if (settled === sent || settled !== text.trim()) return;
    setSent(settled);
    onChange(settled);
  }, [settled, sent, text, onChange]);
  return (
    <Field label="text">
      {(control) => (
        <Input
          {...control}
          type="search"
          placeholder="number, dielectric, case …"
          maxLength={80}
          value={text}
          onChange={(event) => setText(event.target.value)}
        />
      )}
    </Field>
  );
}

interface Props {
  filter: PartFilter;
  facets: PartFacets | undefined;
  onChange: (change: Change) => void;
  onClear: () => void;
}

export function PartsFilter({ filter, facets, onChange, onClear }: Props) {
  return (
    <search className="grid grid-cols-2 items-start gap-x-4 gap-y-3 sm:grid-cols-4 min-[87.5rem]:grid-cols-[minmax(12rem,2fr)_repeat(4,minmax(7rem,1fr))_repeat(3,6.5rem)_3rem]">
      <div className="col-span-2 sm:col-span-1">
        <TextFilter value={filter.q ?? ''} onChange={(q) => onChange({ q: q || undefined })} />
      </div>
      <ChoiceField
        label="technology"
        value={filter.technology}
        choices={facets?.technologies ?? []}
        onChange={(value) => onChange({ technology: technologySchema.safeParse(value).data })}
      />
      <ChoiceField
        label="dielectric"
        value={filter.dielectric}
        choices={facets?.dielectrics ?? []}
        onChange={(dielectric) => onChange({ dielectric })}
      />
      <ChoiceField
        label="case"
        value={filter.caseSize}
        choices={facets?.caseSizes ?? []}
        onChange={(caseSize) => onChange({ caseSize })}
      />
      <ChoiceField
        label="state"
        value={filter.state}
        choices={partStateSchema.options.map((value) => ({ value }))}
        onChange={(value) => onChange({ state: partStateSchema.safeParse(value).data })}
      />
      <Field label="rated at least">
        {(control) => (
          <QuantityInput
            {...control}
            showFault
            unit="V"
            value={filter.min_rated_V ?? null}
            onCommit={(value) => onChange({ min_rated_V: value ?? undefined })}
          />
        )}
      </Field>
      <Field label="C from">
        {(control) => (
          <QuantityInput
            {...control}
            showFault
            unit="F"
            value={filter.min_F ?? null}
            onCommit={(value) => onChange({ min_F: value ?? undefined })}
          />
        )}
      </Field>
      <Field label="C to">
        {(control) => (
          <QuantityInput
            {...control}
            showFault
            unit="F"
            value={filter.max_F ?? null}
            onCommit={(value) => onChange({ max_F: value ?? undefined })}
          />
        )}
      </Field>
      <div className={isFiltered(filter) ? 'min-[87.5rem]:mt-6' : 'hidden'}>
        <Button variant="plain" onClick={onClear}>
          Clear
        </Button>
      </div>
    </search>
  );
}
