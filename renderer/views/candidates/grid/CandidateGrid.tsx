import { useVirtualizer } from '@tanstack/react-virtual';
import { useCallback, useEffect, useMemo, useRef, useState, type CSSProperties } from 'react';
import { useRouter } from '../../../app/router/RouterContext';
import type { Selection } from '../selection/useSelection';
import { type RowGroup, TableLines } from '../grouping';
import type { Sort } from '../sorting';
import type { TableRow } from '../tableRow';
import { type Column, tracksOf } from './columns';
import { GridHead } from './GridHead';
import { GridRow } from './GridRow';
import { RowEditor, type RowEdit } from './RowEditor';
import { useGridKeys } from './useGridKeys';
import './CandidateGrid.css';

const rowHeight = 52;
const groupHeight = 32;

interface CandidateGridProps {
  readonly shown: readonly TableRow[];
  /** Headings between the rows; empty where nothing is grouped. */
  readonly groups: readonly RowGroup[];
  readonly columns: readonly Column[];
  readonly sort: Sort;
  readonly onSort: (sort: Sort) => void;
  readonly selection: Selection;
  readonly onStar: (row: TableRow) => void;
  /** Candidate whose row is a form. */
  readonly edited: string | null;
  readonly onEdited: (id: string | null) => void;
  readonly onEdit: (row: TableRow, edit: RowEdit) => void;
  /** Told which row keys and commands act on. */
  readonly onCurrent: (id: string) => void;
}

/** The table of candidates: only the rows in view exist, so that it scrolls alike with ten rows and with fifty thousand. */
export function CandidateGrid(props: CandidateGridProps) {
  const { shown, groups, columns, sort, onSort, selection, onStar, onCurrent } = props;
  const { edited, onEdited, onEdit } = props;
  const lines = useMemo(() => new TableLines(shown.length, groups), [shown.length, groups]);
  const { go } = useRouter();
  const scroller = useRef<HTMLDivElement>(null);
  const [current, setCurrent] = useState<string | null>(null);
  // Its functions are new with each draw by design; nothing here is memoised by a compiler.
  // eslint-disable-next-line react-hooks/incompatible-library
  const virtual = useVirtualizer({
    count: lines.count,
    getScrollElement: () => scroller.current,
    estimateSize: (line) => ('group' in lines.at(line) ? groupHeight : rowHeight),
    overscan: 5,
    getItemKey: (line) => {
      const at = lines.at(line);
      return 'group' in at ? `group ${at.group.label}` : shown[at.place]!.candidate.id;
    },
  });

  const point = useCallback(
    (id: string) => {
      setCurrent(id);
      onCurrent(id);
    },
    [onCurrent],
  );
  const focusRow = useFocusRow(scroller);
  const move = useCallback(
    (place: number) => {
      const id = shown[place]!.candidate.id;
      point(id);
      virtual.scrollToIndex(place === 0 ? 0 : lines.ofRow(place));
      focusRow(id);
    },
    [shown, lines, point, virtual, focusRow],
  );
  const open = useCallback(
    ({ candidate }: TableRow) => go({ view: 'sheet', project: candidate.projectId, item: candidate.id }),
    [go],
  );
  const toggle = useCallback(
    (id: string, extend: boolean) => (extend ? selection.extendTo(id) : selection.toggle(id)),
    [selection],
  );
  const onKeyDown = useGridKeys({ shown, current, perPage: 8, selection, onMove: move, onOpen: open });

  const closeEditor = ({ candidate }: TableRow): void => {
    onEdited(null);
    point(candidate.id);
    focusRow(candidate.id);
  };

  const { tracks, least } = tracksOf(columns);
  const currentShown = useMemo(
    () => shown.some(({ candidate }) => candidate.id === current),
    [shown, current],
  );
  return (
    <div
      className="grid"
      role="grid"
      aria-label="Candidates"
      aria-rowcount={lines.count + 1}
      aria-multiselectable="true"
      ref={scroller}
      style={{ '--tracks': tracks, '--least': least } as CSSProperties}
      onKeyDown={onKeyDown}
    >
      <div role="rowgroup" className="grid-head-group">
        <GridHead
          columns={columns}
          sort={sort}
          onSort={onSort}
          allSelected={selection.ids.size > 0 && selection.ids.size === shown.length}
          someSelected={selection.ids.size > 0}
          onSelectAll={selection.ids.size === shown.length ? selection.clear : selection.all}
          onStarSort={() => onSort({ by: 'starred', descending: true })}
        />
      </div>
      <div role="rowgroup" className="grid-body" style={{ blockSize: virtual.getTotalSize() }}>
        {virtual.getVirtualItems().map(({ index, start, key }) => {
          const line = lines.at(index);
          if ('group' in line) {
            return <GroupHeading key={key} group={line.group} place={index + 2} start={start} />;
          }
          const row = shown[line.place]!;
          if (row.candidate.id === edited) {
            return (
              <div
                key={key}
                role="row"
                className="grid-row grid-row-edited"
                aria-rowindex={index + 2}
                style={{ transform: `translateY(${start}px)`, minBlockSize: rowHeight }}
              >
                <div role="gridcell">
                  <RowEditor
                    row={row}
                    formula={row.summary?.ok ? row.summary.formula : row.candidate.composition.metal}
                    onSave={onEdit}
                    onClose={() => closeEditor(row)}
                  />
                </div>
              </div>
            );
          }
          return (
            <GridRow
              key={key}
              row={row}
              columns={columns}
              place={index + 2}
              selected={selection.ids.has(row.candidate.id)}
              current={currentShown ? row.candidate.id === current : line.place === 0}
              start={start}
              height={rowHeight}
              onToggle={toggle}
              onStar={onStar}
              onPoint={point}
            />
          );
        })}
      </div>
    </div>
  );
}

interface GroupHeadingProps {
  readonly group: RowGroup;
  readonly place: number;
  readonly start: number;
}

function GroupHeading({ group, place, start }: GroupHeadingProps) {
  return (
    <div
      role="row"
      className="grid-group"
      aria-rowindex={place}
      style={{ transform: `translateY(${start}px)`, blockSize: groupHeight }}
    >
      <span role="gridcell">
        {group.label} <span className="soft">{group.count.toLocaleString('en-GB')}</span>
      </span>
    </div>
  );
}

/** A row outside the window does not exist yet when the key is pressed: the focus waits for it. */
function useFocusRow(scroller: { readonly current: HTMLElement | null }): (id: string) => void {
  const [wanted, setWanted] = useState<{ readonly id: string } | null>(null);
  useEffect(() => {
    if (wanted === null) return;
    let tries = 0;
    let frame = 0;
    const look = (): void => {
      const row = scroller.current?.querySelector<HTMLElement>(`[data-row="${CSS.escape(wanted.id)}"]`);
      if (row) row.focus({ preventScroll: true });
      else if (tries++ < 10) frame = requestAnimationFrame(look);
    };
    look();
    return () => cancelAnimationFrame(frame);
  }, [wanted, scroller]);
  // Wanted anew each time, also where it is the row that was wanted last.
  return useCallback((id: string) => setWanted({ id }), []);
}
