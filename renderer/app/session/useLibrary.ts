import { useMemo } from 'react';
import { defaultLibrary, type ParameterLibrary } from '../../../core/library/parameterLibrary';
import { withParameterSet } from '../../../core/library/parameterOverlay';
import { useProjectState } from './ProjectSession';

/** The library as the open project sees it: with its parameter set laid over, or plain. */
export function useLibrary(): ParameterLibrary {
  const project = useProjectState();
  const set = project.state === 'open' ? project.session.parameterSet : null;
  return useMemo(
    () => (set === null ? defaultLibrary : withParameterSet(defaultLibrary, set).library),
    [set],
  );
}
