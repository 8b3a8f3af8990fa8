import { type Band } from '../../../core/transitions/types';

/** How a kind of band is drawn, also without colour. */
export const bandDash = (kind: Band['kind']): string | undefined =>
  kind === 'spin-allowed' ? undefined : kind === 'spin-forbidden' ? '2 3' : '7 3 1 3';

const measuredDashes = ['8 3', '3 3', '8 3 2 3', '14 3'] as const;

/** Lines of measured spectra, told apart by dash. */
export const measuredDash = (place: number): string | undefined =>
  measuredDashes[place % measuredDashes.length];
