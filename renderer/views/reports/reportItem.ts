/** The pages that can be handed over. */
export const reportKinds = [
  { id: 'card', label: 'Candidate card', most: 1 },
  { id: 'comparison', label: 'Comparison sheet', most: 6 },
  { id: 'record', label: 'Record page', most: 1 },
  { id: 'agreement', label: 'Agreement report', most: 0 },
  { id: 'order', label: 'Order list', most: 12 },
] as const;
export type ReportKind = (typeof reportKinds)[number]['id'];

/** What a report is about: its kind and ids of candidates (or canonical names of complexes), in order. */
export interface ReportItem {
  readonly kind: ReportKind;
  readonly names: readonly string[];
}

/** Complexes that fit on a page of this kind; 0 where it is about the whole project. */
export const mostOf = (kind: ReportKind): number => reportKinds.find(({ id }) => id === kind)!.most;

/** Part of the address: `card:ID` or `comparison:ID|ID`. */
export const reportItem = ({ kind, names }: ReportItem): string => `${kind}:${names.join('|')}`;

/** What an address asks for; a candidate card where it makes no sense. */
export function readReportItem(item: string | null): ReportItem {
  const [kind, ...rest] = (item ?? '').split(':');
  const known = reportKinds.find(({ id }) => id === kind);
  if (known === undefined) return { kind: 'card', names: [] };
  const names = rest
    .join(':')
    .split('|')
    .filter((name) => name !== '');
  return { kind: known.id, names: names.slice(0, known.most) };
}
