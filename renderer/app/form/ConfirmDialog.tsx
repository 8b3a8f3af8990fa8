import type { ReactNode } from 'react';
import { Dialog } from '../../parts';

interface ConfirmDialogProps {
  readonly open: boolean;
  readonly title: string;
  /** The verb on the button: `Empty the bin`. */
  readonly verb: string;
  readonly onConfirm: () => void;
  readonly onClose: () => void;
  readonly children: ReactNode;
}

/** Asked only before what cannot be undone. */
export function ConfirmDialog({ open, title, verb, onConfirm, onClose, children }: ConfirmDialogProps) {
  return (
    <Dialog
      open={open}
      title={title}
      onClose={onClose}
      actions={
        <>
          <button type="button" onClick={onClose}>
            Cancel
          </button>
          <button
            type="button"
            className="button-danger"
            onClick={() => {
              onClose();
              onConfirm();
            }}
          >
            {verb}
          </button>
        </>
      }
    >
      {children}
    </Dialog>
  );
}
