import { complexFormula } from '../../../core/library/complexFormula';
import { defaultLibrary } from '../../../core/library/parameterLibrary';
import type { BundleContent, MergeConflict } from '../../../core/record/bundle';

export const conflictKey = ({ table, id, field }: Pick<MergeConflict, 'table' | 'id' | 'field'>): string =>
  `${table} ${id} ${field ?? ''}`;

const nouns: Partial<Record<MergeConflict['table'], string>> = {
  projects: 'project',
  candidates: 'candidate',
  parameterSets: 'parameter set',
  frozenPredictions: 'frozen prediction',
  samples: 'sample',
  measurements: 'measurement',
  analyses: 'analysis',
  wishes: 'wish',
};

/** Which record and which of its fields: `[Cr(NH3)6]3+, notes`. */
export function conflictPlace({ table, id, field }: MergeConflict, mine: BundleContent): string {
  const candidate = table === 'candidates' ? mine.candidates.find((each) => each.id === id) : undefined;
  const record = candidate
    ? complexFormula(candidate.composition, defaultLibrary)
    : `${nouns[table] ?? table} ${id.slice(-6)}`;
  return field === null ? `${record}, removed in one copy` : `${record}, ${field}`;
}

const most = 200;

/** A value in one line; long ones are cut, since the choice is between whole values. */
export function valueText(value: unknown): string {
  if (value === null || value === undefined) return 'nothing';
  const text = typeof value === 'string' ? value : JSON.stringify(value);
  return text.length > most ? `${text.slice(0, most)}…` : text;
}
