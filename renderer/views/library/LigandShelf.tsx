import { useMemo } from 'react';
import type { LigandRecord } from '../../../core/library/ligands';
import { withoutCharge } from '../../../core/library/molarMass';
import type { ParameterLibrary } from '../../../core/library/parameterLibrary';
import { linkTo } from '../../app/router/RouterContext';
import { EmptyState, Formula } from '../../parts';
import { LigandEntry } from './LigandEntry';
import { CellNumber } from './ValueWithSource';

interface ShelfProps {
  readonly library: ParameterLibrary;
  readonly query: string;
  readonly entry: string | null;
}

const textOf = (ligand: LigandRecord): string =>
  [
    ...[
      ligand.abbreviation,
      ligand.commonName,
      ligand.iupacName,
      ligand.formula,
      ligand.class,
      ligand.piCharacter,
    ],
    ...ligand.donorAtoms.map((atom) => `${atom} donor`),
  ]
    .join(' ')
    .toLowerCase();

export function LigandShelf({ library, query, entry }: ShelfProps) {
  const found = useMemo(() => {
    const words = query.toLowerCase().split(/\s+/).filter(Boolean);
    const all = [...library.ligands.values()];
    return words.length === 0
      ? all
      : all.filter((ligand) => words.every((word) => textOf(ligand).includes(word)));
  }, [library, query]);
  const open = entry === null ? undefined : library.ligands.get(entry);
  return (
    <div className="shelf" data-open={open !== undefined || undefined}>
      <div className="shelf-list">
        {found.length === 0 ? (
          <EmptyState title="No ligand matches">
            Try a donor atom (“N donor”), a class or part of a name.
          </EmptyState>
        ) : (
          <LigandTable ligands={found} openId={open?.id ?? null} />
        )}
      </div>
      {open && <LigandEntry ligand={open} />}
    </div>
  );
}

function LigandTable({
  ligands,
  openId,
}: {
  readonly ligands: readonly LigandRecord[];
  readonly openId: string | null;
}) {
  return (
    <table className="plain-table">
      <thead>
        <tr>
          <th scope="col">Ligand</th>
          <th scope="col">Formula</th>
          <th scope="col">Donors</th>
          <th scope="col" className="number">
            <abbr title="10Dq relative to water">f</abbr>
          </th>
          <th scope="col" className="number">
            <abbr title="nephelauxetic effect relative to water">h</abbr>
          </th>
          <th scope="col" className="number">
            <abbr title="optical electronegativity">χ opt</abbr>
          </th>
        </tr>
      </thead>
      <tbody>
        {ligands.map((ligand) => (
          <tr key={ligand.id} data-open={ligand.id === openId || undefined}>
            <th scope="row">
              <a href={linkTo({ view: 'library', item: `ligand.${ligand.id}` })}>{ligand.abbreviation}</a>{' '}
              <span className="soft">{ligand.commonName}</span>
            </th>
            <td>
              <Formula formula={chargeMarked(ligand)} />
            </td>
            <td>{ligand.donorAtoms.join(', ')}</td>
            <td className="number">
              <CellNumber value={ligand.f} />
            </td>
            <td className="number">
              <CellNumber value={ligand.h} />
            </td>
            <td className="number">
              <CellNumber value={ligand.chiOpt} />
            </td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}

/** `N3-` as the formula setter wants it: `N3^-`, since the 3 counts atoms. */
function chargeMarked({ formula, charge }: LigandRecord): string {
  if (charge === 0) return formula;
  const size = Math.abs(charge) === 1 ? '' : Math.abs(charge);
  return `${withoutCharge(formula, charge)}^${size}${charge > 0 ? '+' : '-'}`;
}
