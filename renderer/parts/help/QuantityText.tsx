import { quantities, type QuantityId } from './quantities';
import './Explain.css';

/** What a quantity is, how it is computed, after whom, and when it fails. */
export function QuantityText({ quantity }: { readonly quantity: QuantityId }) {
  const { what, how, source, fails } = quantities[quantity];
  return (
    <dl className="quantity-text">
      <dt>What it is</dt>
      <dd>{what}</dd>
      <dt>How it is computed</dt>
      <dd>{how}</dd>
      <dt>After</dt>
      <dd>{source}</dd>
      <dt>When it fails</dt>
      <dd>{fails}</dd>
    </dl>
  );
}
