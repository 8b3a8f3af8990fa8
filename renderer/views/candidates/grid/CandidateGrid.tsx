import { useVirtualizer } from '@tanstack/react-virtual';
import { useCallback, useEffect, useMemo, useRef, useState, type CSSProperties } from 'react';
import { useRouter } from '../../../app/router/RouterContext';
import type { Selection } from '../selection/useSelection';
import type { Sort } from '../sorting';
import type { TableRow } from '../tableRow';
import { type Column, tracksOf } from './columns';
import { GridHead } from './GridHead';
import { GridRow } from './GridRow';
import { useGridKeys } from './useGridKeys';
import './CandidateGrid.css';

const rowHeight = 52;

interface CandidateGridProps {
  readonly shown: readonly TableRow[];
  readonly columns: readonly Column[];
  readonly sort: Sort;
  readonly onSort: (sort: Sort) => void;
  readonly selection: Selection;
  readonly onStar: (row: TableRow) => void;
  /** Told which row keys and commands act on. */
  readonly onCurrent: (id: string) => void;
}

/** The table of candidates: only the rows in view exist, so that it scrolls alike with ten rows and with fifty thousand. */
export function CandidateGrid(props: CandidateGridProps) {
  const { shown, columns, sort, onSort, selection, onStar, onCurrent } = props;
  const { go } = useRouter();
  const scroller = useRef<HTMLDivElement>(null);
  const [current, setCurrent] = useState<string | null>(null);
  // Its functions are new with each draw by design; nothing here is memoised by a compiler.
  // eslint-disable-next-line react-hooks/incompatible-library
  const virtual = useVirtualizer({
    count: shown.length,
    getScrollElement: () => scroller.current,
    estimateSize: () => rowHeight,
    overscan: 5,
    getItemKey: (place) => shown[place]!.candidate.id,
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
      virtual.scrollToIndex(place);
      focusRow(id);
    },
    [shown, point, virtual, focusRow],
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
      aria-rowcount={shown.length + 1}
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
          const row = shown[index]!;
          return (
            <GridRow
              key={key}
              row={row}
              columns={columns}
              place={index + 2}
              selected={selection.ids.has(row.candidate.id)}
              current={currentShown ? row.candidate.id === current : index === 0}
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

/** A row outside the window does not exist yet when the key is pressed: the focus waits for it. */
function useFocusRow(scroller: { readonly current: HTMLElement | null }): (id: string) => void {
  const [wanted, setWanted] = useState<string | null>(null);
  useEffect(() => {
    if (wanted === null) return;
    let tries = 0;
    let frame = 0;
    const look = (): void => {
      const row = scroller.current?.querySelector<HTMLElement>(`[data-row="${CSS.escape(wanted)}"]`);
      if (row) row.focus({ preventScroll: true });
      else if (tries++ < 10) frame = requestAnimationFrame(look);
    };
    look();
    return () => cancelAnimationFrame(frame);
  }, [wanted, scroller]);
  return setWanted;
}
