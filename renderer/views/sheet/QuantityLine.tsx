import type { ReactNode } from 'react';

interface QuantityLineProps {
  readonly name: ReactNode;
  readonly value: ReactNode;
  /** Where it comes from, under the value. */
  readonly account?: ReactNode;
}

/** One line of a list of quantities; belongs into `<dl className="quantities">`. */
export function QuantityLine({ name, value, account }: QuantityLineProps) {
  return (
    <div className="quantity">
      <dt>{name}</dt>
      <dd>{value}</dd>
      {account !== undefined && <dd className="quantity-account">{account}</dd>}
    </div>
  );
}
