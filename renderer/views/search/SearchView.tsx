import { memo, useCallback, useMemo } from 'react';
import { complexKey } from '../../../core/library/parameterLibrary';
import { useSettings } from '../../app/services';
import { useProject } from '../../app/session/ProjectSession';
import { useVersion } from '../../app/session/observable';
import { useLibrary } from '../../app/session/useLibrary';
import { ViewHeader } from '../../app/shell/ViewHeader';
import { ErrorPanel } from '../../parts';
import { useReply } from './asking/useReply';
import { Before } from './Before';
import { NeededPanel } from './inverse/NeededPanel';
import { ResultsPanel } from './results/ResultsPanel';
import { Advice } from './run/Advice';
import { LeftOver } from './run/LeftOver';
import { RunPanel } from './run/RunPanel';
import { RunTabs } from './run/RunTabs';
import type { SearchRun } from './run/searchRun';
import { searchRuns } from './run/searchRuns';
import { SavedWishes } from './saved/SavedWishes';
import { useDraft } from './useDraft';
import { useRuns } from './useRuns';
import { useShortlist } from './useShortlist';
import { WhyNotPanel } from './whynot/WhyNotPanel';
import { draftOf, wishesAnything, wishOf } from './wish/wishDraft';
import { WishForm } from './wish/WishForm';
import './SearchView.css';

const Form = memo(WishForm);

/** Where even the best has less than this chance, it is said which part stands in the way. */
const unlikely = 0.05;

/** From a wish to the metal and ligand sets that would meet it. */
export default function SearchView() {
  const { project, overlay, conditions } = useProject();
  const library = useLibrary();
  const { settings, set } = useSettings();
  const runs = useRuns(project.id);
  const { draft, setDraft, name, setName } = useDraft(project.id);
  const ready = wishesAnything(draft);
  const wish = useMemo(() => wishOf({ ...draft, name }, settings.shelf), [draft, name, settings.shelf]);
  const count = useReply({ kind: 'count', wish: { ...wish, name: 'counted' }, overlay });
  const refused = count.current && count.reply?.kind === 'refused';
  const begin = (): void => runs.show(searchRuns.start(project.id, wish, overlay));
  const ions = useMemo(() => {
    const open = [...library.ions.values()].filter(({ dElectrons }) => dElectrons > 0 && dElectrons < 10);
    const without = new Set(draft.withoutElements);
    return open
      .filter(({ ion, symbol }) => !without.has(symbol) && (draft.ions === 'all' || draft.ions.includes(ion)))
      .map(({ ion }) => ion);
  }, [library, draft.ions, draft.withoutElements]);
  const keepShelf = useCallback((shelf: readonly string[]) => set('shelf', [...shelf]), [set]);
  const { shown } = runs;
  return (
    <>
      <ViewHeader
        title="Find ligands"
        summary="Say what is wanted; every combination that the choice allows is looked at and ranked."
        actions={
          <button type="button" className="button-main" disabled={!ready || refused} onClick={begin}>
            {runs.all.length > 0 ? 'Start another search' : 'Start the search'}
          </button>
        }
      />
      <div className="search">
        <div className="stack">
          <SavedWishes
            wish={wish}
            name={name}
            onName={setName}
            onOpen={(opened) => {
              setDraft(draftOf(opened));
              setName(opened.name);
            }}
          />
          <Form
            draft={draft}
            onChange={setDraft}
            library={library}
            target={project.targetLab}
            usual={conditions}
            shelf={settings.shelf}
            onShelf={keepShelf}
          />
        </div>
        <div className="search-answer stack">
          <Before ready={ready} count={count} />
          <LeftOver
            left={runs.leftOver}
            overlay={overlay}
            onTakeUp={(left) => runs.show(searchRuns.takeUp(left, overlay))}
            onForget={(left) => searchRuns.forget(left)}
          />
          {shown && (
            <>
              <RunTabs
                runs={runs.all}
                shown={shown}
                onShow={runs.show}
                onClose={(run) => searchRuns.close(run)}
              />
              <Run key={shown.setup.id} run={shown} />
            </>
          )}
          {!shown && runs.leftOver.length === 0 && (
            <p className="soft">
              The search runs beside the window: go on working, look elsewhere and come back. Each complex
              gets the chance that it meets the whole wish, and that of each part, so that you can overrule
              it.
            </p>
          )}
          <WhyNotPanel wish={wish} results={shown?.results ?? []} />
          <NeededPanel wish={wish} ions={ions} />
        </div>
      </div>
    </>
  );
}

const Run = memo(function Run({ run }: { readonly run: SearchRun }) {
  const { rows } = useProject();
  useVersion(run);
  useVersion(rows);
  const add = useShortlist(run);
  const held = useMemo(
    () => new Set(rows.values().map(({ composition }) => complexKey(composition))),
    // The rows object stays the same while its content changes.
    // eslint-disable-next-line react-hooks/exhaustive-deps
    [rows, rows.version],
  );
  return (
    <>
      <ErrorPanel
        problems={run.problems}
        title={run.phase === 'failed' ? 'The search ended early' : 'This wish cannot be searched for'}
      />
      <RunPanel run={run} />
      {run.phase === 'finished' && (run.results[0]?.probability ?? 0) < unlikely && <Advice run={run} />}
      <ResultsPanel run={run} held={held} onAdd={add} />
    </>
  );
});
