import { memo } from 'react';
import { type SpinPrediction } from '../../../core/spin/types';
import { formatShare } from '../number';
import './SpinBar.css';

interface SpinBarProps {
  readonly spin: Pick<SpinPrediction, 'probabilityHigh' | 'words' | 'unpairedElectrons' | 'nearCrossover'>;
  /** For table rows: the bar and its words on one line. */
  readonly compact?: boolean;
}

const electrons = (count: number): string =>
  count === 0 ? 'no unpaired electron' : `${count} unpaired electron${count === 1 ? '' : 's'}`;

/** Probability of high and of low spin as two extents of one bar: solid is high, hatched is low. */
export const SpinBar = memo(function SpinBar({ spin, compact = false }: SpinBarProps) {
  const { probabilityHigh: high, words } = spin;
  if (high === null) {
    return (
      <span className="spin-bar" data-compact={compact || undefined}>
        <span className="spin-bar-words">{words}</span>
        {!compact && <span className="spin-bar-note">{electrons(spin.unpairedElectrons)}</span>}
      </span>
    );
  }
  const shares = `high spin ${formatShare(high)}, low spin ${formatShare(1 - high)}`;
  return (
    <span className="spin-bar" data-compact={compact || undefined}>
      <span
        className="spin-bar-field"
        role="img"
        aria-label={shares}
        title={compact ? `${words} (${shares})` : undefined}
      >
        <span className="spin-bar-high" style={{ inlineSize: `${100 * high}%` }} />
        <span className="spin-bar-low" style={{ inlineSize: `${100 * (1 - high)}%` }} />
      </span>
      {!compact && (
        <span className="spin-bar-ends" aria-hidden="true">
          <span>high {formatShare(high)}</span>
          <span>low {formatShare(1 - high)}</span>
        </span>
      )}
      <span className="spin-bar-words">{words}</span>
      {!compact && (
        <span className="spin-bar-note">
          {electrons(spin.unpairedElectrons)} at the central estimate
          {spin.nearCrossover && '; near the spin crossover'}
        </span>
      )}
    </span>
  );
});
