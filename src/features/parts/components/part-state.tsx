import type { PartState } from '@shared/schemas/part.schema';

const SIGNS: Readonly<Record<PartState, readonly [string, string]>> = {
  draft: ['! draft', 'text-brass'],
  approved: ['▽ approved', 'text-reed'],
  retired: ['▲ retired', 'text-kingfisher'],
};

/** Whether the company may buy it: a sign and a word. */
export function PartStateText({ state }: { state: PartState }) {
  const [text, tone] = SIGNS[state];
  return <span className={`whitespace-nowrap ${tone}`}>{text}</span>;
}
