import type { ReactNode } from 'react';
import { ButtonLink } from '@/components/ui/button';
import { EmptyState, Page } from '@/components/ui/page';
import { paths } from '@/config/paths';

interface Props {
  title: string;
  boardId: string;
  /** The rail that was to be changed; without one the way back is the board. */
  railId?: string;
  /** What there is to look at. */
  children?: ReactNode;
}

/** For whoever may see a board but not edit it: said before anything is typed, with the way back. */
export function ReadOnly({ title, boardId, railId, children }: Props) {
  return (
    <Page title={title}>
      {children}
      <EmptyState
        title="Read only for you"
        action={
          <ButtonLink to={railId ? paths.bench(boardId, railId) : paths.board(boardId)} variant="primary">
            {railId ? 'Back to the bench' : 'Back to the board'}
          </ButtonLink>
        }
      >
        Only engineers of this board add rails and change them. You may look at everything; its owner can make
        you an engineer.
      </EmptyState>
    </Page>
  );
}
