import { type SeenColour } from '../../../core/colour/types';
import { colourNumbers } from './colourNumbers';
import './Swatch.css';

interface SwatchProps {
  /** Null where no colour could be estimated. */
  readonly colour: SeenColour | null;
  readonly size?: 'row' | 'card' | 'large';
  /** `full`: words, L*a*b* and hex beside it; `words`: words only; `none`: the patch alone, named for a screen reader. */
  readonly text?: 'full' | 'words' | 'none';
  /** What it is the colour of, e.g. `at 3 times the strength`. */
  readonly caption?: string;
}

/** A colour on the fixed neutral surround, never without its name in words. */
export function Swatch({ colour, size = 'card', text = 'full', caption }: SwatchProps) {
  if (colour === null) {
    return (
      <span className="swatch" data-size={size}>
        <span className="swatch-surround">
          <span className="swatch-patch swatch-unknown" role="img" aria-label="colour not estimated" />
        </span>
        {text !== 'none' && <span className="swatch-text">not estimated</span>}
      </span>
    );
  }
  const numbers = colourNumbers(colour);
  const warning = 'beyond this screen: shown with less chroma';
  const name = [caption, colour.words, numbers.lab, numbers.hex, colour.inGamut ? null : warning]
    .filter((part) => part !== null && part !== undefined)
    .join(', ');
  return (
    <span className="swatch" data-size={size}>
      <span className="swatch-surround">
        <span
          className="swatch-patch"
          data-out-of-gamut={!colour.inGamut || undefined}
          role="img"
          aria-label={name}
          title={text === 'full' ? undefined : name}
          style={{ backgroundColor: colour.srgb }}
        />
      </span>
      {text !== 'none' && (
        <span className="swatch-text">
          {caption !== undefined && <span className="swatch-caption">{caption}</span>}
          <span className="swatch-words">{colour.words}</span>
          {text === 'full' && (
            <span className="swatch-numbers">
              <span>{numbers.lab}</span> <span>{numbers.hex}</span>
            </span>
          )}
          {!colour.inGamut && <span className="swatch-warning">{warning}</span>}
        </span>
      )}
    </span>
  );
}
