import type { ReactNode } from 'react';
import { ErrorPanel } from '../../../parts';
import type { Comparison } from '../../compare/useCompared';

/** A page is shown once all its complexes are estimated; what cannot be estimated is said above it. */
export function AllReady({
  comparison: { waiting, refused },
  children,
}: {
  readonly comparison: Comparison;
  readonly children: ReactNode;
}) {
  if (waiting > 0) return <p className="soft">Estimating, {waiting} to go…</p>;
  return (
    <>
      <ErrorPanel
        title="Not on this page"
        problems={refused.map(({ name, message }) => ({ code: 'not-estimated', field: name, message }))}
      />
      {children}
    </>
  );
}
