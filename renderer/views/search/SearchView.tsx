import { useMemo, useState } from 'react';
import { complexKey } from '../../../core/library/parameterLibrary';
import { useVersion } from '../../app/session/observable';
import { useProject } from '../../app/session/ProjectSession';
import { useLibrary } from '../../app/session/useLibrary';
import { ViewHeader } from '../../app/shell/ViewHeader';
import { useAction, useStore } from '../../app/services';
import { ErrorPanel, useToast } from '../../parts';
import type { ShownResult } from '../../workers/search/protocol';
import { SearchProgressPanel } from './SearchProgressPanel';
import { ResultTable } from './ResultTable';
import { useSearch } from './useSearch';
import { WishForm } from './WishForm';
import { freshDraft, wishesAnything, wishOf } from './wishDraft';
import './SearchView.css';

/** From a wish to the metal and ligand sets that would meet it. */
export default function SearchView() {
  const { project, rows, overlay, conditions } = useProject();
  useVersion(rows);
  const library = useLibrary();
  const search = useSearch();
  const [draft, setDraft] = useState(freshDraft);
  const add = useAdd();
  const around = { ...conditions, targetLab: project.targetLab };
  const ready = wishesAnything(draft, around);
  const held = useMemo(
    () => new Set(rows.values().map(({ composition }) => complexKey(composition))),
    // The rows object stays the same while its content changes.
    // eslint-disable-next-line react-hooks/exhaustive-deps
    [rows, rows.size],
  );
  const begin = (): void => search.start(wishOf(draft, around), overlay);
  return (
    <>
      <ViewHeader
        title="Find ligands"
        summary="Say what is wanted; every combination that the choice allows is estimated and ranked."
        actions={
          <button type="button" className="button-main" disabled={!ready} onClick={begin}>
            {search.phase === 'running' || search.phase === 'paused' ? 'Start again' : 'Start the search'}
          </button>
        }
      />
      <div className="search">
        <WishForm
          draft={draft}
          onChange={setDraft}
          library={library}
          hasTarget={project.targetLab !== null}
        />
        <div className="search-answer stack" aria-live="polite" aria-busy={search.phase === 'running'}>
          {!ready && (
            <p className="soft">
              Nothing is wanted yet: give a window to absorb in or to let through, a spin state, a range of
              10Dq or a colour.
            </p>
          )}
          <ErrorPanel problems={search.problems} title="This wish cannot be searched for" />
          <SearchProgressPanel search={search} />
          {search.state !== null && search.state.results.length > 0 && (
            <div className="panel search-table">
              <ResultTable results={search.state.results} held={held} onAdd={add} />
            </div>
          )}
        </div>
      </div>
    </>
  );
}

function useAdd(): (result: ShownResult) => void {
  const { project } = useProject();
  const store = useStore();
  const act = useAction();
  const toast = useToast();
  return ({ metal, oxidationState, geometry, isomer, ligands, formula }) =>
    void act(async () => {
      const composition = { metal, oxidationState, geometry, ligands, isomer: isomer ?? null };
      await store.candidates.create(project.id, [{ composition, tags: ['found'] }], `add ${formula}`);
      toast({
        message: `${formula} is in the project`,
        undo: () => void act(() => store.journal.undo(project.id)),
      });
    });
}
