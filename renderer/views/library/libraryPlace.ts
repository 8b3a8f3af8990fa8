/** What of the library is on screen, as it stands in the address: `ligands`, `ligand.nh3`, `ion.Cr3+`, `geometries`. */
export const shelves = ['ligands', 'ions', 'geometries', 'series'] as const;
export type Shelf = (typeof shelves)[number];

export interface LibraryPlace {
  readonly shelf: Shelf;
  /** Ligand id or ion that is opened. */
  readonly entry: string | null;
}

const shelfOf: Readonly<Record<string, Shelf>> = { ligand: 'ligands', ion: 'ions' };

export function parsePlace(item: string | null): LibraryPlace {
  const [kind = '', ...rest] = (item ?? '').split('.');
  const shelf = shelfOf[kind];
  if (shelf !== undefined && rest.length > 0) return { shelf, entry: rest.join('.') };
  return { shelf: shelves.find((name) => name === kind) ?? 'ligands', entry: null };
}

export const formatPlace = ({ shelf, entry }: LibraryPlace): string =>
  entry === null ? shelf : `${shelf === 'ions' ? 'ion' : 'ligand'}.${entry}`;
