import type { RevisionDetail } from '@shared/schemas/revision.schema';
import { formatQuantity } from '@shared/units/format';
import { ButtonLink } from '@/components/ui/button';
import { Facts } from '@/components/ui/facts';
import { Failure } from '@/components/ui/failure';
import { Loading, Page } from '@/components/ui/page';
import { RailTally } from '@/components/ui/rail-tally';
import { paths } from '@/config/paths';
import { formatCost } from '@/lib/format-cost';
import { dayAndTime } from '@/lib/time';
import { usePageTitle } from '@/lib/use-page-title';
import { useRevision } from '../api/revision';
import { RailResultsTable } from './rail-results-table';
import { RailSection } from './rail-section';

function Header({ revision }: { revision: RevisionDetail }) {
  return (
    <Facts
      className="max-w-4xl"
      rows={[
        ['cut by', `${revision.createdBy.name}, ${dayAndTime(revision.createdAt)}`],
        [
          'rails',
          <RailTally
            key="rails"
            rails={revision.rails}
            inService={!revision.engineVersion.startsWith('1.')}
          />,
        ],
        ['parts', String(revision.parts)],
        ['cost', revision.cost === null ? '— (a part has no price)' : formatCost(revision.cost)],
        [
          'area',
          revision.area_mm2 === null ? '— (a part has no area)' : formatQuantity(revision.area_mm2, 'mm²'),
        ],
        ['engine', revision.engineVersion],
        [
          'hash',
          <span key="hash" className="break-all">
            {revision.hash}
          </span>,
        ],
      ]}
    />
  );
}

/** A revision as it was cut: read, never changed. */
export function RevisionPage({ boardId, letter }: { boardId: string; letter: string }) {
  const query = useRevision(boardId, letter);
  usePageTitle(`Revision ${letter}`, query.data?.boardName);
  if (query.isPending) return <Loading what={`revision ${letter}`} />;
  if (query.isError)
    return (
      <Failure
        error={query.error}
        what={`revision ${letter}`}
        retry={() => query.refetch()}
        back={{ to: paths.revisions(boardId), text: 'To the revisions' }}
      />
    );
  const revision = query.data;
  return (
    <Page
      title={`${revision.boardName}, revision ${letter}`}
      lead={<p className="whitespace-pre-wrap text-ink wrap-anywhere">{revision.note}</p>}
      actions={<ButtonLink to={paths.placement(boardId, letter)}>Placement list</ButtonLink>}
    >
      <p className="border-l-2 border-shallow pl-3 text-stone">
        Read only: this is what stood on the board when it was cut, with the parts’ data of that day. Results
        are engineering estimates from models; measure the rail before release.
      </p>
      <Header revision={revision} />
      <RailResultsTable rails={revision.railResults} />
      {revision.railResults.map((rail) => (
        <RailSection key={rail.railId} rail={rail} />
      ))}
    </Page>
  );
}
