import { useEffect, useRef } from 'react';

interface BenchKeys {
  undo: () => void;
  redo: () => void;
  search: () => void;
  add: () => void;
  lines: () => void;
  envelope: () => void;
  values: () => void;
}

/** Keys of the bench, while nothing is being typed and no dialog is open. */
export function useBenchKeys(keys: BenchKeys): void {
  const current = useRef(keys);
  useEffect(() => {
    current.current = keys;
  });
  useEffect(() => {
    const onKey = (event: KeyboardEvent) => {
      const target = event.target as HTMLElement;
      if (target.closest('input, textarea, select, dialog')) return;
      const key = event.key.toLowerCase();
      const withControl = event.ctrlKey || event.metaKey;
      if (withControl && key === 'z') {
        event.preventDefault();
        if (event.shiftKey) current.current.redo();
        else current.current.undo();
        return;
      }
      if (withControl || event.altKey) return;
      if ((key === 'arrowdown' || key === 'arrowup') && target === document.body) {
        const rows = document.querySelectorAll<HTMLElement>('[data-row]');
        const row = rows[key === 'arrowdown' ? 0 : rows.length - 1];
        if (!row) return;
        event.preventDefault();
        row.focus();
        return;
      }
      const act: Record<string, () => void> = {
        u: () => (event.shiftKey ? current.current.redo() : current.current.undo()),
        f: () => current.current.search(),
        a: () => current.current.add(),
        l: () => current.current.lines(),
        e: () => current.current.envelope(),
        v: () => current.current.values(),
      };
      if (!act[key]) return;
      event.preventDefault();
      act[key]();
    };
    document.addEventListener('keydown', onKey);
    return () => document.removeEventListener('keydown', onKey);
  }, []);
}
