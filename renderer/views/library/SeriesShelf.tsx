import type { ParameterLibrary } from '../../../core/library/parameterLibrary';
import type { Series } from '../../../core/library/series';
import { SourceNote, type SourceStatus } from '../../parts';

/** Orders of ligands and ions in print: all that is known where no number is. */
export function SeriesShelf({ library }: { readonly library: ParameterLibrary }) {
  const nameOf = (id: string): string => library.ligands.get(id)?.abbreviation ?? id;
  return (
    <div className="stack">
      <h2>Spectrochemical: weak field to strong</h2>
      {library.series.spectrochemical.map((series) => (
        <SeriesLine key={series.name} series={series} nameOf={nameOf} />
      ))}
      <h2>Nephelauxetic: B little lowered to much</h2>
      {library.series.nephelauxetic.map((series) => (
        <SeriesLine key={series.name} series={series} nameOf={nameOf} />
      ))}
    </div>
  );
}

function SeriesLine({
  series,
  nameOf,
}: {
  readonly series: Series;
  readonly nameOf: (id: string) => string;
}) {
  const status =
    (['page', 'memory'] as const).find((known) => known === series.status) ?? ('unknown' as SourceStatus);
  return (
    <section className="panel">
      <h3>{series.name}</h3>
      <p className="figures">{series.places.map((ids) => ids.map(nameOf).join(' ≈ ')).join(' < ')}</p>
      <SourceNote source={series.source} status={status} />
    </section>
  );
}
