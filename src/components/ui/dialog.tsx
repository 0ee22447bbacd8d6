import { type ReactNode, useEffect, useId, useRef } from 'react';

interface DialogProps {
  title: string;
  open: boolean;
  onClose: () => void;
  /** A dialog that must be answered: Escape does not close it. */
  firm?: boolean;
  wide?: boolean;
  children: ReactNode;
}

/** The browser's own modal dialog: focus stays inside, Escape closes, what is behind is inert. */
export function Dialog({ title, open, onClose, firm = false, wide = false, children }: DialogProps) {
  const ref = useRef<HTMLDialogElement>(null);
  const heading = useId();
  useEffect(() => {
    const dialog = ref.current;
    if (!dialog) return;
    if (open && !dialog.open) {
      dialog.showModal();
      // What one came to fill in, rather than the close button that stands first.
      dialog.querySelector<HTMLElement>('input:not([type="hidden"]), select, textarea')?.focus();
    }
    if (!open && dialog.open) dialog.close();
  }, [open]);
  return (
    <dialog
      ref={ref}
      aria-labelledby={heading}
      onCancel={(event) => {
        event.preventDefault();
        if (!firm) onClose();
      }}
      className={`m-auto max-h-[90vh] ${wide ? 'w-[min(64rem,94vw)]' : 'w-[min(32rem,94vw)]'} border border-stone bg-paper p-6 text-ink`}
    >
      {open && (
        <div className="flex flex-col gap-4">
          <div className="flex items-start justify-between gap-4">
            <h2 id={heading} className="text-large font-semibold">
              {title}
            </h2>
            {!firm && (
              <button
                type="button"
                onClick={onClose}
                className="text-deep underline-offset-4 hover:underline"
              >
                close
              </button>
            )}
          </div>
          {children}
        </div>
      )}
    </dialog>
  );
}
