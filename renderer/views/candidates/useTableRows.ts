import { useDeferredValue, useEffect, useMemo, useState } from 'react';
import { type Observable, useVersion } from '../../app/session/observable';
import type { ProjectSession } from '../../app/session/ProjectSession';
import type { FilterTerm } from './filter/condition';
import { type Grouping, groupRows, type RowGroup } from './grouping';
import { rowTest } from './filter/matches';
import { RowAssembler } from './rowAssembler';
import { type Sort, sortRows } from './sorting';
import type { TableRow } from './tableRow';

/** Above this many rows the table is put in order at most once a second while estimates come in. */
const large = 4000;

/** Version that follows at once while the list is small, and at intervals while a large one fills up. */
function useCalmVersion(observable: Observable, calm: boolean): number {
  const version = useVersion(observable);
  const [shown, setShown] = useState(version);
  useEffect(() => {
    if (!calm || version === shown) return;
    const timer = setTimeout(() => setShown(version), 1000);
    return () => clearTimeout(timer);
  }, [calm, version, shown]);
  return calm ? shown : version;
}

function useAllRows({ rows, estimates, project }: ProjectSession): readonly TableRow[] {
  const rowsVersion = useVersion(rows);
  const estimatesVersion = useCalmVersion(estimates, rows.size > large);
  const [assembler] = useState(() => new RowAssembler());
  const target = project.targetLab;
  return useMemo(
    () => assembler.assemble(rows.values(), (id) => estimates.of(id), target),
    // The collections change in place: their versions stand for their content.
    // eslint-disable-next-line react-hooks/exhaustive-deps
    [assembler, rows, estimates, target, rowsVersion, estimatesVersion],
  );
}

export interface TableRows {
  readonly all: readonly TableRow[];
  /** After filter, ranking and grouping. */
  readonly shown: readonly TableRow[];
  readonly groups: readonly RowGroup[];
}

export function useTableRows(
  session: ProjectSession,
  terms: readonly FilterTerm[],
  sort: Sort,
  grouping: Grouping,
): TableRows {
  const all = useAllRows(session);
  const wanted = useDeferredValue(terms);
  const { by, descending } = sort;
  const ordered = useMemo(
    () => sortRows(all.filter(rowTest(wanted)), { by, descending }),
    [all, wanted, by, descending],
  );
  const { rows: shown, groups } = useMemo(() => groupRows(ordered, grouping), [ordered, grouping]);
  return { all, shown, groups };
}
