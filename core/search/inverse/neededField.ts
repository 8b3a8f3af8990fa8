import { cubicLevels, type CubicGeometry } from '../../dshell';
import { estimateField } from '../../estimation';
import type { IonRecord, ParameterLibrary } from '../../library';
import { isomersOfComposition } from '../../geometry/ligandSites';
import type { Composition } from '../../record/composition';
import { findGeometry } from '../../library';
import { admittedLigands } from '../space/ligandPool';
import { admittedIons } from '../wish/contradictions';
import type { BandWindow, Wish } from '../wish/wish';

/** A field that would put one band of an ion into a window. */
export interface NeededField {
  readonly ion: string;
  readonly dElectrons: number;
  readonly geometry: CubicGeometry;
  /** Upper level of the band, `4T2g`. */
  readonly band: string;
  /** 10Dq between which the band lies in the window, cm⁻¹. */
  readonly tenDq: readonly [number, number];
  /** B and C that were taken: those of the ion with the ligands in question, on average. */
  readonly B: number;
  readonly C: number;
  /** How far five per cent of 10Dq move the band in the middle of the range, cm⁻¹. */
  readonly fivePercent_cm1: number;
  /** Ligands that alone would give such a field, with the 10Dq estimated for them, weakest first. */
  readonly ligands: readonly { readonly id: string; readonly tenDq: number }[];
}

interface Homoleptic {
  readonly id: string;
  readonly tenDq: number;
  readonly B: number;
  readonly C: number;
}

/** The ion with each ligand alone around it, where that fits and can be estimated. */
function homoleptics(
  ion: IonRecord,
  geometry: CubicGeometry,
  wish: Wish,
  library: ParameterLibrary,
): Homoleptic[] {
  const places = findGeometry(geometry)!.coordinationNumber;
  return admittedLigands(wish, library.ligands.values()).flatMap(({ id, denticity }): Homoleptic[] => {
    if (places % denticity !== 0) return [];
    const composition: Composition = {
      metal: ion.symbol,
      oxidationState: ion.oxidationState,
      geometry,
      ligands: { [id]: places / denticity },
    };
    if (isomersOfComposition(composition, library).length === 0) return [];
    const field = estimateField(composition, library);
    const tenDq = field?.fields.high.value ?? null;
    if (tenDq === null) return [];
    // One electron, or one hole, repels nothing: there B and C have no meaning and no effect.
    return [{ id, tenDq, B: field?.racahB.value ?? 0, C: field?.racahC.value ?? 0 }];
  });
}

const mean = (values: readonly number[]): number =>
  values.reduce((sum, value) => sum + value, 0) / values.length;

const step_cm1 = 100;
const highest_cm1 = 45_000;

/** Spin-allowed transitions from the ground level of a field: name of the upper level and energy, in order. */
function bandsAt(ion: IonRecord, geometry: CubicGeometry, tenDq: number, B: number, C: number) {
  const levels = cubicLevels({ dElectrons: ion.dElectrons, geometry, tenDq, B, C });
  const ground = levels[0]!;
  const counts = new Map<string, number>();
  return levels.slice(1).flatMap((level) => {
    if (level.multiplicity !== ground.multiplicity) return [];
    const times = (counts.get(level.label) ?? 0) + 1;
    counts.set(level.label, times);
    return [
      {
        key: `${ground.label} ${level.label} ${times}`,
        label: level.label,
        energy: level.energy - ground.energy,
      },
    ];
  });
}

/**
 * The other way round: which 10Dq each ion of a wish would need to absorb in a window, and which ligands lie there. B and
 * C are held at the mean of the ion's own complexes, so the ranges are a guide to where to look, not a prediction.
 */
export function neededFields(
  window: BandWindow,
  geometry: CubicGeometry,
  wish: Wish,
  library: ParameterLibrary,
): NeededField[] {
  const [low, high] = [1e7 / window.to_nm, 1e7 / window.from_nm];
  return admittedIons(wish, library).flatMap((ion): NeededField[] => {
    if (ion.dElectrons < 1 || ion.dElectrons > 9) return [];
    const known = homoleptics(ion, geometry, wish, library);
    if (known.length === 0) return [];
    const [B, C] = [mean(known.map((each) => each.B)), mean(known.map((each) => each.C))];
    const ranges = new Map<string, { label: string; from: number; to: number; slope: number }>();
    let before = new Map<string, number>();
    for (let tenDq = step_cm1; tenDq <= highest_cm1; tenDq += step_cm1) {
      const here = new Map<string, number>();
      for (const { key, label, energy } of bandsAt(ion, geometry, tenDq, B, C)) {
        here.set(key, energy);
        if (energy < low || energy > high) continue;
        const slope = (energy - (before.get(key) ?? energy)) / step_cm1;
        const range = ranges.get(key);
        if (range === undefined) ranges.set(key, { label, from: tenDq, to: tenDq, slope });
        else ranges.set(key, { ...range, to: tenDq, slope: slope || range.slope });
      }
      before = here;
    }
    return [...ranges.values()].map(({ label, from, to, slope }) => ({
      ion: ion.ion,
      dElectrons: ion.dElectrons,
      geometry,
      band: label,
      tenDq: [from, to],
      B,
      C,
      fivePercent_cm1: Math.abs(slope) * 0.05 * ((from + to) / 2),
      ligands: known
        .filter((each) => each.tenDq >= from && each.tenDq <= to)
        .sort((one, other) => one.tenDq - other.tenDq)
        .map(({ id, tenDq }) => ({ id, tenDq })),
    }));
  });
}
