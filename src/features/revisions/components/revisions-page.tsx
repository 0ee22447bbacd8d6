import type { BoardDetail } from '@shared/schemas/board.schema';
import type { RailList } from '@shared/schemas/rail.schema';
import { Failure } from '@/components/ui/failure';
import { EmptyState, Loading, Page, Section } from '@/components/ui/page';
import { usePageTitle } from '@/lib/use-page-title';
import { useRevision } from '../api/revision';
import { useRevisions } from '../api/revisions';
import { CutRevisionForm } from './cut-revision-form';
import { draftOf } from './draft';
import { RevisionsTable } from './revisions-table';

interface Props {
  board: BoardDetail;
  rails: RailList;
  onCut: (letter: string) => void;
}

/** The form that cuts, once it is known what the latest revision holds. */
function DraftForm({ board, rails, letter, onCut }: Props & { letter: string | undefined }) {
  const latest = useRevision(board.id, letter);
  if (latest.isError)
    return <Failure error={latest.error} what={`revision ${letter}`} retry={() => latest.refetch()} />;
  if (letter !== undefined && !latest.data) return <Loading what={`revision ${letter}`} />;
  const draft = draftOf(rails, board.setup, latest.data ?? null);
  return <CutRevisionForm boardId={board.id} draft={draft} onCut={onCut} />;
}

export function RevisionsPage({ board, rails, onCut }: Props) {
  usePageTitle('Revisions', board.name);
  const revisions = useRevisions(board.id);
  if (revisions.isPending) return <Loading what="the revisions" />;
  if (revisions.isError)
    return <Failure error={revisions.error} what="the revisions" retry={() => revisions.refetch()} />;
  const { items } = revisions.data;
  const latest = items[0]?.letter;
  return (
    <Page
      title="Revisions"
      lead="Fixed states of the board: what was planned, with which parts, and what came of it."
    >
      {board.rights.edit && (
        <Section title={`the draft${latest ? ` after ${latest}` : ''}`}>
          <DraftForm board={board} rails={rails} letter={latest} onCut={onCut} />
        </Section>
      )}
      {items.length === 0 ? (
        <EmptyState title="No revision yet">
          {board.rights.edit
            ? 'Cut the first one above as soon as someone else is to rely on the plan: layout, a reviewer, purchasing.'
            : 'The engineers of this board have not cut one. What is drafted changes until they do.'}
        </EmptyState>
      ) : (
        <Section title="cut so far" className={board.rights.edit ? 'border-t pt-5' : undefined}>
          <RevisionsTable boardId={board.id} revisions={items} />
        </Section>
      )}
    </Page>
  );
}
