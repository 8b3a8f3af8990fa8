import type { Condition, FilterTerm } from './condition';
import type { TableRow } from '../tableRow';

/** Text that words are looked for in, built once per row. */
const texts = new WeakMap<TableRow, string>();

function textOf(row: TableRow): string {
  let text = texts.get(row);
  if (text === undefined) {
    const { candidate, summary } = row;
    const estimate = summary?.ok ? [summary.formula, summary.colour?.words ?? '', summary.spin.words] : [];
    text = [
      ...estimate,
      candidate.name,
      candidate.composition.isomer ?? '',
      candidate.tags.join(' '),
      candidate.notes,
    ]
      .join(' ')
      .toLowerCase();
    texts.set(row, text);
  }
  return text;
}

const within = (value: number | null | undefined, from: number, to: number): boolean =>
  value !== null && value !== undefined && value >= from && value <= to;

function quantityOf({ summary, distance }: TableRow, name: Extract<Condition, { kind: 'quantity' }>['name']) {
  if (name === 'distance') return distance;
  if (!summary?.ok) return null;
  if (name === '10Dq') return summary.tenDq?.value;
  return name === 'B' ? summary.racahB?.value : summary.spin.unpairedElectrons;
}

function holds(condition: Condition, row: TableRow): boolean {
  const { candidate, summary } = row;
  const { composition } = candidate;
  switch (condition.kind) {
    case 'ion':
      return (
        composition.metal === condition.metal &&
        (condition.oxidationState === null || composition.oxidationState === condition.oxidationState)
      );
    case 'band':
      return (
        summary?.ok === true &&
        summary.bands.some(
          ({ kind, energy }) => kind === 'spin-allowed' && within(energy, condition.from, condition.to),
        )
      );
    case 'quantity':
      return within(quantityOf(row, condition.name), condition.from, condition.to);
    case 'spin':
      if (!summary?.ok) return false;
      return condition.state === 'near' ? summary.spin.nearCrossover : summary.spin.state === condition.state;
    case 'tag':
      return candidate.tags.some((tag) => tag.toLowerCase() === condition.tag.toLowerCase());
    case 'mark':
      if (condition.mark === 'starred') return candidate.starred;
      if (condition.mark === 'archived') return candidate.archived;
      if (condition.mark === 'refused') return summary?.ok === false;
      return summary?.ok === true && summary.flags.some(({ severity }) => severity !== 'note');
    case 'geometry':
      return composition.geometry === condition.id;
    case 'electrons':
      return summary?.ok === true && summary.dElectrons === condition.count;
    case 'ligand':
      return Object.hasOwn(composition.ligands, condition.id);
    case 'words':
      return textOf(row).includes(condition.words);
  }
}

const asksForArchived = ({ anyOf }: FilterTerm): boolean =>
  anyOf.some((condition) => condition.kind === 'mark' && condition.mark === 'archived');

/** A test for rows. Archived candidates are shown only where the filter speaks of them. */
export function rowTest(terms: readonly FilterTerm[]): (row: TableRow) => boolean {
  const hideArchived = !terms.some(asksForArchived);
  return (row) =>
    !(hideArchived && row.candidate.archived) &&
    terms.every(({ negated, anyOf }) => anyOf.some((condition) => holds(condition, row)) !== negated);
}
