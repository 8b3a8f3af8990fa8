import { shapeKey } from '../../geometry/ligandSites';
import type { LigandRecord } from '../../library';
import type { Wish } from '../wish/wish';
import type { LigandShape } from './pattern';

/** The ligands that a wish admits, sorted by id; a candidate refers to them by position. */
export interface LigandPool {
  readonly ligands: readonly LigandRecord[];
  readonly shapes: readonly LigandShape[];
  /** Key of a shape to positions in `ligands`, ascending. */
  readonly byShape: ReadonlyMap<string, Int32Array>;
}

export function poolOf(ligands: readonly LigandRecord[]): LigandPool {
  // Plain code-unit order, the same on every machine and in every language.
  const sorted = [...ligands].sort((a, b) => (a.id < b.id ? -1 : a.id > b.id ? 1 : 0));
  const keys = sorted.map(shapeKey);
  const shapes = [...new Set(keys)].map((key) => ({ key, denticity: sorted[keys.indexOf(key)]!.denticity }));
  const byShape = new Map(
    shapes.map(({ key }) => [
      key,
      Int32Array.from(keys.flatMap((each, position) => (each === key ? [position] : []))),
    ]),
  );
  return { ligands: sorted, shapes, byShape };
}

/** Elements a ligand brings, from its donors and its formula. */
export const elementsOf = (ligand: LigandRecord): ReadonlySet<string> =>
  new Set([...ligand.donorAtoms, ...(ligand.formula.match(/[A-Z][a-z]?/g) ?? [])]);

/** Ligands of the library that pass every condition of the wish on a single ligand. */
export function admittedLigands(wish: Wish, all: Iterable<LigandRecord>): LigandRecord[] {
  const { allow, exclude, donorAtoms, denticities, shelf, onlyShelf } = wish.ligands;
  const allowed = allow === 'all' ? null : new Set(allow);
  const excluded = new Set(exclude);
  const onShelf = new Set(shelf ?? []);
  const elements = wish.exclude?.elements ?? [];
  const hazards = new Set(wish.exclude?.hazards ?? []);
  return [...all].filter((ligand) => {
    if (allowed !== null && !allowed.has(ligand.id)) return false;
    if (excluded.has(ligand.id)) return false;
    if (onlyShelf === true && !onShelf.has(ligand.id)) return false;
    if (donorAtoms !== undefined && !ligand.donorAtoms.every((atom) => donorAtoms.includes(atom)))
      return false;
    if (denticities !== undefined && !denticities.includes(ligand.denticity)) return false;
    if (elements.length > 0) {
      const contained = elementsOf(ligand);
      if (elements.some((element) => contained.has(element))) return false;
    }
    return !ligand.hazards.some((hazard) => hazard.ghs.some((code) => hazards.has(code)));
  });
}
