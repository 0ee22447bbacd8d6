import { createContext, type ReactNode, useContext, useState } from 'react';
import { createPortal } from 'react-dom';

const SlotContext = createContext<{ node: HTMLElement | null; setNode: (node: HTMLElement | null) => void }>({
  node: null,
  setNode: () => {},
});

/** A place in the header that the page may fill, e.g. “draft after B · saved 12:41”. */
export function StatusSlotProvider({ children }: { children: ReactNode }) {
  const [node, setNode] = useState<HTMLElement | null>(null);
  return <SlotContext value={{ node, setNode }}>{children}</SlotContext>;
}

export function StatusSlot() {
  const { setNode } = useContext(SlotContext);
  return <span ref={setNode} aria-live="polite" className="hidden md:inline" />;
}

/** Shows its children in the header's status place. */
export function HeaderStatus({ children }: { children: ReactNode }) {
  const { node } = useContext(SlotContext);
  return node ? createPortal(children, node) : null;
}
