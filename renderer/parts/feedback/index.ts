export { Dialog } from './Dialog';
export { EmptyState } from './EmptyState';
export { ErrorPanel } from './ErrorPanel';
export { Progress } from './Progress';
export { type ToastContent } from './Toast';
export { ToastProvider, useToast } from './Toasts';
