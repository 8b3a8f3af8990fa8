import { createContext, use, useCallback, useMemo, useRef, useState, type ReactNode } from 'react';
import { Toast, type ToastContent } from './Toast';
import './Toast.css';

type ShowToast = (content: ToastContent) => void;

const ToastContext = createContext<ShowToast>(() => undefined);

/** Shows a short message, with undo where there is something to take back. */
export const useToast = (): ShowToast => use(ToastContext);

/** At most three messages at the foot of the window; each leaves by itself and is read aloud once. */
export function ToastProvider({ children }: { readonly children: ReactNode }) {
  const [toasts, setToasts] = useState<readonly (ToastContent & { readonly key: number })[]>([]);
  const next = useRef(0);
  const show = useCallback<ShowToast>((content) => {
    const key = next.current++;
    setToasts((before) => [...before.slice(-2), { ...content, key }]);
  }, []);
  const remove = useCallback(
    (key: number) => setToasts((before) => before.filter((toast) => toast.key !== key)),
    [],
  );
  const list = useMemo(
    () => toasts.map(({ key, ...content }) => <Toast key={key} {...content} onLeave={() => remove(key)} />),
    [toasts, remove],
  );
  return (
    <ToastContext value={show}>
      {children}
      <div className="toasts" role="status" aria-label="Messages">
        {list}
      </div>
    </ToastContext>
  );
}
