import type { GeometryRecord } from '../../../core/library/geometries';

export function GeometryShelf({ geometries }: { readonly geometries: readonly GeometryRecord[] }) {
  return (
    <div className="shelf-list">
      <table className="plain-table">
        <thead>
          <tr>
            <th scope="col">Geometry</th>
            <th scope="col">Coordination number</th>
            <th scope="col">Point group</th>
            <th scope="col">Inversion centre</th>
          </tr>
        </thead>
        <tbody>
          {geometries.map(({ id, name, coordinationNumber, pointGroup, centrosymmetric }) => (
            <tr key={id}>
              <th scope="row">{name}</th>
              <td>{coordinationNumber}</td>
              <td>
                {pointGroup[0]}
                <sub>{pointGroup.slice(1)}</sub>
              </td>
              <td>{centrosymmetric ? 'yes: d–d bands are weak' : 'no: d–d bands gain strength'}</td>
            </tr>
          ))}
        </tbody>
      </table>
      <p className="soft small">
        Ideal polyhedra with like ligands; IUPAC Nomenclature of Inorganic Chemistry, Recommendations 2005,
        table IR-9.2.
      </p>
    </div>
  );
}
