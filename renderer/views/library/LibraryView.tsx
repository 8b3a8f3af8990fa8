import { useState } from 'react';
import { linkTo, useRouter } from '../../app/router/RouterContext';
import { useLibrary } from '../../app/session/useLibrary';
import { ViewHeader } from '../../app/shell/ViewHeader';
import { GeometryShelf } from './GeometryShelf';
import { IonShelf } from './IonShelf';
import { LigandShelf } from './LigandShelf';
import { formatPlace, parsePlace, type Shelf, shelves } from './libraryPlace';
import { SeriesShelf } from './SeriesShelf';
import './LibraryView.css';

const titles: Record<Shelf, string> = {
  ligands: 'Ligands',
  ions: 'Metal ions',
  geometries: 'Geometries',
  series: 'Series in print',
};

export default function LibraryView() {
  const { address } = useRouter();
  const library = useLibrary();
  const place = parsePlace(address.item);
  const [query, setQuery] = useState('');
  const searchable = place.shelf === 'ligands' || place.shelf === 'ions';
  return (
    <>
      <ViewHeader
        title="Library"
        summary={`${library.ligands.size} ligands and ${library.ions.size} ions. What nobody has published is shown as unknown, never filled in.`}
      />
      <div className="library-bar">
        <nav aria-label="Parts of the library" className="shelf-tabs">
          {shelves.map((shelf) => (
            <a
              key={shelf}
              href={linkTo({ view: 'library', item: formatPlace({ shelf, entry: null }) })}
              aria-current={shelf === place.shelf ? 'page' : undefined}
            >
              {titles[shelf]}
            </a>
          ))}
        </nav>
        {searchable && (
          <input
            type="search"
            aria-label={`Find among the ${titles[place.shelf].toLowerCase()}`}
            placeholder={place.shelf === 'ligands' ? 'amine, N donor, bpy …' : 'chromium, d3, 3d …'}
            value={query}
            onChange={(event) => setQuery(event.currentTarget.value)}
          />
        )}
      </div>
      {place.shelf === 'ligands' && <LigandShelf library={library} query={query} entry={place.entry} />}
      {place.shelf === 'ions' && <IonShelf library={library} query={query} entry={place.entry} />}
      {place.shelf === 'geometries' && <GeometryShelf geometries={library.geometries} />}
      {place.shelf === 'series' && <SeriesShelf library={library} />}
    </>
  );
}
