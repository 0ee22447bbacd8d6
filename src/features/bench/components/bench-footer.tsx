import { Button } from '@/components/ui/button';

interface BenchFooterProps {
  canEdit: boolean;
  canUndo: boolean;
  canRedo: boolean;
  onAdd: () => void;
  onUndo: () => void;
  onRedo: () => void;
}

/** What can be done to the bank as a whole, and the keys that do it. */
export function BenchFooter({ canEdit, canUndo, canRedo, onAdd, onUndo, onRedo }: BenchFooterProps) {
  return (
    <div className="flex flex-wrap items-center justify-between gap-4 py-3">
      {canEdit ? (
        <div className="flex gap-5">
          <Button variant="plain" onClick={onAdd}>
            + add a part
          </Button>
          <Button variant="plain" disabled={!canUndo} onClick={onUndo}>
            undo
          </Button>
          <Button variant="plain" disabled={!canRedo} onClick={onRedo}>
            redo
          </Button>
        </div>
      ) : (
        <p className="text-stone">You see this rail; engineers of the board change it.</p>
      )}
      <p className="text-small text-stone max-lg:hidden">
        {canEdit
          ? '↑↓ line · ←→ count · A add · U undo · F search · L lines · E envelope · V values'
          : '↑↓ line · Enter opens it · L lines · E envelope · V values'}
      </p>
    </div>
  );
}
