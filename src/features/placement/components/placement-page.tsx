import type { Revision, RevisionDetail } from '@shared/schemas/revision.schema';
import { Field } from '@/components/ui/field';
import { Select } from '@/components/ui/input';
import { EmptyState, Page } from '@/components/ui/page';
import { dayOf } from '@/lib/time';
import { usePageTitle } from '@/lib/use-page-title';
import { layoutCautions, railGroups } from './instance-groups';
import { LayoutNotes } from './layout-notes';
import { PlacementTable } from './placement-table';

interface Props {
  boardName: string;
  revisions: readonly Revision[];
  detail: RevisionDetail;
  csvHref: string;
  onChoose: (letter: string) => void;
}

const DOWNLOAD =
  'inline-flex items-center border border-deep bg-deep px-3 py-1.5 font-semibold whitespace-nowrap text-paper hover:opacity-90';

/** What layout works from: one row a capacitor of a chosen revision. */
export function PlacementPage({ boardName, revisions, detail, csvHref, onChoose }: Props) {
  usePageTitle(`Placement ${detail.letter}`, boardName);
  const groups = railGroups(detail.railResults);
  const total = groups.reduce((sum, group) => sum + group.instances.length, 0);
  return (
    <Page
      title="Placement"
      lead="Where each capacitor goes, and the farthest distance from its load: how far out all capacitors of its bank line may sit together before the rail is short, every other line where it is planned."
      actions={
        <a href={csvHref} download className={DOWNLOAD}>
          Download revision {detail.letter} as CSV
        </a>
      }
    >
      <div className="flex flex-wrap items-end gap-x-8 gap-y-3">
        <div className="w-72 max-w-full">
          <Field label="revision">
            {(control) => (
              <Select {...control} value={detail.letter} onChange={(event) => onChoose(event.target.value)}>
                {revisions.map((one) => (
                  <option key={one.id} value={one.letter}>
                    {one.letter}, {dayOf(one.createdAt)}
                  </option>
                ))}
              </Select>
            )}
          </Field>
        </div>
        <p className="py-1.5 text-stone">
          {total} {total === 1 ? 'capacitor' : 'capacitors'} on {groups.length}{' '}
          {groups.length === 1 ? 'rail' : 'rails'}
          {detail.letter !== revisions[0]?.letter && (
            <span className="text-brass"> · ! not the latest revision, which is {revisions[0]?.letter}</span>
          )}
        </p>
      </div>
      <LayoutNotes cautions={layoutCautions(detail.railResults)} />
      {total === 0 ? (
        <EmptyState title="Nothing to place">The banks of this revision are empty.</EmptyState>
      ) : (
        <PlacementTable groups={groups} />
      )}
    </Page>
  );
}
