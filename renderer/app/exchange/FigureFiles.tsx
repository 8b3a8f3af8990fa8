import { useCallback, type ReactNode } from 'react';
import { SaveFigureProvider, type SaveFigure } from '../../plots/figure/SaveFigure';
import { useServices } from '../services';

/** Figures leave through the host's save dialog, like every other file. */
export function FigureFiles({ children }: { readonly children: ReactNode }) {
  const { host } = useServices();
  const save = useCallback<SaveFigure>(
    async (name, content) => {
      const kind = name.endsWith('.png') ? 'png' : 'svg';
      const data = kind === 'svg' ? await content.text() : new Uint8Array(await content.arrayBuffer());
      await host.saveFile({ kind, suggestedName: name, data });
    },
    [host],
  );
  return <SaveFigureProvider save={save}>{children}</SaveFigureProvider>;
}
