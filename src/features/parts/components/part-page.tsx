import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { Failure } from '@/components/ui/failure';
import { Loading, Page, Section } from '@/components/ui/page';
import { paths } from '@/config/paths';
import { usePageTitle } from '@/lib/use-page-title';
import { usePart } from '../api/part';
import { BehaviourFacts } from './behaviour-facts';
import { EditPart } from './edit-part';
import { InService } from './in-service';
import { PartCautions } from './part-cautions';
import { PartFacts } from './part-facts';
import { StateActions } from './state-actions';

interface Props {
  partId: string;
  mayAdd: boolean;
  isLibrarian: boolean;
}

export function PartPage({ partId, mayAdd, isLibrarian }: Props) {
  const query = usePart(partId);
  const [isEditing, setEditing] = useState(false);
  usePageTitle(query.data?.partNumber ?? 'Part');
  if (query.isPending) return <Loading what="the part" />;
  if (query.isError)
    return (
      <Failure
        error={query.error}
        what="the part"
        retry={() => query.refetch()}
        back={{ to: paths.parts(), text: 'All parts' }}
      />
    );
  const part = query.data;
  const mayEdit = isLibrarian || (mayAdd && part.state === 'draft');
  if (isEditing)
    return (
      <Page
        title={`Edit ${part.partNumber}`}
        lead="Rails that use this part are computed anew when it is saved."
      >
        <EditPart part={part} onDone={() => setEditing(false)} />
      </Page>
    );
  return (
    <Page
      title={part.partNumber}
      lead={part.description}
      actions={mayEdit && <Button onClick={() => setEditing(true)}>Edit</Button>}
    >
      <div className="grid gap-x-10 gap-y-8 xl:grid-cols-[20rem_minmax(0,1fr)] 2xl:grid-cols-[23rem_minmax(0,1fr)]">
        <div className="flex flex-col gap-5">
          <PartFacts part={part} />
          <Section title="behaviour">
            <BehaviourFacts part={part} />
          </Section>
          {isLibrarian && <StateActions part={part} />}
          {!mayEdit && part.state !== 'draft' && (
            <p className="text-stone">
              {part.state === 'approved' ? 'An approved' : 'A retired'} part is changed by a librarian only.
            </p>
          )}
        </div>
        <div className="flex min-w-0 flex-col gap-6">
          <InService key={part.version} part={part} />
          <PartCautions part={part} />
        </div>
      </div>
    </Page>
  );
}
