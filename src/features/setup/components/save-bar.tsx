import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';

interface Props {
  isDirty: boolean;
  isSaving: boolean;
  isSaved: boolean;
  faults: number;
  onDiscard: () => void;
}

/** The one save of the page, always in sight. */
export function SaveBar({ isDirty, isSaving, isSaved, faults, onDiscard }: Props) {
  const [asking, setAsking] = useState(false);
  return (
    <div className="sticky bottom-0 z-20 -mx-6 flex flex-wrap items-center gap-x-5 gap-y-2 border-t bg-paper px-6 py-3">
      <Button type="submit" variant="primary" disabled={isSaving || !isDirty}>
        {isSaving ? 'Saving …' : 'Save'}
      </Button>
      {isDirty && (
        <Button variant="plain" disabled={isSaving} onClick={() => setAsking(true)}>
          Discard the changes
        </Button>
      )}
      <p role="status" className="min-w-0">
        {faults > 0 ? (
          <span className="text-kingfisher">
            ▲ {faults} {faults === 1 ? 'place needs' : 'places need'} another look
          </span>
        ) : isDirty ? (
          <span className="text-stone">Not saved yet. Saving computes every rail of the board anew.</span>
        ) : isSaved ? (
          <span className="text-reed">▽ Saved; the rails have been computed anew.</span>
        ) : (
          <span className="text-stone">Nothing changed.</span>
        )}
      </p>
      <Dialog title="Discard the changes?" open={asking} onClose={() => setAsking(false)}>
        <p>What was changed on this page since the last save goes.</p>
        <div className="flex gap-3">
          <Button
            variant="danger"
            onClick={() => {
              setAsking(false);
              onDiscard();
            }}
          >
            Discard them
          </Button>
          <Button onClick={() => setAsking(false)}>Keep them</Button>
        </div>
      </Dialog>
    </div>
  );
}
