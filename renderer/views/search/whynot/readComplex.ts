import type { Problem } from '../../../../core/errors';
import type { Checked } from '../../../../core/errors';
import type { ParameterLibrary } from '../../../../core/library/parameterLibrary';
import { geometryIds, type Composition, type GeometryId } from '../../../../core/record/composition';

const usualGeometry: Readonly<Record<number, GeometryId>> = {
  2: 'linear',
  3: 'trigonal-planar',
  4: 'tetrahedral',
  5: 'square-pyramidal',
  6: 'octahedral',
  8: 'square-antiprismatic',
};

const refused = (message: string, remedy: string): { ok: false; problems: Problem[] } => ({
  ok: false,
  problems: [{ code: 'unknown-field-value', message, field: '', remedy }],
});

/** Lower case, without what people set differently: `[Fe(bipy)3]` is not read, `fe2+ 3 bipy` is. */
const plain = (text: string): string => text.toLowerCase().replace(/[^a-z0-9]/g, '');

/**
 * A complex as one types it: ion, then how many of which ligand, then geometry and isomer where they matter:
 * `Fe2+ 3 bipy`, `Co3+ 2 en 2 Cl cis`, `Ni2+ 4 CN square-planar`. Without a geometry the usual one for the number of
 * filled places is taken.
 */
export function readComplex(text: string, library: ParameterLibrary): Checked<Composition> {
  const words = text.trim().replace(/,/g, ' ').split(/\s+/).filter(Boolean);
  const ion = [...library.ions.values()].find((each) => each.ion.toLowerCase() === words[0]?.toLowerCase());
  if (ion === undefined) {
    return refused(
      `“${words[0] ?? ''}” is not an ion of the library`,
      'begin with an ion, as in Fe2+ 3 bipy',
    );
  }
  const ligands: Record<string, number> = {};
  let places = 0;
  let geometry: GeometryId | null = null;
  let isomer: string | null = null;
  let count = 1;
  for (const word of words.slice(1)) {
    if (/^\d+$/.test(word)) {
      count = Number(word);
      continue;
    }
    const ligand = [...library.ligands.values()].find((each) =>
      [each.id, each.abbreviation, each.commonName].some((name) => plain(name) === plain(word)),
    );
    const named = geometryIds.find((id) => id === word.toLowerCase());
    if (ligand !== undefined) {
      ligands[ligand.id] = (ligands[ligand.id] ?? 0) + count;
      places += count * ligand.denticity;
      count = 1;
    } else if (named !== undefined) geometry = named;
    else if (['cis', 'trans', 'fac', 'mer'].includes(word.toLowerCase())) isomer = word.toLowerCase();
    else {
      return refused(
        `“${word}” is neither a ligand of the library nor a geometry or isomer`,
        'write ligands as the library abbreviates them, as in Co3+ 2 en 2 Cl cis',
      );
    }
  }
  if (places === 0) return refused('no ligand is named', 'name the ligands, as in Fe2+ 3 bipy');
  const usual = geometry ?? usualGeometry[places];
  if (usual === undefined) {
    return refused(
      `${places} places are filled: no geometry has as many`,
      'change the numbers of the ligands',
    );
  }
  return {
    ok: true,
    value: { metal: ion.symbol, oxidationState: ion.oxidationState, geometry: usual, ligands, isomer },
  };
}
