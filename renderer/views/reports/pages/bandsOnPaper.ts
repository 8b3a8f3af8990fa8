import type { Band, BandKind } from '../../../../core/transitions/types';

export const kindOnPaper: Readonly<Record<BandKind, string>> = {
  'spin-allowed': 'spin-allowed d–d',
  'spin-forbidden': 'spin-forbidden d–d',
  LMCT: 'ligand to metal',
  MLCT: 'metal to ligand',
  intervalence: 'intervalence',
  ligand: 'within the ligand',
};

/**
 * The bands for one page: every spin-allowed one, the lowest spin-forbidden ones, the first of charge transfer; and how
 * many were left off.
 */
export function bandsOnPaper(bands: readonly Band[]): {
  readonly shown: readonly Band[];
  readonly left: number;
} {
  const taken = (kind: (band: Band) => boolean, most: number): Band[] => bands.filter(kind).slice(0, most);
  const shown = [
    ...taken(({ kind }) => kind === 'spin-allowed', 6),
    ...taken(({ kind }) => kind === 'spin-forbidden', 2),
    ...taken(({ kind }) => kind !== 'spin-allowed' && kind !== 'spin-forbidden', 3),
  ].sort((one, other) => one.energy_cm1 - other.energy_cm1);
  return { shown, left: bands.length - shown.length };
}
