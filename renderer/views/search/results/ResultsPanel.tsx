import { memo, useCallback, useDeferredValue, useMemo, useState } from 'react';
import { useVersion } from '../../../app/session/observable';
import { useLibrary } from '../../../app/session/useLibrary';
import { useSettings } from '../../../app/services';
import { SegmentedChoice } from '../../../parts';
import { ParetoPlot } from '../../../plots';
import type { ShownResult } from '../../../workers/search/protocol';
import type { SearchRun } from '../run/searchRun';
import { type CostKind, costNames, costOf } from './costs';
import { oneOfEach } from './oneOfEach';
import { ResultTable } from './ResultTable';
import { ResultBar } from './ResultBar';

interface ResultsPanelProps {
  readonly run: SearchRun;
  /** Ids that the project already holds. */
  readonly held: ReadonlySet<string>;
  readonly onAdd: (results: readonly ShownResult[]) => void;
}

const Table = memo(ResultTable);

/** Rows added with each press: a long list drawn at once would hold up the window. */
const portion = 25;

/** The list of a search as table or as chance against cost, and what can be done with chosen results. */
export function ResultsPanel({ run, held, onAdd }: ResultsPanelProps) {
  useVersion(run);
  // Drawn when there is time for it: typing elsewhere in the window comes first.
  const results = useDeferredValue(run.results);
  const [as, setAs] = useState<'list' | 'costs'>('list');
  const [distinct, setDistinct] = useState(false);
  const [shown, setShown] = useState(portion);
  const [chosen, setChosen] = useState<ReadonlyMap<string, ShownResult>>(new Map());
  const choose = useCallback((result: ShownResult, taken: boolean) => {
    setChosen((before) => {
      const after = new Map(before);
      if (taken) after.set(result.id, result);
      else after.delete(result.id);
      return after;
    });
  }, []);
  const addOne = useCallback((result: ShownResult) => onAdd([result]), [onAdd]);
  const rows = useMemo(() => {
    const places = new Map(results.map(({ id }, i) => [id, i + 1]));
    const listed = distinct ? oneOfEach(results) : results.map((result) => ({ result, variants: 1 }));
    return listed.map((each) => ({ ...each, place: places.get(each.result.id)! }));
  }, [results, distinct]);
  const firstRows = useMemo(() => rows.slice(0, shown), [rows, shown]);
  if (results.length === 0) return null;
  return (
    <section className="panel stack" aria-labelledby="search-results">
      <div className="search-results-head">
        <h2 id="search-results">{run.phase === 'finished' ? 'Best' : 'Best so far'}</h2>
        <SegmentedChoice
          legend="Show the results as"
          options={[
            { id: 'list', label: 'List' },
            { id: 'costs', label: 'Chance against cost' },
          ]}
          value={as}
          onChange={setAs}
        />
        <label className="check">
          <input
            type="checkbox"
            checked={distinct}
            onChange={(event) => setDistinct(event.currentTarget.checked)}
          />
          One of each idea
        </label>
      </div>
      {distinct && (
        <p className="soft small">
          {rows.length} ideas behind {results.length} results: the best for each metal ion and set of ligands.
          The ranking itself is unchanged.
        </p>
      )}
      {as === 'costs' ? (
        <Costs results={rows.map(({ result }) => result)} onChoose={choose} />
      ) : (
        <>
          <div className="search-table">
            <Table rows={firstRows} chosen={chosen} held={held} onChoose={choose} onAdd={addOne} />
          </div>
          {rows.length > shown && (
            <div>
              <button type="button" onClick={() => setShown(shown + portion)}>
                Show {Math.min(portion, rows.length - shown)} more of {rows.length}
              </button>
            </div>
          )}
        </>
      )}
      <ResultBar
        chosen={[...chosen.values()]}
        held={held}
        onAdd={onAdd}
        onClear={() => setChosen(new Map())}
      />
    </section>
  );
}

interface CostsProps {
  readonly results: readonly ShownResult[];
  readonly onChoose: (result: ShownResult, chosen: boolean) => void;
}

function Costs({ results, onChoose }: CostsProps) {
  const library = useLibrary();
  const { settings } = useSettings();
  const [kind, setKind] = useState<CostKind>('new');
  const points = useMemo(() => {
    const shelf = new Set(settings.shelf);
    return results.map((result) => ({
      id: result.id,
      name: result.isomer == null ? result.formula : `${result.isomer}-${result.formula}`,
      cost: costOf(result, kind, shelf, library),
      probability: result.probability,
    }));
  }, [results, kind, settings.shelf, library]);
  return (
    <>
      <SegmentedChoice
        legend="Cost"
        legendShown
        options={(Object.keys(costNames) as CostKind[]).map((id) => ({ id, label: costNames[id] }))}
        value={kind}
        onChange={setKind}
      />
      {kind === 'new' && settings.shelf.length === 0 && (
        <p className="soft small">The shelf is empty, so that every ligand counts as new.</p>
      )}
      <ParetoPlot
        points={points}
        costName={costNames[kind]}
        title="What it takes to meet the wish"
        onOpen={(id) => {
          const result = results.find((each) => each.id === id);
          if (result) onChoose(result, true);
        }}
        note={
          kind === 'cautions'
            ? 'Statements on file only: none means not assessed, not safe. A press selects a candidate.'
            : 'Among the results listed. A press selects a candidate.'
        }
      />
    </>
  );
}
