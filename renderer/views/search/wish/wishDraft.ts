import type { WishInput } from '../../../../core/search';
import { geometryIds, type GeometryId } from '../../../../core/record/composition';

/** A window in nm with the absorptivity that goes with it; empty fields ask for nothing. */
export interface DraftWindow {
  readonly from: number | null;
  readonly to: number | null;
  readonly absorptivity: number | null;
}

export interface DraftRange {
  readonly min: number | null;
  readonly max: number | null;
}

export interface DraftColour {
  readonly lab: readonly [number, number, number];
  /** CIEDE2000 */
  readonly tolerance: number | null;
  readonly concentration_mM: number | null;
  readonly path_cm: number | null;
}

/** The wish as the form holds it: whatever is typed, complete or not. */
export interface WishDraft {
  readonly name: string;
  readonly ions: 'all' | readonly string[];
  readonly withoutElements: readonly string[];
  readonly geometries: 'all' | readonly GeometryId[];
  readonly ligands: 'all' | readonly string[];
  readonly withoutLigands: readonly string[];
  readonly maxKinds: number;
  /** Empty: any. */
  readonly donorAtoms: readonly string[];
  readonly denticities: readonly number[];
  readonly onlyShelf: boolean;
  /** GHS statements that no ligand may carry. */
  readonly withoutHazards: readonly string[];
  readonly charge: DraftRange;
  readonly absorb: readonly DraftWindow[];
  readonly pass: readonly DraftWindow[];
  readonly colour: DraftColour | null;
  readonly spin: 'any' | 'high' | 'low';
  readonly unpaired: DraftRange;
  readonly moment: DraftRange;
  readonly tenDq: DraftRange;
  /** In nm. */
  readonly emission: DraftRange;
}

export const emptyWindow: DraftWindow = { from: null, to: null, absorptivity: null };
export const emptyRange: DraftRange = { min: null, max: null };

export const freshDraft: WishDraft = {
  name: 'Wish',
  ions: ['V3+', 'Cr3+', 'Mn2+', 'Fe2+', 'Fe3+', 'Co3+', 'Ni2+', 'Cu2+'],
  withoutElements: [],
  geometries: ['octahedral'],
  ligands: ['h2o', 'nh3', 'en', 'py', 'bipy', 'ox', 'gly', 'ncs_n', 'cl'],
  withoutLigands: [],
  maxKinds: 2,
  donorAtoms: [],
  denticities: [],
  onlyShelf: false,
  withoutHazards: [],
  charge: emptyRange,
  absorb: [{ from: 540, to: 580, absorptivity: null }],
  pass: [emptyWindow],
  colour: null,
  spin: 'any',
  unpaired: emptyRange,
  moment: emptyRange,
  tenDq: emptyRange,
  emission: emptyRange,
};

/** Ends that an open range is given in the file; those of the wish format. */
const limits = { charge: [-20, 20], unpaired: [0, 5], moment: [0, 20], tenDq: [0, 200_000] } as const;
/** Absorptivity that a window to be let through may keep, L mol⁻¹ cm⁻¹, where nothing is said. */
export const usualClear = 5;

const both = ({ min, max }: DraftRange, [low, high]: readonly [number, number]) =>
  min === null && max === null ? undefined : { min: min ?? low, max: max ?? high };

const complete = (windows: readonly DraftWindow[]) =>
  windows.filter(({ from, to }) => from !== null && to !== null);

const orNothing = <T>(list: readonly T[]): T[] | undefined => (list.length === 0 ? undefined : [...list]);

const colourOf = (colour: DraftColour | null): WishInput['colour'] =>
  colour === null || colour.tolerance === null || colour.concentration_mM === null || colour.path_cm === null
    ? undefined
    : {
        lab: [...colour.lab],
        tolerance: colour.tolerance,
        concentration_mM: colour.concentration_mM,
        path_cm: colour.path_cm,
      };

/** Keys without a value do not stand in a file. */
const withoutGaps = <T extends object>(value: T): T =>
  Object.fromEntries(Object.entries(value).filter(([, each]) => each !== undefined)) as T;

