import type { IonRecord, LigandRecord, ParameterLibrary } from '../library';
import { classMean } from './donorClass';

/** e_σ and e_π of one donor (cm⁻¹), e_π the mean of its two directions. */
export interface DonorOverlap {
  readonly eSigma: number;
  readonly ePi: number;
}

/** e_π/e_σ of a published set, the interaction of a flat ligand spread over both directions. */
const ratioOf = ({ eSigma, ePi, piDirections }: LigandRecord['angularOverlap'][number]): number =>
  ((piDirections / 2) * ePi) / eSigma;

const mean = (values: readonly number[]): number =>
  values.reduce((sum, value) => sum + value, 0) / values.length;

function ownRatio(ligand: LigandRecord, ion: IonRecord | null): number | null {
  const sets = ligand.angularOverlap.filter(({ confidence }) => confidence !== 'low');
  const same = sets.filter(({ metal }) => metal === ion?.ion);
  const used = same.length > 0 ? same : sets.length > 0 ? sets : ligand.angularOverlap;
  return used.length === 0 ? null : mean(used.map(ratioOf));
}

/** e_π/e_σ where neither the ligand nor its class has a published set, by π character (common practice). */
const usualRatio = { donor: 0.18, none: 0, acceptor: -0.05 } as const;

/**
 * π over σ interaction of a donor: from its own published sets, towards this metal if there are any; from its class; by
 * its π character. An amine has none by convention (the reference of the model).
 */
export function piRatio(ligand: LigandRecord, ion: IonRecord, library: ParameterLibrary): number {
  if (ligand.piCharacter === 'none') return 0;
  const own = ownRatio(ligand, ion);
  if (own !== null) return own;
  const alike = classMean(ligand, library, (other) =>
    other.piCharacter === ligand.piCharacter ? ownRatio(other, null) : null,
  );
  return alike?.mean ?? usualRatio[ligand.piCharacter];
}

/** Splits the 10Dq that a donor would give alone into σ and π: 10Dq = 3 e_σ - 4 e_π (C. E. Schäffer 1968). */
export function donorOverlap(tenDq: number, ratio: number): DonorOverlap {
  const eSigma = tenDq / (3 - 4 * ratio);
  return { eSigma, ePi: ratio * eSigma };
}

/**
 * Mixing of the metal s orbital as a share of e_σ: 6300 of 4 times 5370 cm⁻¹ brings z2 of planar tetrachlorocuprate(II)
 * to where it is found (M. A. Hitchman, P. J. Cassidy 1979, from memory).
 */
export const mixingShare = 0.29;
