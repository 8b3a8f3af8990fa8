import { Fragment, type ReactNode } from 'react';
import { TermSymbol, writeToStep } from '../../parts';
import type { Counted } from './recordPairs';

interface OutliersProps {
  readonly pairs: readonly Counted[];
  readonly linkOf: (candidateId: string) => ReactNode;
}

/** Beyond this many standard deviations a residual is no chance of an honest range: one in 370 (common practice). */
const far = 3;

/** Names the pairs that lie far outside their range. They are counted like all others. */
export function Outliers({ pairs, linkOf }: OutliersProps) {
  const outside = pairs
    .filter(({ score }) => score !== null && Math.abs(score) > far)
    .sort((one, other) => Math.abs(other.score!) - Math.abs(one.score!));
  if (outside.length === 0) return null;
  return (
    <p>
      More than {far} standard deviations off, and counted all the same:{' '}
      {outside.map(({ id, candidateId, predicted, score }, index) => (
        <Fragment key={id}>
          {index > 0 && ', '}
          {linkOf(candidateId)} <TermSymbol label={predicted.label} /> ({writeToStep(score!, 0.1)})
        </Fragment>
      ))}
      .
    </p>
  );
}
