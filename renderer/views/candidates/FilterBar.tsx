import { useMemo } from 'react';
import { type FilterTerm, termWords } from './filter/condition';
import { type Grouping, groupingNames, groupings } from './grouping';
import { type Ranking, rankingNames, rankings, type Sort } from './sorting';
import './FilterBar.css';

interface FilterBarProps {
  readonly text: string;
  readonly onText: (text: string) => void;
  readonly terms: readonly FilterTerm[];
  readonly sort: Sort;
  readonly onSort: (sort: Sort) => void;
  readonly grouping: Grouping;
  readonly onGrouping: (grouping: Grouping) => void;
  readonly hasTarget: boolean;
}

export const filterFieldId = 'candidate-filter';

/** Which rows are shown and in what order, in words. */
export function FilterBar(props: FilterBarProps) {
  const { text, onText, terms, sort, onSort, grouping, onGrouping, hasTarget } = props;
  const offered = useMemo(
    () => rankings.filter((ranking) => ranking !== 'distance' || hasTarget),
    [hasTarget],
  );
  return (
    <div className="filter-bar">
      <div className="filter-bar-field">
        <input
          id={filterFieldId}
          type="search"
          aria-label="Filter the candidates"
          aria-describedby="filter-understood"
          placeholder="Cr(III), 450-520 nm, not low spin, #order"
          spellCheck={false}
          autoComplete="off"
          value={text}
          onChange={(event) => onText(event.currentTarget.value)}
        />
        <FilterHelp onExample={onText} />
      </div>
      <div className="filter-bar-rank">
        <label htmlFor="candidate-rank">Ranked by</label>
        <select
          id="candidate-rank"
          value={sort.by}
          onChange={(event) => onSort({ by: event.currentTarget.value as Ranking, descending: false })}
        >
          {offered.map((ranking) => (
            <option key={ranking} value={ranking}>
              {rankingNames[ranking]}
            </option>
          ))}
        </select>
        <button
          type="button"
          onClick={() => onSort({ ...sort, descending: !sort.descending })}
          aria-label={sort.descending ? 'Largest first; turn round' : 'Smallest first; turn round'}
          title={sort.descending ? 'Largest first' : 'Smallest first'}
        >
          {sort.descending ? '▼' : '▲'}
        </button>
        <label htmlFor="candidate-group">Grouped by</label>
        <select
          id="candidate-group"
          value={grouping}
          onChange={(event) => onGrouping(event.currentTarget.value as Grouping)}
        >
          {groupings.map((each) => (
            <option key={each} value={each}>
              {groupingNames[each]}
            </option>
          ))}
        </select>
      </div>
      <p id="filter-understood" className="filter-understood" role="status">
        {terms.length > 0 && `Shown: ${terms.map(termWords).join('; ')}`}
      </p>
    </div>
  );
}

const examples: readonly (readonly [text: string, meaning: string])[] = [
  ['Cr(III), 450-520 nm', 'chromium(III) with a spin-allowed band in the window'],
  ['Fe or Co, not low spin', 'either metal, low spin left out'],
  ['10Dq > 18000, tetrahedral or octahedral', 'field strength and geometry'],
  ['en or bpy, starred', 'with one of these ligands, and starred'],
  ['near crossover', 'spin state that cannot be told'],
  ['violet, #order', 'colour words or notes, and a tag'],
  ['archived', 'what was set aside'],
];

function FilterHelp({ onExample }: { readonly onExample: (text: string) => void }) {
  return (
    <details className="filter-help">
      <summary>How to write a filter</summary>
      <div className="filter-help-sheet">
        <p>Terms apart by commas must all hold. “or” joins alternatives, “not” turns a term round.</p>
        <ul>
          {examples.map(([text, meaning]) => (
            <li key={text}>
              <button type="button" className="button-quiet" onClick={() => onExample(text)}>
                {text}
              </button>
              <span className="soft"> {meaning}</span>
            </li>
          ))}
        </ul>
      </div>
    </details>
  );
}
