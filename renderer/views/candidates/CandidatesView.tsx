import { useCallback, useEffect, useMemo, useState } from 'react';
import { linkTo } from '../../app/router/RouterContext';
import { useAction, useSettings } from '../../app/services';
import { useProject } from '../../app/session/ProjectSession';
import { useVersion } from '../../app/session/observable';
import { rememberOrder } from '../../app/session/shownOrder';
import { useLibrary } from '../../app/session/useLibrary';
import { ViewHeader } from '../../app/shell/ViewHeader';
import { EmptyState, ErrorPanel, useToast } from '../../parts';
import { counted } from '../../store';
import { ColumnChooser } from './ColumnChooser';
import { EstimateProgress } from './EstimateProgress';
import { FilterBar } from './FilterBar';
import { parseFilter } from './filter/parseFilter';
import { CandidateGrid } from './grid/CandidateGrid';
import { shownColumns } from './grid/columns';
import { type Grouping, groupings } from './grouping';
import { PasteDialog } from './paste/PasteDialog';
import { usePaste } from './paste/usePaste';
import { SelectionBar } from './selection/SelectionBar';
import { tableText } from './selection/tableText';
import { TagDialog } from './selection/TagDialog';
import { useRowActions } from './selection/useRowActions';
import { useSelection } from './selection/useSelection';
import { type Ranking, rankings, type Sort } from './sorting';
import { TargetButton } from './target/TargetButton';
import type { TableRow } from './tableRow';
import { useCandidateCommands } from './useCandidateCommands';
import { useFilterText } from './useFilterText';
import { useTableRows } from './useTableRows';

export default function CandidatesView() {
  const session = useProject();
  const { project, rows } = session;
  useVersion(rows);
  const library = useLibrary();
  const [filterText, setFilterText] = useFilterText(project.id);
  const terms = useMemo(() => parseFilter(filterText, [...library.ligands.values()]), [filterText, library]);
  const [sort, setSort] = useSort(project.targetLab !== null);
  const [grouping, setGrouping] = useGrouping();
  const { all, shown, groups } = useTableRows(session, terms, sort, grouping);
  useEffect(() => rememberOrder(project.id, shown), [project.id, shown]);
  const selection = useSelection(shown);
  const actions = useRowActions(project.id);
  const [current, setCurrent] = useState<string | null>(null);
  const subjects = useSubjects(shown, selection.ids, current);
  const [tagged, setTagged] = useState<readonly TableRow[] | null>(null);
  const copy = useCopy(subjects);
  const [pasted, setPasted] = usePaste();
  const startPasting = useCallback(() => setPasted(''), [setPasted]);
  const [edited, setEdited] = useState<string | null>(null);
  const startEditing = useCallback(() => setEdited(subjects[0]?.candidate.id ?? null), [subjects]);
  const startTagging = useCallback(() => setTagged(subjects), [subjects]);
  const { settings } = useSettings();
  const columns = useMemo(
    () => shownColumns(settings.hiddenColumns, project.targetLab !== null),
    [settings.hiddenColumns, project.targetLab],
  );
  const star = useCallback((row: TableRow) => actions.star([row]), [actions]);
  useCandidateCommands({
    projectId: project.id,
    subjects,
    actions,
    onEdit: startEditing,
    onTag: startTagging,
    onCopy: copy,
    onPaste: startPasting,
    onSelectAll: selection.all,
  });

  const paste = (
    <button type="button" onClick={startPasting}>
      Paste…
    </button>
  );
  const add = (
    <a className="button button-main" href={linkTo({ view: 'entry', project: project.id })}>
      Add a candidate…
    </a>
  );
  const empty = rows.state === 'ready' && all.length === 0;
  const nothing = shown.length === 0 && all.length > 0 && rows.state === 'ready';
  return (
    <>
      <ViewHeader
        title="Candidates"
        summary={empty ? undefined : <Summary all={all} shown={shown} demo={project.demo} />}
        actions={
          empty ? undefined : (
            <>
              <TargetButton />
              <ColumnChooser />
              {paste}
              {add}
            </>
          )
        }
      />
      <ReadingProblems />
      {empty ? (
        <EmptyState
          title="No candidates yet"
          actions={
            <>
              {add}
              {paste}
            </>
          }
        >
          Enter the complexes you could make: a metal, its oxidation state, a geometry and the ligands. While
          you choose, the program says what it expects of each. Then rank them here.
        </EmptyState>
      ) : (
        <>
          <FilterBar
            text={filterText}
            onText={setFilterText}
            terms={terms}
            sort={sort}
            onSort={setSort}
            grouping={grouping}
            onGrouping={setGrouping}
            hasTarget={project.targetLab !== null}
          />
          <EstimateProgress estimates={session.estimates} />
          {nothing ? (
            <EmptyState
              title="Nothing passes this filter"
              actions={
                <button type="button" onClick={() => setFilterText('')}>
                  Clear the filter
                </button>
              }
            >
              {counted(all.length, 'candidate')} in the project; the line above says how the filter was
              understood.
            </EmptyState>
          ) : (
            <CandidateGrid
              shown={shown}
              columns={columns}
              sort={sort}
              onSort={setSort}
              selection={selection}
              groups={groups}
              onStar={star}
              edited={edited}
              onEdited={setEdited}
              onEdit={actions.edit}
              onCurrent={setCurrent}
            />
          )}
          <SelectionBar
            rows={selection.ids.size > 0 ? subjects : []}
            actions={actions}
            onTag={startTagging}
            onCopy={copy}
            onClear={selection.clear}
          />
        </>
      )}
      {pasted !== null && <PasteDialog start={pasted} onClose={() => setPasted(null)} />}
      <TagDialog
        rows={tagged}
        all={all}
        onTag={(tag) => tagged && actions.tag(tagged, tag)}
        onUntag={(tag) => {
          if (tagged) actions.untag(tagged, tag);
          setTagged(null);
        }}
        onClose={() => setTagged(null)}
      />
    </>
  );
}

