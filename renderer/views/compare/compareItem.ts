import type { ParameterLibrary } from '../../../core/library/parameterLibrary';
import { geometryIds, type Composition, type GeometryId } from '../../../core/record/composition';

/** As many complexes stand side by side; more can only be put on an order list. */
export const comparedAtMost = 6;

/** Part of the address that names complexes: ids of candidates, or complexes by their canonical names. */
export const compareItem = (names: readonly string[]): string => names.join('|');

export const namesIn = (item: string | null): readonly string[] =>
  item === null || item === '' ? [] : item.split('|');

/** The complex that a canonical name (`Cr3+;octahedral;cl*2,en*2;cis`) stands for; null where it makes no sense. */
export function compositionOf(name: string, library: ParameterLibrary): Composition | null {
  const [ion, geometry, set, isomer] = name.split(';');
  const metal = library.ions.get(ion ?? '');
  if (metal === undefined || !(geometryIds as readonly string[]).includes(geometry ?? '')) return null;
  const ligands = (set ?? '').split(',').map((each): [string, number] => {
    const [id, count] = each.split('*');
    return [id ?? '', Number(count)];
  });
  const known = ligands.every(
    ([id, count]) => library.ligands.has(id) && Number.isInteger(count) && count > 0,
  );
  if (!known) return null;
  return {
    metal: metal.symbol,
    oxidationState: metal.oxidationState,
    geometry: geometry as GeometryId,
    ligands: Object.fromEntries(ligands),
    isomer: isomer === undefined || isomer === '' ? null : isomer,
  };
}
