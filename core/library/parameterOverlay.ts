import type { KnownComplex, ParameterLibrary } from './parameterLibrary';
import type { IonRecord } from './ions';
import type { Anchor, LigandRecord } from './ligands';
import type { SourcedValue } from './sourced';

/** The part of a stored parameter set that is laid over the library. */
export interface ParameterValues {
  readonly values: Readonly<
    Record<string, { readonly value: number; readonly sigma: number; readonly source: string }>
  >;
}

type OwnValue = ParameterValues['values'][string];

const own = ({ value, sigma, source }: OwnValue, before: SourcedValue | undefined): SourcedValue => ({
  value,
  source,
  status: 'own',
  range: null,
  confidence: null,
  note: before?.value != null ? `replaces ${before.value} (${before.source ?? 'no source'})` : null,
  alternatives: before?.alternatives ?? [],
  sigma,
});

const ionQuantities = ['g', 'k', 'B0', 'C0', 'zeta0'] as const;
const ligandQuantities = ['f', 'h', 'chiOpt'] as const;
const complexQuantities = ['tenDq', 'B', 'C'] as const;
const isOneOf = <T extends string>(names: readonly T[], name: string): name is T =>
  (names as readonly string[]).includes(name);

/** `ion.Cr3+.g`, `ligand.nh3.f`, `anchor.Cr3+.nh3`, `complex.<complexKey>.tenDq` */
function splitKey(key: string): [kind: string, subject: string, quantity: string] | null {
  const first = key.indexOf('.');
  const last = key.lastIndexOf('.');
  if (first <= 0 || last <= first) return null;
  return [key.slice(0, first), key.slice(first + 1, last), key.slice(last + 1)];
}

/**
 * The library with the values of a parameter set in place of its own. Values that name nothing known are returned in
 * `unused` and change nothing.
 */
export function withParameterSet(
  library: ParameterLibrary,
  set: ParameterValues,
): { readonly library: ParameterLibrary; readonly unused: readonly string[] } {
  const ions = new Map<string, IonRecord>(library.ions);
  const ligands = new Map<string, LigandRecord>(library.ligands);
  const complexes = new Map<string, KnownComplex>(library.complexes);
  const unused: string[] = [];
  for (const key of Object.keys(set.values).sort()) {
    const entry = set.values[key]!;
    const parts = splitKey(key);
    const [kind, subject, quantity] = parts ?? ['', '', ''];
    const ion = ions.get(subject);
    const ligand = ligands.get(kind === 'anchor' ? quantity : subject);
    if (kind === 'ion' && ion !== undefined && isOneOf(ionQuantities, quantity)) {
      ions.set(subject, { ...ion, [quantity]: own(entry, ion[quantity]) });
    } else if (kind === 'ligand' && ligand !== undefined && isOneOf(ligandQuantities, quantity)) {
      ligands.set(subject, { ...ligand, [quantity]: own(entry, ligand[quantity]) });
    } else if (kind === 'anchor' && ligand !== undefined) {
      const anchor: Anchor = {
        metal: subject,
        complex: `${subject} with ${ligand.abbreviation}`,
        tenDq: entry.value,
        spin: null,
        geometry: null,
        range: [entry.value - entry.sigma, entry.value + entry.sigma],
        source: entry.source,
        status: 'own',
        confidence: 'high',
        note: null,
      };
      const others = ligand.anchors.filter(({ metal }) => metal !== subject);
      ligands.set(ligand.id, { ...ligand, anchors: [anchor, ...others] });
    } else if (kind === 'complex' && isOneOf(complexQuantities, quantity)) {
      const known = complexes.get(subject) ?? {};
      complexes.set(subject, { ...known, [quantity]: own(entry, known[quantity]) });
    } else {
      unused.push(key);
    }
  }
  return { library: { ...library, ions, ligands, complexes }, unused };
}
