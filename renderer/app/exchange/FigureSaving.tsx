import { useCallback, type ReactNode } from 'react';
import type { FileKind } from '../../host';
import { SaveFigureProvider, type SaveFigure } from '../../plots';
import { useAction, useServices } from '../services';

const kinds: Readonly<Record<string, FileKind>> = { svg: 'svg', png: 'png', csv: 'csv', json: 'json' };

/** Figures of all plots are saved where the user says. */
export function FigureSaving({ children }: { readonly children: ReactNode }) {
  const { host } = useServices();
  const act = useAction();
  const save = useCallback<SaveFigure>(
    async (name, content) => {
      const kind = kinds[name.split('.').at(-1) ?? ''] ?? 'any';
      await act(async () =>
        host.saveFile({ kind, suggestedName: name, data: new Uint8Array(await content.arrayBuffer()) }),
      );
    },
    [host, act],
  );
  return <SaveFigureProvider save={save}>{children}</SaveFigureProvider>;
}
