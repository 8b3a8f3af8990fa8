import { useEffect, useState } from 'react';

export interface ToastContent {
  /** What happened, `Deleted [Cr(en)3]3+`. */
  readonly message: string;
  readonly undo?: () => void;
  readonly tone?: 'plain' | 'danger';
}

/** Time on screen, ms. Longer with an action, and stopped while pointed at or focused. */
const stay = { plain: 5_000, withUndo: 12_000 };

interface ToastProps extends ToastContent {
  readonly onLeave: () => void;
}

export function Toast({ message, undo, tone = 'plain', onLeave }: ToastProps) {
  const [held, setHeld] = useState(false);
  useEffect(() => {
    if (held) return;
    const timer = setTimeout(onLeave, undo ? stay.withUndo : stay.plain);
    return () => clearTimeout(timer);
  }, [held, undo, onLeave]);
  return (
    <div
      className="toast"
      data-tone={tone}
      onPointerEnter={() => setHeld(true)}
      onPointerLeave={() => setHeld(false)}
      onFocus={() => setHeld(true)}
      onBlur={() => setHeld(false)}
    >
      <span>{message}</span>
      {undo && (
        <button
          type="button"
          onClick={() => {
            undo();
            onLeave();
          }}
        >
          Undo
        </button>
      )}
      <button type="button" className="toast-close" aria-label="Dismiss message" onClick={onLeave}>
        ✕
      </button>
    </div>
  );
}
