import { useState } from 'react';
import { blandAltman } from '../../../core/agreement';
import { SegmentedChoice } from '../../parts';
import { BlandAltmanPlot, ParityPlot, ResidualPlot, type AgreementLimits, type Pair } from '../../plots';
import type { Counted } from './recordPairs';

interface AgreementPlotsProps {
  readonly pairs: readonly Counted[];
  readonly nameOf: (candidateId: string) => string;
  readonly groupOf: (pair: Counted) => string;
  readonly onOpen: (id: string) => void;
}

const kinds = [
  { id: 'parity', label: 'measured against predicted' },
  { id: 'residual', label: 'residuals' },
  { id: 'difference', label: 'differences against means' },
] as const;

/** One figure at a time of the counted pairs, grouped by marker. */
export function AgreementPlots({ pairs, nameOf, groupOf, onOpen }: AgreementPlotsProps) {
  const [kind, setKind] = useState<(typeof kinds)[number]['id']>('parity');
  const plotted = pairs.map((pair): Pair => ({
    id: pair.id,
    name: `${nameOf(pair.candidateId)} ${pair.predicted.label}`,
    predicted: pair.predicted.energy_cm1,
    sigma: pair.predicted.sigma_cm1,
    measured: pair.measured,
    u: pair.u,
    group: groupOf(pair),
  }));
  const common = { pairs: plotted, quantity: 'band position', onOpen };
  return (
    <>
      <SegmentedChoice legend="Figure" options={kinds} value={kind} onChange={setKind} />
      {kind === 'parity' && <ParityPlot {...common} />}
      {kind === 'residual' && <ResidualPlot {...common} />}
      {kind === 'difference' && <BlandAltmanPlot {...common} limits={limitsOf(plotted)} />}
    </>
  );
}

/** Limits of measured minus predicted, the sense of the figure; null below three pairs. */
function limitsOf(pairs: readonly Pair[]): AgreementLimits | null {
  if (pairs.length < 3) return null;
  const { bias, biasInterval, limits } = blandAltman(pairs);
  return {
    bias: -bias,
    lower: -limits[1],
    upper: -limits[0],
    biasInterval: [-biasInterval[1], -biasInterval[0]],
  };
}
