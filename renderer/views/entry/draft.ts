import { z } from 'zod';
import { type ParameterLibrary, findIon } from '../../../core/library/parameterLibrary';
import { dElectronCount, findMetal } from '../../../core/library/elements';
import { geometryIds, type Composition, type GeometryId } from '../../../core/record/composition';
import type { Candidate } from '../../../core/record/project';

/** A candidate while it is being put together: any part may still be missing. */
export const draftSchema = z.object({
  metal: z.string().nullable(),
  oxidationState: z.number().nullable(),
  geometry: z.enum(geometryIds),
  ligands: z.record(z.string(), z.int().positive()),
  isomer: z.string().nullable(),
  name: z.string(),
  counterIon: z.string(),
  solvate: z.string(),
  concentration_mM: z.number().positive().nullable(),
  path_cm: z.number().positive().nullable(),
  tags: z.string(),
  notes: z.string(),
});
export type Draft = z.infer<typeof draftSchema>;

export const emptyDraft: Draft = {
  metal: null,
  oxidationState: null,
  geometry: 'octahedral',
  ligands: {},
  isomer: null,
  name: '',
  counterIon: '',
  solvate: '',
  concentration_mM: null,
  path_cm: null,
  tags: '',
  notes: '',
};

export const draftOf = (candidate: Candidate): Draft => ({
  ...candidate.composition,
  isomer: candidate.composition.isomer ?? null,
  name: candidate.name,
  counterIon: candidate.counterIon ?? '',
  solvate: candidate.solvate ?? '',
  concentration_mM: candidate.concentration_mM,
  path_cm: candidate.path_cm,
  tags: candidate.tags.join(', '),
  notes: candidate.notes,
});

/** What was chosen so far, if it is enough to ask about. */
export function compositionOf(draft: Draft): Composition | null {
  const { metal, oxidationState, geometry, ligands, isomer } = draft;
  if (metal === null || oxidationState === null || Object.keys(ligands).length === 0) return null;
  return { metal, oxidationState, geometry, ligands, isomer };
}

/** Words apart by commas or spaces with a leading `#`. */
export const tagsOf = (text: string): string[] => [
  ...new Set(
    text
      .split(/[,;]|\s+(?=#)/)
      .map((tag) => tag.trim().replace(/^#/, '').slice(0, 50))
      .filter(Boolean),
  ),
];

export function fieldsOf(draft: Draft) {
  const orNull = (text: string): string | null => (text.trim() === '' ? null : text.trim().slice(0, 100));
  return {
    name: draft.name.trim().slice(0, 200),
    counterIon: orNull(draft.counterIon),
    solvate: orNull(draft.solvate),
    concentration_mM: draft.concentration_mM,
    path_cm: draft.path_cm,
    tags: tagsOf(draft.tags).slice(0, 50),
    notes: draft.notes.slice(0, 100_000),
  };
}

/** Oxidation states in which the metal can exist, lowest first. */
export function possibleStates(symbol: string): readonly number[] {
  const metal = findMetal(symbol);
  if (!metal) return [];
  const [low, high] = metal.oxidationStates;
  return Array.from({ length: high - low + 1 }, (_, step) => low + step).filter((state) => {
    const d = dElectronCount(metal, state);
    return d >= 0 && d <= 10;
  });
}

/** The state to begin with: one whose field strength is tabulated, the lower of two, else the commonest ones. */
export function likelyState(symbol: string, library: ParameterLibrary): number | null {
  const states = possibleStates(symbol);
  const tabulated = states.filter((state) => findIon(library, symbol, state)?.g.value != null);
  return (
    tabulated.find((state) => state >= 2) ??
    [3, 2, 1, 4].find((state) => states.includes(state)) ??
    states.at(-1) ??
    null
  );
}

export const withMetal = (draft: Draft, metal: string, library: ParameterLibrary): Draft => {
  const keeps = draft.oxidationState !== null && possibleStates(metal).includes(draft.oxidationState);
  return { ...draft, metal, oxidationState: keeps ? draft.oxidationState : likelyState(metal, library) };
};

export const withGeometry = (draft: Draft, geometry: GeometryId): Draft => ({
  ...draft,
  geometry,
  isomer: null,
});

/** Changes how many of a ligand there are; none takes it out. */
export function withCount(draft: Draft, ligand: string, count: number): Draft {
  const { [ligand]: _, ...others } = draft.ligands;
  const ligands = count > 0 ? { ...draft.ligands, [ligand]: count } : others;
  return { ...draft, ligands, isomer: null };
}

/** Coordination places taken by the ligands. */
export const placesTaken = (ligands: Draft['ligands'], library: ParameterLibrary): number =>
  Object.entries(ligands).reduce(
    (sum, [id, count]) => sum + (library.ligands.get(id)?.denticity ?? 1) * count,
    0,
  );
