import type { Share } from '../../../core/agreement';
import { formatShare, writeToStep } from '../../parts';

/** A share with what it was counted from and its 95 % interval. */
export const shareText = ({ hits, of, share, interval95 }: Share): string =>
  share === null
    ? 'none'
    : `${hits} of ${of}, ${formatShare(share)} (95 % interval ${formatShare(interval95[0])} to ${formatShare(interval95[1])})`;

/** The same for a narrow column whose head says what the interval is. */
export const shortShareText = ({ hits, of, share, interval95 }: Share): string =>
  share === null
    ? 'none'
    : `${hits} of ${of} (${formatShare(interval95[0])} to ${formatShare(interval95[1])})`;

/** A signed share of one in percent. */
export const percent = (share: number): string => `${writeToStep(100 * share, 0.1)}\u202f%`;
