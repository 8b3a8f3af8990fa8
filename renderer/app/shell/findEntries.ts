import type { Candidate, Project } from '../../../core/record/project';
import { matchOptions, type SelectOption } from '../../parts/input/matchOptions';
import type { CandidateSummary } from '../../workers/estimateSummary';
import type { Command } from '../commands';

/** One line of the command search. */
export interface FoundEntry {
  readonly id: string;
  readonly kind: 'command' | 'candidate' | 'project';
  readonly label: string;
  readonly detail: string;
  readonly keys: string | null;
  readonly disabled: boolean;
}

const shownPerKind = { command: 40, candidate: 12, project: 8 };

const optionOf = (entry: FoundEntry, keywords: string): SelectOption => ({
  id: entry.id,
  label: entry.label,
  detail: entry.detail,
  keywords,
});

function best(
  entries: readonly FoundEntry[],
  keywords: (entry: FoundEntry) => string,
  query: string,
  most: number,
) {
  const byId = new Map(entries.map((entry) => [entry.id, entry]));
  const options = entries.map((entry) => optionOf(entry, keywords(entry)));
  return matchOptions(options, query)
    .slice(0, most)
    .map(({ id }) => byId.get(id)!);
}

export function findCommands(commands: readonly Command[], query: string): FoundEntry[] {
  const unique = [
    ...new Map([...commands].reverse().map((command) => [command.id, command])).values(),
  ].reverse();
  const entries = unique.map((command): FoundEntry => ({
    id: command.id,
    kind: 'command',
    label: command.label,
    detail: command.group,
    keys: command.keys?.[0] ?? null,
    disabled: command.disabled ?? false,
  }));
  const keywords = new Map(unique.map(({ id, keywords: words }) => [id, words ?? '']));
  return best(entries, ({ id }) => keywords.get(id) ?? '', query, shownPerKind.command);
}

/** How well a candidate answers: what it is comes before what was written about it. Null where a word is nowhere. */
function gradeOf(row: Candidate, formula: string, words: readonly string[]): number | null {
  const parts = formula.toLowerCase().split(/[^a-z0-9]+/);
  const names = `${formula} ${row.name} ${row.composition.isomer ?? ''} ${row.tags.join(' ')}`.toLowerCase();
  const notes = row.notes.toLowerCase();
  let grade = 0;
  for (const word of words) {
    if (parts.some((part) => part === word || part.startsWith(word))) continue;
    if (names.includes(word)) grade = Math.max(grade, 1);
    else if (notes.includes(word)) grade = 2;
    else return null;
  }
  return grade;
}

/** Candidates are looked for by formula, name, tags and notes, once something was typed. */
export function findCandidates(
  rows: readonly Candidate[],
  summaryOf: (id: string) => CandidateSummary | undefined,
  query: string,
): FoundEntry[] {
  const words = query.toLowerCase().split(/\s+/).filter(Boolean);
  if (words.length === 0) return [];
  const graded: { grade: number; entry: FoundEntry }[] = [];
  for (const row of rows) {
    const summary = summaryOf(row.id);
    const formula = summary?.ok ? summary.formula : row.composition.metal;
    const grade = gradeOf(
      row,
      formula,
      words.map((word) => word.replace(/^#/, '')),
    );
    if (grade === null) continue;
    const detail = [
      row.composition.isomer,
      row.name,
      ...row.tags.map((tag) => `#${tag}`),
      grade === 2 ? `“${row.notes.slice(0, 60)}…”` : null,
    ];
    graded.push({
      grade,
      entry: {
        id: row.id,
        kind: 'candidate',
        label: formula,
        detail: detail.filter(Boolean).join(', '),
        keys: null,
        disabled: false,
      },
    });
  }
  return graded
    .sort((one, other) => one.grade - other.grade)
    .slice(0, shownPerKind.candidate)
    .map(({ entry }) => entry);
}

export function findProjects(projects: readonly Project[], query: string): FoundEntry[] {
  if (query.trim() === '') return [];
  const entries = projects.map(({ id, name, notes }): FoundEntry => ({
    id,
    kind: 'project',
    label: name,
    detail: notes.slice(0, 60),
    keys: null,
    disabled: false,
  }));
  return best(entries, () => '', query, shownPerKind.project);
}
