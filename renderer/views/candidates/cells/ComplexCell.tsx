import { complexFormula } from '../../../../core/library/complexFormula';
import { defaultLibrary } from '../../../../core/library/parameterLibrary';
import { linkTo } from '../../../app/router/RouterContext';
import { Formula } from '../../../parts';
import type { TableRow } from '../tableRow';

/** Formula as the way to the sheet, with isomer, geometry where it is not octahedral, name and tags. */
export function ComplexCell({ row }: { readonly row: TableRow }) {
  const { candidate, summary } = row;
  const { composition, name, tags, archived } = candidate;
  const formula = summary?.ok ? summary.formula : complexFormula(composition, defaultLibrary);
  const notes = [
    composition.isomer,
    composition.geometry === 'octahedral' ? null : composition.geometry.replaceAll('-', ' '),
    name === '' ? null : name,
    archived ? 'archived' : null,
  ].filter(Boolean);
  return (
    <span className="cell-complex">
      <a href={linkTo({ view: 'sheet', project: candidate.projectId, item: candidate.id })} tabIndex={-1}>
        <Formula formula={formula} />
      </a>
      <span className="cell-complex-notes">
        {summary?.ok === false && <strong className="cell-refused">needs a correction</strong>}
        {notes.join(', ')}
        {tags.map((tag) => (
          <span key={tag} className="badge">
            {tag}
          </span>
        ))}
      </span>
    </span>
  );
}
