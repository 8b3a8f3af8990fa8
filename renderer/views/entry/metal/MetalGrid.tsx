import { useRef, type KeyboardEvent } from 'react';
import { type TransitionMetal, transitionMetals } from '../../../../core/library/elements';
import type { ParameterLibrary } from '../../../../core/library/parameterLibrary';
import './MetalGrid.css';

interface MetalGridProps {
  readonly value: string | null;
  readonly library: ParameterLibrary;
  readonly onChange: (symbol: string) => void;
}

const perRow = 10;

/** The d block as it lies in the periodic table. Arrow keys move in both directions, letters jump to a symbol. */
export function MetalGrid({ value, library, onChange }: MetalGridProps) {
  const group = useRef<HTMLFieldSetElement>(null);
  const typed = useRef({ text: '', at: 0 });
  const known = new Set([...library.ions.values()].map(({ symbol }) => symbol));

  const choose = (metal: TransitionMetal | undefined): void => {
    if (!metal) return;
    onChange(metal.symbol);
    group.current?.querySelector<HTMLElement>(`[value="${metal.symbol}"]`)?.focus();
  };
  const onKeyDown = (event: KeyboardEvent): void => {
    const place = transitionMetals.findIndex(({ symbol }) => symbol === value);
    const step = { ArrowUp: -perRow, ArrowDown: perRow, ArrowLeft: -1, ArrowRight: 1 }[event.key];
    if (step !== undefined) {
      event.preventDefault();
      choose(transitionMetals[place < 0 ? 0 : place + step]);
    } else if (/^[a-z]$/i.test(event.key) && !event.ctrlKey && !event.metaKey && !event.altKey) {
      event.preventDefault();
      event.stopPropagation();
      const fresh = event.timeStamp - typed.current.at > 900;
      const text = (fresh ? '' : typed.current.text) + event.key.toLowerCase();
      typed.current = { text, at: event.timeStamp };
      choose(startingWith(text) ?? startingWith(event.key.toLowerCase()));
    }
  };
  return (
    <fieldset className="metal-grid" ref={group} onKeyDown={onKeyDown}>
      <legend>Metal</legend>
      <div className="metal-cells">
        {transitionMetals.map(({ symbol, name }, place) => (
          <label key={symbol} className="metal-cell" data-known={known.has(symbol) || undefined} title={name}>
            <input
              type="radio"
              name="metal"
              value={symbol}
              checked={symbol === value}
              tabIndex={value === null && place === 0 ? 0 : undefined}
              onChange={() => onChange(symbol)}
            />
            <span aria-hidden="true">{symbol}</span>
            <span className="visually-hidden">
              {name}
              {known.has(symbol) ? '' : ', no values on file'}
            </span>
          </label>
        ))}
      </div>
      <p className="field-hint">
        Bold: values on file. Others can be entered; what cannot be estimated is said.
      </p>
    </fieldset>
  );
}

/** The exact symbol first: `co` is cobalt although copper's neighbours begin alike. */
const startingWith = (text: string): TransitionMetal | undefined =>
  transitionMetals.find(({ symbol }) => symbol.toLowerCase() === text) ??
  transitionMetals.find(({ symbol, name }) => symbol.toLowerCase().startsWith(text) || name.startsWith(text));
