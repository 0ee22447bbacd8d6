import { personRefSchema } from '@shared/schemas/common.schema';
import type { BankLine, RailWithParts, SearchSettings } from '@shared/schemas/rail.schema';
import { railWithPartsSchema } from '@shared/schemas/rail.schema';
import { ApiError, messageOf, NetworkError } from '@/lib/problem';

/** What of a rail the bench edits. */
export interface RailEdit {
  bank?: BankLine[];
  search?: SearchSettings;
}

export type SaveState =
  | { kind: 'saved'; at: number }
  | { kind: 'saving' }
  /** The server cannot be reached: the edit is kept here and sent again by itself. */
  | { kind: 'offline' }
  /** The session has ended: the edit waits until one has signed in again. */
  | { kind: 'signed-out' }
  | { kind: 'refused'; message: string }
  | {
      kind: 'conflict';
      current: RailWithParts;
      /** null: not known any more. */
      changedBy: { id: string; name: string } | null;
      changedAt: string;
    };

/** An edit as it waits; `at` tells an edit that was left behind from one that is just being sent. */
interface Stored {
  version: number;
  edit: RailEdit;
  at: number;
}

export interface SaverParts {
  send: (body: RailEdit & { version: number }) => Promise<RailWithParts>;
  version: number;
  savedAt: number;
  /** Where an edit waits that could not be sent yet, so that a closed page loses nothing. */
  store: { read: () => string | null; write: (text: string | null) => void };
  onState: (state: SaveState) => void;
  onSaved: (answer: RailWithParts) => void;
  delay?: (run: () => void, ms: number) => () => void;
}

const SETTLE_MS = 300;
const RETRY_MS = [1500, 3000, 6000, 12_000, 20_000];

const timer = (run: () => void, ms: number) => {
  const id = setTimeout(run, ms);
  return () => clearTimeout(id);
};

/** Saves the edits of one rail: gathers quick ones, keeps them while the server is away, never overwrites unseen. */
export class RailSaver {
  private version: number;
  private pending: RailEdit | null = null;
  private sending = false;
  private tries = 0;
  private cancelTimer: (() => void) | null = null;
  private state: SaveState;
  private disposed = false;
  private afterSending: (() => void) | null = null;
  private readonly parts: SaverParts;

  constructor(parts: SaverParts) {
    this.parts = parts;
    this.version = parts.version;
    this.state = { kind: 'saved', at: parts.savedAt };
  }

  /** An edit left over from a page that was closed before it could be sent; it is sent now. */
  restore(): RailEdit | null {
    const text = this.parts.store.read();
    if (text === null) return null;
    try {
      const stored = JSON.parse(text) as Stored;
      this.version = stored.version;
      this.edit(stored.edit);
      return stored.edit;
    } catch {
      this.parts.store.write(null);
      return null;
    }
  }

  edit(edit: RailEdit): void {
    this.pending = { ...this.pending, ...edit };
    this.keep();
    if (this.state.kind === 'conflict' || this.state.kind === 'signed-out') return;
    this.setState({ kind: 'saving' });
    this.schedule(SETTLE_MS);
  }

  /** Sends at once what waits: on leaving the page, after signing in again, when the network is back. */
  flush(): void {
    if (this.state.kind === 'conflict') return;
    if (this.pending) this.schedule(0);
  }

  /** Settles a conflict: mine is sent over the newer state, theirs is taken and the own edit dropped. */
  settle(choice: 'mine' | 'theirs'): void {
    if (this.state.kind !== 'conflict') return;
    const { current } = this.state;
    this.version = current.rail.version;
    if (choice === 'theirs') {
      this.pending = null;
      this.keep();
      this.setState({ kind: 'saved', at: Date.parse(current.rail.updatedAt) });
      this.parts.onSaved(current);
    } else {
      this.setState({ kind: 'saving' });
      this.schedule(0);
    }
  }

  /** A newer version that somebody else's save has brought in while nothing of ours waits. */
  adoptVersion(version: number): boolean {
    if (this.pending || this.sending || version <= this.version) return false;
    this.version = version;
    return true;
  }

  get waiting(): boolean {
    return this.pending !== null || this.sending;
  }

  /** Tries once more to send what waits, then lets go: `done` is called when nothing is under way any more. */
  dispose(done: () => void = () => {}): void {
    this.disposed = true;
    this.cancelTimer?.();
    if (this.sending) this.afterSending = done;
    else if (this.pending && this.state.kind !== 'conflict') void this.send().finally(done);
    else done();
  }

  private schedule(ms: number): void {
    if (this.disposed) return;
    this.cancelTimer?.();
    this.cancelTimer = (this.parts.delay ?? timer)(() => void this.send(), ms);
  }

  private async send(): Promise<void> {
    if (this.sending || !this.pending) return;
    const edit = this.pending;
    this.pending = null;
    this.sending = true;
    try {
      const answer = await this.parts.send({ ...edit, version: this.version });
      this.version = answer.rail.version;
      this.tries = 0;
      this.sending = false;
      this.keep();
      if (this.pending) {
        this.schedule(0);
        return;
      }
      this.setState({ kind: 'saved', at: Date.now() });
      this.parts.onSaved(answer);
    } catch (error) {
      this.sending = false;
      this.pending = { ...edit, ...(this.pending ?? {}) };
      this.keep();
      this.failed(error);
    } finally {
      if (!this.sending) {
        this.afterSending?.();
        this.afterSending = null;
      }
    }
  }

  private failed(error: unknown): void {
    if (error instanceof NetworkError || (error instanceof ApiError && error.status >= 500)) {
      this.setState({ kind: 'offline' });
      this.schedule(RETRY_MS[Math.min(this.tries++, RETRY_MS.length - 1)]);
    } else if (error instanceof ApiError && error.status === 401) {
      this.setState({ kind: 'signed-out' });
    } else if (error instanceof ApiError && error.status === 409) {
      const current = railWithPartsSchema.safeParse(error.problem.current);
      if (current.success)
        this.setState({
          kind: 'conflict',
          current: current.data,
          changedBy: personRefSchema
            .nullable()
            .catch(null)
            .parse(error.problem.changedBy ?? null),
          changedAt: String(error.problem.changedAt ?? current.data.rail.updatedAt),
        });
      else this.setState({ kind: 'refused', message: messageOf(error) });
    } else {
      this.setState({ kind: 'refused', message: messageOf(error) });
    }
  }

  /** Signed in again: what waited goes out. */
  resume(): void {
    if (this.state.kind === 'signed-out') this.setState({ kind: 'saving' });
    this.flush();
  }

  private keep(): void {
    const stored: Stored | null = this.pending
      ? { version: this.version, edit: this.pending, at: Date.now() }
      : null;
    this.parts.store.write(stored && JSON.stringify(stored));
  }

  private setState(state: SaveState): void {
    this.state = state;
    if (!this.disposed) this.parts.onState(state);
  }
}
