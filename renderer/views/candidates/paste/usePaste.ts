import { useEffect, useState } from 'react';

/** Text for the paste dialog; null while it is closed. A table pasted anywhere but into a field opens it. */
export function usePaste(): readonly [string | null, (text: string | null) => void] {
  const [text, setText] = useState<string | null>(null);
  useEffect(() => {
    const onPaste = (event: ClipboardEvent): void => {
      const target = event.target as HTMLElement | null;
      if (target?.closest('input, textarea, [contenteditable], dialog')) return;
      const pasted = event.clipboardData?.getData('text/plain') ?? '';
      if (pasted.trim() !== '') setText(pasted);
    };
    document.addEventListener('paste', onPaste);
    return () => document.removeEventListener('paste', onPaste);
  }, []);
  return [text, setText];
}
