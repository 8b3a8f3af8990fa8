import { complexFormula } from '../../../core/library/complexFormula';
import { defaultLibrary } from '../../../core/library/parameterLibrary';
import { currentContent } from '../../../core/record/revisions';
import { minuteOf } from '../../app/services';
import type { BinContent, BinRecord, Store } from '../../store';
import { contentText } from '../record/contentText';

/** One line of the bin. */
export interface BinEntry {
  readonly id: string;
  readonly deletedAt: string;
  readonly what: string;
  /** Bracket formula of the complex it is, or is about. */
  readonly formula: string | null;
  /** Project it lies in; null for a project itself. */
  readonly from: string | null;
  readonly restore: (store: Store) => Promise<unknown>;
}

function textOf(record: BinRecord): string {
  switch (record.table) {
    case 'measurements':
      return contentText(currentContent(record.row));
    case 'samples':
      return `Batch ${record.row.batch}`;
    case 'frozenPredictions':
      return `Prediction frozen ${minuteOf(record.row.frozenAt)}`;
  }
}

/** Everything in the bin, latest first. */
export function binEntries({ projects, candidates, records }: BinContent): BinEntry[] {
  const entries: BinEntry[] = [
    ...projects.map(({ id, name, deletedAt }) => ({
      id,
      deletedAt: deletedAt!,
      what: `Project “${name}”`,
      formula: null,
      from: null,
      restore: (store: Store) => store.projects.restore(id),
    })),
    ...candidates.map(({ id, projectId, name, composition, deletedAt, projectName }) => ({
      id,
      deletedAt: deletedAt!,
      what: name,
      formula: complexFormula(composition, defaultLibrary),
      from: projectName,
      restore: (store: Store) => store.candidates.restore(projectId, [id]),
    })),
    ...records.map((record) => ({
      id: record.row.id,
      deletedAt: record.row.deletedAt!,
      what: textOf(record),
      formula: complexFormula(record.candidate.composition, defaultLibrary),
      from: record.projectName,
      restore: (store: Store) => store.bin.restore(record),
    })),
  ];
  return entries.sort((one, other) => other.deletedAt.localeCompare(one.deletedAt));
}
