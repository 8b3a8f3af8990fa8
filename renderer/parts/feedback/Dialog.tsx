import { useEffect, useId, useRef, type ReactNode } from 'react';
import './Dialog.css';

interface DialogProps {
  readonly open: boolean;
  readonly title: string;
  /** Called on Escape, on the close button and on a click beside the dialog. */
  readonly onClose: () => void;
  readonly children: ReactNode;
  /** Buttons at the foot, the main one last. */
  readonly actions?: ReactNode;
  readonly wide?: boolean;
}

/** A modal dialog of the platform: focus stays inside and returns to where it was. */
export function Dialog({ open, title, onClose, children, actions, wide = false }: DialogProps) {
  const dialog = useRef<HTMLDialogElement>(null);
  const titleId = useId();
  useEffect(() => {
    const element = dialog.current;
    if (!element) return;
    if (open && !element.open) element.showModal();
    if (!open && element.open) element.close();
  }, [open]);
  return (
    <dialog
      ref={dialog}
      className="dialog"
      data-wide={wide || undefined}
      aria-labelledby={titleId}
      onCancel={(event) => {
        if (event.target !== dialog.current) return;
        event.preventDefault();
        onClose();
      }}
      onClose={(event) => {
        // The platform can close a dialog on its own (a form with method="dialog").
        if (event.target === dialog.current && open) onClose();
      }}
      onPointerDown={(event) => {
        if (event.target === dialog.current) onClose();
      }}
    >
      {open && (
        <div className="dialog-sheet">
          <header className="dialog-head">
            <h2 id={titleId}>{title}</h2>
            <button type="button" className="dialog-close" aria-label="Close" onClick={onClose}>
              ✕
            </button>
          </header>
          <div className="dialog-body">{children}</div>
          {actions !== undefined && <footer className="dialog-actions">{actions}</footer>}
        </div>
      )}
    </dialog>
  );
}
