import { spokenTerm } from '../../parts/chemistry';
import { type CandidatePlace } from './CandidateMark';
import { type Crossover, type LevelLine } from './levelLine';
import { heightAt } from './lineEnds';

/** The diagram in words: how many levels, where the ground level changes, what the candidate meets. */
export function summaryOf(
  lines: readonly LevelLine[],
  crossovers: readonly Crossover[],
  place: CandidatePlace | null,
  said: (value: number) => string,
  xName: string,
): string {
  const changes = crossovers.map(
    ({ x, from, to }) =>
      `the ground level changes from ${spokenTerm(from)} to ${spokenTerm(to)} at ${xName} ${said(x)}`,
  );
  const levels =
    place &&
    lines
      .map((line) => ({ label: line.label, y: heightAt(line, place.x) }))
      .filter((entry): entry is { label: string; y: number } => entry.y !== null)
      .sort((one, other) => one.y - other.y)
      .slice(0, 4)
      .map(({ label, y }) => `${spokenTerm(label)} at ${said(y)}`);
  return [
    `${lines.length} levels against ${xName}`,
    ...changes,
    ...(place && levels ? [`${place.name} at ${said(place.x)}: ${levels.join(', ')}`] : []),
  ].join('; ');
}
