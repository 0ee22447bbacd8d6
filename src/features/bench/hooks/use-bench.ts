import type { Part } from '@shared/schemas/part.schema';
import type { RailWithParts, SearchSettings } from '@shared/schemas/rail.schema';
import { useCallback, useEffect, useMemo, useReducer, useRef, useState } from 'react';
import { saveRail } from '../api/save-rail';
import { type BankEdit, type DraftLine, editBank, keyed, savedBank, startHistory } from '../lib/bank-history';
import { editStore } from '../lib/edit-store';
import { RailSaver, type SaveState } from '../lib/rail-saver';

export interface Bench {
  lines: DraftLine[];
  parts: ReadonlyMap<string, Part>;
  search: SearchSettings;
  canUndo: boolean;
  canRedo: boolean;
  save: SaveState;
  edit: (edit: BankEdit) => void;
  /** Makes parts known that the bank did not use before (picked by hand, found by the search). */
  learn: (parts: readonly Part[]) => void;
  setSearch: (search: SearchSettings) => void;
  settle: (choice: 'mine' | 'theirs') => void;
}

interface BenchOptions {
  server: RailWithParts;
  personId: string;
  onSaved: (answer: RailWithParts) => void;
}

/** The bench's own state: bank with undo and redo, edits that save themselves, parts by id. */
export function useBench({ server, personId, onSaved }: BenchOptions): Bench {
  const { rail } = server;
  const [history, dispatch] = useReducer(editBank, rail.bank, (bank) => startHistory(keyed(bank)));
  const [search, setSearchState] = useState(rail.search);
  const [extra, setExtra] = useState<readonly Part[]>([]);
  const [save, setSave] = useState<SaveState>({ kind: 'saved', at: Date.parse(rail.updatedAt) });
  const parts = useMemo(
    () => new Map([...server.parts, ...extra].map((part) => [part.id, part])),
    [server.parts, extra],
  );
  const saved = useRef(onSaved);
  saved.current = onSaved;
  const saver = useRef<RailSaver | null>(null);
  const bankSent = useRef(history.lines);

  const takeServer = useCallback((answer: RailWithParts) => {
    const lines = keyed(answer.rail.bank);
    bankSent.current = lines;
    dispatch({ type: 'reset', lines });
    setSearchState(answer.rail.search);
    setExtra((known) => [...known, ...answer.parts]);
  }, []);

  // One saver as long as the bench stands (it is mounted anew for each rail); later versions reach it by its own saves
  // or `adoptVersion`, since a new saver would lose what waits.
  const first = useRef({ rail, personId });
  useEffect(() => {
    const { id, boardId, version, updatedAt } = first.current.rail;
    const store = editStore({ personId: first.current.personId, boardId, railId: id });
    const one = new RailSaver({
      send: (body) => saveRail(boardId, id, body),
      version,
      savedAt: Date.parse(updatedAt),
      store,
      onState: setSave,
      onSaved: (answer) => saved.current(answer),
    });
    saver.current = one;
    const left = one.restore();
    if (left?.bank) {
      const lines = keyed(left.bank);
      bankSent.current = lines;
      dispatch({ type: 'reset', lines });
    }
    if (left?.search) setSearchState(left.search);
    const flush = () => one.flush();
    const resume = () => one.resume();
    const leaving = (event: BeforeUnloadEvent) => {
      one.flush();
      if (one.waiting) event.preventDefault();
    };
    window.addEventListener('online', flush);
    window.addEventListener('millpond:signed-in', resume);
    window.addEventListener('beforeunload', leaving);
    return () => {
      window.removeEventListener('online', flush);
      window.removeEventListener('millpond:signed-in', resume);
      window.removeEventListener('beforeunload', leaving);
      // What is left after the last try goes out by itself from wherever one is.
      one.dispose(store.close);
    };
  }, []);

  // Somebody else's save, seen while nothing of ours waits, is simply shown.
  useEffect(() => {
    if (saver.current?.adoptVersion(rail.version)) takeServer(server);
  }, [rail.version, server, takeServer]);

  useEffect(() => {
    if (history.lines === bankSent.current) return;
    bankSent.current = history.lines;
    saver.current?.edit({ bank: savedBank(history.lines) });
  }, [history.lines]);

  const setSearch = useCallback((next: SearchSettings) => {
    setSearchState(next);
    saver.current?.edit({ search: next });
  }, []);
  const learn = useCallback((more: readonly Part[]) => setExtra((known) => [...known, ...more]), []);
  const settle = useCallback(
    (choice: 'mine' | 'theirs') => {
      if (choice === 'theirs' && save.kind === 'conflict') takeServer(save.current);
      saver.current?.settle(choice);
    },
    [save, takeServer],
  );
  return {
    lines: history.lines,
    parts,
    search,
    canUndo: history.past.length > 0,
    canRedo: history.future.length > 0,
    save,
    edit: dispatch,
    learn,
    setSearch,
    settle,
  };
}