interface SummaryProps {
  readonly all: readonly TableRow[];
  readonly shown: readonly TableRow[];
  readonly demo: boolean;
}

function Summary({ all, shown, demo }: SummaryProps) {
  return (
    <>
      {shown.length === all.length
        ? counted(all.length, 'candidate')
        : `${shown.length.toLocaleString('en-GB')} of ${counted(all.length, 'candidate')}`}
      {demo && '. A made-up demo to look around in: nothing here was measured.'}
    </>
  );
}

/** What could not be read is said, never silently missing. */
function ReadingProblems() {
  const { rows } = useProject();
  useVersion(rows);
  if (rows.error) {
    const { message } = rows.error;
    const remedy = 'remedy' in rows.error ? rows.error.remedy : undefined;
    return (
      <ErrorPanel
        title="The candidates cannot be read"
        problems={[{ code: 'integrity', field: '', message, ...(remedy === undefined ? {} : { remedy }) }]}
      />
    );
  }
  if (rows.unreadable === 0) return null;
  return (
    <ErrorPanel
      title={`${counted(rows.unreadable, 'record')} cannot be shown`}
      problems={[
        {
          code: 'integrity',
          field: 'candidates',
          message: 'They are stored in a form that this version does not understand.',
          remedy:
            'They were left as they are. Export the project to keep them, and look whether a newer version reads them.',
        },
      ]}
    />
  );
}

/** Ranking is remembered; a ranking by distance makes no sense without a target. */
function useSort(hasTarget: boolean): [Sort, (sort: Sort) => void] {
  const { settings, set } = useSettings();
  const by = rankings.find((ranking) => ranking === settings.sort.by) ?? 'added';
  const usable: Ranking = by === 'distance' && !hasTarget ? 'added' : by;
  const { descending } = settings.sort;
  const sort = useMemo(() => ({ by: usable, descending }), [usable, descending]);
  const setSort = useCallback((next: Sort) => set('sort', next), [set]);
  return [sort, setSort];
}

/** Grouping is remembered like the ranking. */
function useGrouping(): [Grouping, (grouping: Grouping) => void] {
  const { settings, set } = useSettings();
  const grouping = groupings.find((each) => each === settings.groupBy) ?? 'none';
  return [grouping, useCallback((next: Grouping) => set('groupBy', next), [set])];
}

function useSubjects(
  shown: readonly TableRow[],
  ids: ReadonlySet<string>,
  current: string | null,
): readonly TableRow[] {
  return useMemo(
    () =>
      ids.size > 0
        ? shown.filter(({ candidate }) => ids.has(candidate.id))
        : shown.filter(({ candidate }) => candidate.id === current),
    [shown, ids, current],
  );
}

function useCopy(rows: readonly TableRow[]): () => void {
  const act = useAction();
  const toast = useToast();
  return useCallback(
    () =>
      void act(async () => {
        await navigator.clipboard.writeText(tableText(rows));
        toast({ message: `${counted(rows.length, 'candidate')} copied as a table` });
      }),
    [act, toast, rows],
  );
}
