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
    if (!dialog || !open) return;
    if (!dialog.open) dialog.showModal();
    // What one came to fill in, rather than the button that stands first; else the dialog itself, so that no answer is pre-chosen.
    const field = dialog.querySelector<HTMLElement>('input:not([type="hidden"]), select, textarea');
    (field ?? dialog).focus();
    // Closing gives the focus back to where it was, also when the dialog is taken away as a whole.
    return () => dialog.close();
  }, [open]);
  return (
    <dialog
      ref={ref}
      tabIndex={-1}
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
