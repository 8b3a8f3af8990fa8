import { createContext, use, type ReactNode } from 'react';

/** Takes a finished file; the host asks where to put it. */
export type SaveFigure = (name: string, content: Blob) => void | Promise<void>;

/** Without a host, the browser's own download. */
function download(name: string, content: Blob): void {
  const link = document.createElement('a');
  link.href = URL.createObjectURL(content);
  link.download = name;
  link.click();
  // The download has its own hold on the content by then.
  setTimeout(() => URL.revokeObjectURL(link.href), 10_000);
}

const SaveFigureContext = createContext<SaveFigure>(download);

interface SaveFigureProviderProps {
  readonly save: SaveFigure;
  readonly children: ReactNode;
}

/** Sends every exported figure below it through `save`. */
export function SaveFigureProvider({ save, children }: SaveFigureProviderProps) {
  return <SaveFigureContext value={save}>{children}</SaveFigureContext>;
}

export const useSaveFigure = (): SaveFigure => use(SaveFigureContext);

/** A name that every file system takes. */
export const fileStem = (title: string): string =>
  title
    .normalize('NFKD')
    .replace(/[^\p{L}\p{N}+-]+/gu, '-')
    .replace(/^-+|-+$/g, '')
    .slice(0, 80) || 'figure';
