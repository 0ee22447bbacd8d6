import type { Draft } from './draft';

function changes({ latest, added, edited, deleted, byParts, total }: Draft): string {
  if (latest === null)
    return `This is the first revision; ${total === 1 ? 'its one rail goes' : `all ${total} rails go`} into it.`;
  const kinds: [string, string[]][] = [
    [`Edited since ${latest}`, edited],
    ['New', added],
    ['Deleted', deleted],
    ['Changed with the parts that they use', byParts],
  ];
  const said = kinds.filter(([, names]) => names.length > 0);
  if (said.length === 0) return `Nothing changed since ${latest}.`;
  return said.map(([what, names]) => `${what}: ${names.join(', ')}.`).join(' ');
}

function Shorts({ what, names }: { what: string; names: readonly string[] }) {
  if (names.length === 0) return null;
  return (
    <p className="text-kingfisher wrap-anywhere">
      ▲ {names.length} short {what}: {names.join(', ')}
    </p>
  );
}

/** What would go into the next revision, and which rails would be frozen short. */
export function DraftSummary({ draft }: { draft: Draft }) {
  const held = draft.total - draft.short.length - draft.unknown.length;
  return (
    <div className="flex flex-col gap-2">
      <p className="wrap-anywhere">{changes(draft)}</p>
      {draft.short.length > 0 && (
        <p className="text-kingfisher wrap-anywhere">▲ short in service: {draft.short.join(', ')}</p>
      )}
      {held > 0 && (
        <p className="text-reed">
          ▽ {held} {held === 1 ? 'holds' : 'hold'} in service
        </p>
      )}
      <Shorts what="in their worst case" names={draft.worst} />
      <Shorts what="with one part open" names={draft.missing} />
      {draft.unknown.length > 0 && (
        <p className="text-brass wrap-anywhere">! without a result: {draft.unknown.join(', ')}</p>
      )}
      <p className="text-stone">
        A revision keeps the rails, banks and parts’ data as they stand, with results computed by the server.
        It cannot be changed afterwards.
      </p>
    </div>
  );
}
