import { useMemo } from 'react';
import { findMetal } from '../../../core/library/elements';
import type { IonRecord } from '../../../core/library/ions';
import type { ParameterLibrary } from '../../../core/library/parameterLibrary';
import { linkTo } from '../../app/router/RouterContext';
import { EmptyState, Formula } from '../../parts';
import { IonEntry } from './IonEntry';
import { CellNumber } from './ValueWithSource';

interface ShelfProps {
  readonly library: ParameterLibrary;
  readonly query: string;
  readonly entry: string | null;
}

const textOf = (ion: IonRecord): string =>
  `${ion.ion} ${ion.symbol} ${findMetal(ion.symbol)?.name ?? ''} d${ion.dElectrons} ${ion.period}`.toLowerCase();

export function IonShelf({ library, query, entry }: ShelfProps) {
  const found = useMemo(() => {
    const words = query.toLowerCase().split(/\s+/).filter(Boolean);
    const all = [...library.ions.values()];
    return words.length === 0 ? all : all.filter((ion) => words.every((word) => textOf(ion).includes(word)));
  }, [library, query]);
  const open = entry === null ? undefined : library.ions.get(entry);
  return (
    <div className="shelf" data-open={open !== undefined || undefined}>
      <div className="shelf-list">
        {found.length === 0 ? (
          <EmptyState title="No ion matches">Try a symbol, a name, “d3” or “4d”.</EmptyState>
        ) : (
          <IonTable ions={found} openIon={open?.ion ?? null} />
        )}
      </div>
      {open && <IonEntry ion={open} />}
    </div>
  );
}

const columns = [
  ['g', 'cm⁻¹; 10Dq of a complex is f of the ligand times g', 'g'],
  ['B₀', 'cm⁻¹; Racah B of the free ion', 'B0'],
  ['C₀', 'cm⁻¹; Racah C of the free ion', 'C0'],
  ['k', 'nephelauxetic effect of the ion', 'k'],
  ['ζ₀', 'cm⁻¹; spin-orbit parameter of one electron in the free ion', 'zeta0'],
] as const;

function IonTable({
  ions,
  openIon,
}: {
  readonly ions: readonly IonRecord[];
  readonly openIon: string | null;
}) {
  return (
    <table className="plain-table">
      <thead>
        <tr>
          <th scope="col">Ion</th>
          <th scope="col">d electrons</th>
          {columns.map(([name, meaning]) => (
            <th key={name} scope="col" className="number">
              <abbr title={meaning}>{name}</abbr>
            </th>
          ))}
        </tr>
      </thead>
      <tbody>
        {ions.map((ion) => (
          <tr key={ion.ion} data-open={ion.ion === openIon || undefined}>
            <th scope="row">
              <a href={linkTo({ view: 'library', item: `ion.${ion.ion}` })}>
                <Formula formula={`${ion.symbol}^${ion.oxidationState}+`} />
              </a>{' '}
              <span className="soft">{findMetal(ion.symbol)?.name}</span>
            </th>
            <td>
              d<sup>{ion.dElectrons}</sup>, {ion.period}
            </td>
            {columns.map(([name, , quantity]) => (
              <td key={name} className="number">
                <CellNumber value={ion[quantity]} />
              </td>
            ))}
          </tr>
        ))}
      </tbody>
    </table>
  );
}
