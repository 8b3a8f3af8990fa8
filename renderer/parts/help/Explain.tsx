import { useState } from 'react';
import { Dialog } from '../feedback';
import { quantities, type QuantityId } from './quantities';
import { QuantityText } from './QuantityText';
import './Explain.css';

/** A small question mark that opens the account of a quantity. */
export function Explain({ quantity }: { readonly quantity: QuantityId }) {
  const [open, setOpen] = useState(false);
  const { name } = quantities[quantity];
  return (
    <>
      <button
        type="button"
        className="explain"
        aria-label={`What is ${name}?`}
        aria-haspopup="dialog"
        onClick={() => setOpen(true)}
      >
        ?
      </button>
      <Dialog open={open} title={name} onClose={() => setOpen(false)}>
        <QuantityText quantity={quantity} />
        <p>
          <a href="#/methods" onClick={() => setOpen(false)}>
            All methods and sources
          </a>
        </p>
      </Dialog>
    </>
  );
}
