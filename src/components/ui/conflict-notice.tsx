import { dayAndTime } from '@/lib/time';
import { Button } from './button';
import { Notice } from './notice';

interface Props {
  /** What was edited, e.g. “this part”. */
  what: string;
  changedBy: string | null;
  changedAt: string | null;
  /** Which fields differ between what was typed and the newer state. */
  differing?: readonly string[];
  onLoadNewer: () => void;
  onSaveOver: () => void;
}

/** Someone saved in between: who and when, and the two ways on. What was typed stays until one chooses. */
export function ConflictNotice({ what, changedBy, changedAt, differing, onLoadNewer, onSaveOver }: Props) {
  return (
    <Notice
      tone="error"
      title="▲ not saved: changed meanwhile"
      action={
        <div className="flex flex-wrap gap-3">
          <Button onClick={onLoadNewer}>Load the newer state</Button>
          <Button variant="danger" onClick={onSaveOver}>
            Save mine over it
          </Button>
        </div>
      }
    >
      {changedBy ?? 'Someone'} saved {what}
      {changedAt ? ` on ${dayAndTime(changedAt)}` : ''} while you were editing. What you typed is still here.
      {differing && differing.length > 0 && <> Yours differs in {differing.join(', ')}.</>}
    </Notice>
  );
}
