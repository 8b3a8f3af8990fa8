import { useVirtualizer } from '@tanstack/react-virtual';
import { useCallback, useMemo, useRef, useState } from 'react';
import { complexFormula } from '../../../core/library/complexFormula';
import type { Measurement } from '../../../core/record/measurement';
import { currentContent } from '../../../core/record/revisions';
import { Field } from '../../app/form';
import { linkTo } from '../../app/router/RouterContext';
import { dayOf, useStored } from '../../app/services';
import { useVersion } from '../../app/session/observable';
import { useProject } from '../../app/session/ProjectSession';
import { useLibrary } from '../../app/session/useLibrary';
import { EmptyState, ErrorPanel, Formula } from '../../parts';
import { counted, type Store } from '../../store';
import { contentText } from './contentText';

const tables = ['measurements', 'candidates'] as const;
const rowHeight = 44;

interface Line {
  readonly id: string;
  readonly candidateId: string;
  readonly formula: string;
  readonly text: string;
  readonly when: string;
  /** Everything that the filter looks at, in lower case. */
  readonly words: string;
}

/** All measurements of the project, newest first. Curves stay in the database until one is opened. */
export function ProjectRecord() {
  const { project, rows } = useProject();
  const version = useVersion(rows);
  const library = useLibrary();
  const [filter, setFilter] = useState('');
  const ask = useCallback((store: Store) => store.measurements.ofProject(project.id), [project.id]);
  const { value, error } = useStored(ask, tables);
  const lines = useMemo(() => {
    const formulas = new Map<string, string>();
    const formulaOf = (id: string): string => {
      const known = formulas.get(id);
      if (known !== undefined) return known;
      const made = complexFormula(rows.get(id)!.composition, library);
      formulas.set(id, made);
      return made;
    };
    return (value ?? [])
      .filter(({ candidateId }) => rows.get(candidateId)?.deletedAt === null)
      .map((each) => lineOf(each, formulaOf(each.candidateId)));
    // The rows change in place; their version says so.
    // eslint-disable-next-line react-hooks/exhaustive-deps
  }, [value, rows, library, version]);
  const shown = useMemo(() => {
    const wanted = filter.toLowerCase().split(/\s+/).filter(Boolean);
    return wanted.length === 0
      ? lines
      : lines.filter(({ words }) => wanted.every((word) => words.includes(word)));
  }, [lines, filter]);
  if (error !== null)
    return (
      <ErrorPanel
        title="The record cannot be read"
        problems={[{ code: 'integrity', field: '', message: error }]}
      />
    );
  if (!value || rows.state === 'reading') return <p className="soft">Opening…</p>;
  if (lines.length === 0)
    return (
      <EmptyState title="Nothing measured yet">
        Choose a candidate above, then import a spectrum or type what was read off. Its prediction is frozen
        first, so that the comparison is honest.
      </EmptyState>
    );
  return (
    <section className="panel stack" aria-labelledby="record-whole">
      <div className="record-head">
        <h2 id="record-whole">{counted(lines.length, 'measurement')}</h2>
        <a className="button" href={linkTo({ view: 'agreement', project: project.id })}>
          Agreement of all
        </a>
      </div>
      <Field label="Show only" hint="words of formula, kind, solvent, instrument, initials or date">
        {(attributes) => (
          <input
            {...attributes}
            type="search"
            value={filter}
            onChange={(event) => setFilter(event.currentTarget.value)}
          />
        )}
      </Field>
      <p className="soft" role="status">
        {shown.length === lines.length ? 'All shown.' : `${shown.length} of ${lines.length} shown.`}
      </p>
      <MeasurementLines lines={shown} projectId={project.id} />
    </section>
  );
}

function MeasurementLines({
  lines,
  projectId,
}: {
  readonly lines: readonly Line[];
  readonly projectId: string;
}) {
  const scroller = useRef<HTMLDivElement>(null);
  // Its functions are new with each draw by design; nothing here is memoised by a compiler.
  // eslint-disable-next-line react-hooks/incompatible-library
  const virtual = useVirtualizer({
    count: lines.length,
    getScrollElement: () => scroller.current,
    estimateSize: () => rowHeight,
    overscan: 8,
    getItemKey: (place) => lines[place]!.id,
  });
  return (
    <div ref={scroller} className="record-lines" role="group" aria-label="Measurements" tabIndex={0}>
      <ul style={{ blockSize: virtual.getTotalSize() }}>
        {virtual.getVirtualItems().map(({ index, start }) => {
          const line = lines[index]!;
          return (
            <li key={line.id} style={{ transform: `translateY(${start}px)`, blockSize: rowHeight }}>
              <a href={linkTo({ view: 'record', project: projectId, item: line.candidateId })}>
                <Formula formula={line.formula} />
              </a>
              <span className="record-line-text">{line.text}</span>
              <span className="soft">{line.when}</span>
            </li>
          );
        })}
      </ul>
    </div>
  );
}

function lineOf(measurement: Measurement, formula: string): Line {
  const content = currentContent(measurement);
  const { date, solvent, instrument, operator } = content.conditions;
  const when = dayOf(date ?? measurement.createdAt);
  const text = [contentText(content), solvent, instrument, operator].filter(Boolean).join(', ');
  return {
    id: measurement.id,
    candidateId: measurement.candidateId,
    formula,
    text,
    when,
    words: [formula, text, content.kind, date, when].join(' ').toLowerCase(),
  };
}
