import type { Draft } from './draft';

function changes({ latest, edited, byParts, total }: Draft): string {
  if (latest === null) return `This is the first revision; all ${total} rails go into it.`;
  if (edited.length === 0 && byParts === 0) return `Nothing changed since ${latest}.`;
  const byEdit = edited.length > 0 ? `Edited since ${latest}: ${edited.join(', ')}.` : '';
  const rails = byParts === 1 ? 'One rail' : `${byParts} rails`;
  const byPart = byParts > 0 ? `${rails} changed with the parts that they use.` : '';
  return [byEdit, byPart].filter(Boolean).join(' ');
}

/** What would go into the next revision, and which rails would be frozen short. */
export function DraftSummary({ draft }: { draft: Draft }) {
  return (
    <div className="flex flex-col gap-2">
      <p>{changes(draft)}</p>
      {draft.short.length > 0 ? (
        <p className="text-kingfisher">▲ short as they stand: {draft.short.join(', ')}</p>
      ) : (
        <p className="text-reed">▽ no rail is short</p>
      )}
      <p className="text-stone">
        A revision keeps the rails, banks and parts’ data as they stand, with results computed by the server.
        It cannot be changed afterwards.
      </p>
    </div>
  );
}
