import type { BoardDetail } from '@shared/schemas/board.schema';
import { Page } from '@/components/ui/page';
import { usePageTitle } from '@/lib/use-page-title';
import type { SetupUsage } from '../lib/setup-usage';
import { SetupForm } from './setup-form';

interface Props {
  board: BoardDetail;
  usage: SetupUsage;
  onSaved: (board: BoardDetail) => void;
}

/** How the board is built and how parts are mounted on it. */
export function SetupPage({ board, usage, onSaved }: Props) {
  usePageTitle('Stack-up', board.name);
  return (
    <Page
      title="Stack-up and mount recipes"
      lead={
        <>
          <p>
            How the board is built and how parts are mounted on it: rails take their plane pairs from here,
            bank lines their mounting inductance.
          </p>
          {!board.rights.edit && <p>Read only for you: only engineers of this board change it.</p>}
        </>
      }
    >
      <SetupForm board={board} usage={usage} onSaved={onSaved} />
    </Page>
  );
}