/** The wish that a draft stands for. Half-filled windows ask for nothing yet. */
export function wishOf(draft: WishDraft, shelf: readonly string[]): WishInput {
  const exclude = withoutGaps({
    elements: orNothing(draft.withoutElements),
    hazards: orNothing(draft.withoutHazards),
  });
  return withoutGaps<WishInput>({
    name: draft.name.trim() || 'Wish',
    ions: draft.ions === 'all' ? 'all' : [...draft.ions],
    geometries: draft.geometries === 'all' ? 'all' : [...draft.geometries],
    ligands: withoutGaps({
      allow: draft.ligands === 'all' ? ('all' as const) : [...draft.ligands],
      exclude: orNothing(draft.withoutLigands),
      maxKinds: draft.maxKinds,
      donorAtoms: orNothing(draft.donorAtoms),
      denticities: orNothing(draft.denticities),
      shelf: orNothing(shelf),
      onlyShelf: draft.onlyShelf ? true : undefined,
    }),
    charge: both(draft.charge, limits.charge),
    bands: orNothing(
      complete(draft.absorb).map(({ from, to, absorptivity }) =>
        withoutGaps({ from_nm: from!, to_nm: to!, minMolarAbsorptivity: absorptivity ?? undefined }),
      ),
    ),
    clear: orNothing(
      complete(draft.pass).map(({ from, to, absorptivity }) => ({
        from_nm: from!,
        to_nm: to!,
        maxMolarAbsorptivity: absorptivity ?? usualClear,
      })),
    ),
    colour: colourOf(draft.colour),
    spin: draft.spin === 'any' ? undefined : draft.spin,
    unpaired: both(draft.unpaired, limits.unpaired),
    tenDq_cm1: both(draft.tenDq, limits.tenDq),
    moment_BM: both(draft.moment, limits.moment),
    emission:
      draft.emission.min === null || draft.emission.max === null
        ? undefined
        : { from_nm: draft.emission.min, to_nm: draft.emission.max },
    exclude: Object.keys(exclude).length === 0 ? undefined : exclude,
  });
}

const rangeOf = (range: { min: number; max: number } | undefined, [low, high]: readonly [number, number]) =>
  range === undefined
    ? emptyRange
    : { min: range.min === low ? null : range.min, max: range.max === high ? null : range.max };

/** The form filled in from a wish; the shelf is not part of a form. */
export function draftOf(wish: WishInput): WishDraft {
  const { ligands = {} } = wish;
  const ends = (from_nm: number, to_nm: number, absorptivity: number | undefined): DraftWindow => ({
    from: from_nm,
    to: to_nm,
    absorptivity: absorptivity ?? null,
  });
  return {
    name: wish.name,
    ions: wish.ions ?? 'all',
    withoutElements: wish.exclude?.elements ?? [],
    geometries: wish.geometries ?? ['octahedral', 'tetrahedral'],
    ligands: ligands.allow ?? 'all',
    withoutLigands: ligands.exclude ?? [],
    maxKinds: ligands.maxKinds ?? 2,
    donorAtoms: ligands.donorAtoms ?? [],
    denticities: ligands.denticities ?? [],
    onlyShelf: ligands.onlyShelf ?? false,
    withoutHazards: wish.exclude?.hazards ?? [],
    charge: rangeOf(wish.charge, limits.charge),
    absorb: wish.bands?.map((each) => ends(each.from_nm, each.to_nm, each.minMolarAbsorptivity)) ?? [
      emptyWindow,
    ],
    pass: wish.clear?.map((each) => ends(each.from_nm, each.to_nm, each.maxMolarAbsorptivity)) ?? [
      emptyWindow,
    ],
    colour: wish.colour ?? null,
    spin: wish.spin ?? 'any',
    unpaired: rangeOf(wish.unpaired, limits.unpaired),
    moment: rangeOf(wish.moment_BM, limits.moment),
    tenDq: rangeOf(wish.tenDq_cm1, limits.tenDq),
    emission: { min: wish.emission?.from_nm ?? null, max: wish.emission?.to_nm ?? null },
  };
}

/** Whether the draft wishes anything at all: without that every candidate is as good as the next. */
export function wishesAnything(draft: WishDraft): boolean {
  const { bands, clear, colour, spin, unpaired, moment_BM, tenDq_cm1, emission } = wishOf(draft, []);
  return [bands, clear, colour, spin, unpaired, moment_BM, tenDq_cm1, emission].some(
    (part) => part !== undefined,
  );
}

export const allGeometries: readonly GeometryId[] = geometryIds;
