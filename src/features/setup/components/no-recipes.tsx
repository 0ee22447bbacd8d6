import { Button } from '@/components/ui/button';
import { EmptyState } from '@/components/ui/page';

/** What a recipe is, and how to get one. */
export function NoRecipes({ canEdit, onAdd }: { canEdit: boolean; onAdd: () => void }) {
  return (
    <EmptyState
      title="No mount recipes yet"
      action={
        canEdit && (
          <Button variant="primary" onClick={onAdd}>
            Add a recipe
          </Button>
        )
      }
    >
      A recipe is a way to mount a part: how long its traces are, where its vias stand and how many there are.
      With the stack-up it gives the mounting inductance of every bank line that uses it.
    </EmptyState>
  );
}
