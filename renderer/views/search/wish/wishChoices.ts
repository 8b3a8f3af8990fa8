import type { ParameterLibrary } from '../../../../core/library/parameterLibrary';
import { elementsOf } from '../../../../core/search/space/ligandPool';

export interface Choice {
  readonly id: string;
  readonly label: string;
  readonly detail?: string;
}

export interface WishChoices {
  readonly ions: readonly Choice[];
  readonly ligands: readonly Choice[];
  readonly donors: readonly string[];
  readonly denticities: readonly number[];
  readonly elements: readonly Choice[];
  readonly hazards: readonly Choice[];
  /** 3d ions whose strength is in the tables. */
  readonly knownIons: readonly string[];
  /** Ligands whose strength is in the tables. */
  readonly knownLigands: readonly string[];
}

const few = (names: readonly string[]): string =>
  names.length <= 4 ? names.join(', ') : `${names.slice(0, 3).join(', ')} and ${names.length - 3} more`;

function gathered<T>(pairs: readonly (readonly [key: string, value: T])[]): [string, T[]][] {
  const found = new Map<string, T[]>();
  for (const [key, value] of pairs) found.set(key, [...(found.get(key) ?? []), value]);
  return [...found].sort(([one], [other]) => (one < other ? -1 : 1));
}

/** What a form of a wish offers, from the library. */
export function wishChoices(library: ParameterLibrary): WishChoices {
  const ions = [...library.ions.values()];
  const ligands = [...library.ligands.values()];
  const open = ions.filter(({ dElectrons }) => dElectrons > 0 && dElectrons < 10);
  return {
    ions: open.map(({ ion, dElectrons, period }) => ({
      id: ion,
      label: ion,
      detail: `d${dElectrons}, ${period}`,
    })),
    ligands: ligands.map(({ id, abbreviation, commonName }) => ({
      id,
      label: abbreviation,
      detail: commonName,
    })),
    donors: [...new Set(ligands.flatMap(({ donorAtoms }) => donorAtoms))].sort(),
    denticities: [...new Set(ligands.map(({ denticity }) => denticity))].sort((a, b) => a - b),
    elements: gathered([
      ...open.map(({ symbol, ion }) => [symbol, ion] as const),
      ...ligands.flatMap((ligand) =>
        [...elementsOf(ligand)].map((element) => [element, ligand.abbreviation] as const),
      ),
    ]).map(([id, names]) => ({ id, label: id, detail: few(names) })),
    hazards: gathered(
      ligands.flatMap(({ hazards, abbreviation }) =>
        [...new Set(hazards.flatMap(({ ghs }) => ghs))].map((code) => [code, abbreviation] as const),
      ),
    ).map(([id, names]) => ({ id, label: id, detail: few(names) })),
    knownIons: open.filter(({ period, g }) => period === '3d' && g.value !== null).map(({ ion }) => ion),
    knownLigands: ligands.filter(({ f }) => f.value !== null).map(({ id }) => id),
  };
}
