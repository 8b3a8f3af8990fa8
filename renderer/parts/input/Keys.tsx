import { Fragment } from 'react';
import './Keys.css';

/** A shortcut as key caps: `<Keys combo="Ctrl+Shift+P" />`. Several in a row are separated by spaces: `g then t`. */
export function Keys({ combo }: { readonly combo: string }) {
  return (
    <span className="keys">
      {combo.split(' ').map((step, index) => (
        <Fragment key={index}>
          {index > 0 && <span className="keys-then"> then </span>}
          {(step === '+' ? ['+'] : step.split('+')).map((key, place) => (
            <Fragment key={place}>
              {place > 0 && <span className="visually-hidden"> and </span>}
              <kbd>{key === '' ? '+' : key}</kbd>
            </Fragment>
          ))}
        </Fragment>
      ))}
    </span>
  );
}
