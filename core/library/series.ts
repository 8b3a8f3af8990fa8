import seriesFile from './data/series.json';

/** An order of ligands (or ions) in print; ids that share an inner list share a place. */
export interface Series {
  readonly name: string;
  /** Weakest field, or smallest nephelauxetic effect, first. */
  readonly places: readonly (readonly string[])[];
  readonly source: string;
  readonly status: string;
}

type RawItem = string[] | { id?: string; ion?: string };
interface RawSeries {
  name: string;
  items: RawItem[];
  source: string;
  status: string;
}

const readSeries = ({ name, items, source, status }: RawSeries): Series => ({
  name,
  places: items.map((item) => (Array.isArray(item) ? item : [item.id ?? item.ion ?? ''])),
  source,
  status,
});

export const spectrochemicalSeries: readonly Series[] = (
  seriesFile.spectrochemical as unknown as RawSeries[]
).map(readSeries);
export const nephelauxeticSeries: readonly Series[] = (
  seriesFile.nephelauxetic as unknown as RawSeries[]
).map(readSeries);
