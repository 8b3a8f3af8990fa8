import { colourDifference } from '../../../core/colour';
import type { Candidate } from '../../../core/record/project';
import type { CandidateSummary } from '../../workers/estimateSummary';
import type { TableRow } from './tableRow';

/** Makes rows of candidates and estimates; a row keeps its identity as long as nothing in it changed. */
export class RowAssembler {
  #known = new Map<string, TableRow>();

  assemble(
    candidates: readonly Candidate[],
    summaryOf: (id: string) => CandidateSummary | undefined,
    target: readonly [number, number, number] | null,
  ): readonly TableRow[] {
    const rows = new Map<string, TableRow>();
    for (const candidate of candidates) {
      const summary = summaryOf(candidate.id);
      const lab = summary?.ok ? summary.colour?.lab : undefined;
      const distance = target && lab ? colourDifference(lab, target) : null;
      const same = this.#known.get(candidate.id);
      const keep = same?.candidate === candidate && same.summary === summary && same.distance === distance;
      rows.set(candidate.id, keep ? same : { candidate, summary, distance });
    }
    this.#known = rows;
    return [...rows.values()];
  }
}
