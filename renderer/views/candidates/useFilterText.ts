import { useCallback, useState } from 'react';

/** The filter of each project, for as long as the window is open: coming back from a sheet finds it as it was left. */
const remembered = new Map<string, string>();

export function useFilterText(projectId: string): [string, (text: string) => void] {
  const [text, setText] = useState(() => remembered.get(projectId) ?? '');
  const set = useCallback(
    (next: string) => {
      remembered.set(projectId, next);
      setText(next);
    },
    [projectId],
  );
  return [text, set];
}
