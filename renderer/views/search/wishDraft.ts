import type { WishInput } from '../../../core/search';
import type { GeometryId } from '../../../core/record/composition';

/** A window in nm with the absorptivity that goes with it; empty fields ask for nothing. */
export interface DraftWindow {
  readonly from: number | null;
  readonly to: number | null;
  readonly absorptivity: number | null;
}

/** The wish as the form holds it: whatever is typed, complete or not. */
export interface WishDraft {
  readonly ions: readonly string[];
  readonly ligands: readonly string[];
  readonly geometries: readonly GeometryId[];
  readonly maxKinds: number;
  readonly absorb: DraftWindow;
  readonly pass: DraftWindow;
  readonly spin: 'any' | 'high' | 'low';
  readonly tenDq: { readonly min: number | null; readonly max: number | null };
  readonly charge: { readonly min: number | null; readonly max: number | null };
  /** CIEDE2000 distance to the target colour of the project; null where colour does not count. */
  readonly colourTolerance: number | null;
}

const emptyWindow: DraftWindow = { from: null, to: null, absorptivity: null };

export const freshDraft: WishDraft = {
  ions: ['V3+', 'Cr3+', 'Mn2+', 'Fe2+', 'Fe3+', 'Co3+', 'Ni2+', 'Cu2+'],
  ligands: ['h2o', 'nh3', 'en', 'py', 'bipy', 'ox', 'gly', 'ncs_n', 'cl'],
  geometries: ['octahedral'],
  maxKinds: 2,
  absorb: { from: 540, to: 580, absorptivity: null },
  pass: emptyWindow,
  spin: 'any',
  tenDq: { min: null, max: null },
  charge: { min: null, max: null },
  colourTolerance: null,
};

export interface DraftSurroundings {
  readonly targetLab: readonly [number, number, number] | null;
  readonly concentration_mM: number;
  readonly path_cm: number;
}

const both = (range: { min: number | null; max: number | null }, low: number, high: number) =>
  range.min === null && range.max === null ? undefined : { min: range.min ?? low, max: range.max ?? high };

const isWindow = ({ from, to }: DraftWindow): boolean => from !== null && to !== null;

/** The wish that a draft stands for. Half-filled windows ask for nothing yet. */
export function wishOf(draft: WishDraft, around: DraftSurroundings): WishInput {
  const { absorb, pass, colourTolerance } = draft;
  return {
    name: 'Wish',
    ions: [...draft.ions],
    geometries: [...draft.geometries],
    ligands: { allow: [...draft.ligands], maxKinds: draft.maxKinds },
    charge: both(draft.charge, -20, 20),
    tenDq_cm1: both(draft.tenDq, 0, 200_000),
    spin: draft.spin === 'any' ? undefined : draft.spin,
    bands: isWindow(absorb)
      ? [
          {
            from_nm: absorb.from!,
            to_nm: absorb.to!,
            ...(absorb.absorptivity === null ? {} : { minMolarAbsorptivity: absorb.absorptivity }),
          },
        ]
      : undefined,
    clear: isWindow(pass)
      ? [{ from_nm: pass.from!, to_nm: pass.to!, maxMolarAbsorptivity: pass.absorptivity ?? 5 }]
      : undefined,
    colour:
      colourTolerance === null || around.targetLab === null
        ? undefined
        : {
            lab: [...around.targetLab],
            tolerance: colourTolerance,
            concentration_mM: around.concentration_mM,
            path_cm: around.path_cm,
          },
  };
}

/** Whether the draft wishes anything at all: without that every candidate is as good as the next. */
export function wishesAnything(draft: WishDraft, around: DraftSurroundings): boolean {
  const { bands, clear, colour, spin, tenDq_cm1 } = wishOf(draft, around);
  return [bands, clear, colour, spin, tenDq_cm1].some((part) => part !== undefined);
}
