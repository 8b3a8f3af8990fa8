/** How a stored value was come by: read on a page that cites the source, recalled from the source, or chosen here. */
export type SourceStatus = 'page' | 'memory' | 'own';

/** A disagreeing figure, kept beside the one in use. */
export interface AlternativeValue {
  readonly value: number;
  readonly source: string;
  readonly status: SourceStatus | null;
}

/** A number with where it comes from. `value` is null where nobody has published one: it is never made up. */
export interface SourcedValue {
  readonly value: number | null;
  readonly source: string | null;
  readonly status: SourceStatus | null;
  /** Lowest to highest of the figures in print, or the width thought plausible; not a standard deviation. */
  readonly range: readonly [number, number] | null;
  readonly confidence: 'high' | 'medium' | 'low' | null;
  readonly note: string | null;
  readonly alternatives: readonly AlternativeValue[];
  /** Standard deviation, where a parameter set states one. */
  readonly sigma: number | null;
}

/** A sourced value as the data files spell it; anything may be missing. */
export interface RawSourced {
  value?: number | null;
  source?: string | null;
  status?: string | null;
  range?: number[] | null;
  confidence?: string | null;
  note?: string | null;
  alternatives?: { value?: number | null; source?: string | null; status?: string | null }[];
}

export const unknownValue: SourcedValue = Object.freeze({
  value: null,
  source: null,
  status: null,
  range: null,
  confidence: null,
  note: null,
  alternatives: [],
  sigma: null,
});

const statusOf = (text: string | null | undefined): SourceStatus | null =>
  text === 'page' || text === 'memory' || text === 'own' ? text : null;

/** Normalises a raw entry: every field present, absence spelled `null`. */
export function sourced(raw: RawSourced | null | undefined): SourcedValue {
  if (raw == null) return unknownValue;
  const range = raw.range ?? null;
  const confidence = raw.confidence ?? null;
  return {
    value: raw.value ?? null,
    source: raw.source ?? null,
    status: statusOf(raw.status),
    range: range !== null && range.length === 2 ? [range[0]!, range[1]!] : null,
    confidence: confidence === 'high' || confidence === 'medium' || confidence === 'low' ? confidence : null,
    note: raw.note ?? null,
    alternatives: (raw.alternatives ?? []).flatMap(({ value, source, status }) =>
      value == null ? [] : [{ value, source: source ?? 'no source', status: statusOf(status) }],
    ),
    sigma: null,
  };
}
