import type { End } from '@shared/engine/service/parasitics';
import { WordChoice } from '@/components/ui/word-choice';

const ENDS: readonly (readonly [End, string])[] = [
  ['low', 'low'],
  ['nominal', 'nominal'],
  ['high', 'high'],
];

interface Props {
  label: string;
  value: End;
  onChoose: (end: End) => void;
}

/** Which end of a tolerance. */
export function EndsChoice({ label, value, onChoose }: Props) {
  return (
    <WordChoice
      legend={label}
      titled
      options={ENDS}
      value={value}
      onChoice={onChoose}
      className="items-center py-1.5"
    />
  );
}
