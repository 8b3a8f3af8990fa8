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

/** Candidates are looked for by formula, name, tags and notes, once something was typed. */
export function findCandidates(
  rows: readonly Candidate[],
  summaryOf: (id: string) => CandidateSummary | undefined,
  query: string,
): FoundEntry[] {
  const words = query.toLowerCase().split(/\s+/).filter(Boolean);
  if (words.length === 0) return [];
  const found: FoundEntry[] = [];
  for (const row of rows) {
    const summary = summaryOf(row.id);
    const formula = summary?.ok ? summary.formula : row.composition.metal;
    const text = `${formula} ${row.name} ${row.tags.join(' ')} ${row.notes}`.toLowerCase();
    if (!words.every((word) => text.includes(word))) continue;
    const detail = [row.composition.isomer, row.name, ...row.tags.map((tag) => `#${tag}`)]
      .filter(Boolean)
      .join(', ');
    found.push({ id: row.id, kind: 'candidate', label: formula, detail, keys: null, disabled: false });
    if (found.length >= shownPerKind.candidate) break;
  }
  return found;
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
