/**
 * `ref` of the field in which one types when its dialog opens. React's `autoFocus` comes before the dialog is shown, and
 * leaves no attribute for the platform to follow.
 */
export const focusFirst = (element: HTMLElement | null): void => element?.setAttribute('autofocus', '');
