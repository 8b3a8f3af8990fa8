import { observers, type ObserverId } from '../../../core/library/colourTables';
import { type SeenColour } from '../../../core/colour/types';
import { formatGiven } from '../number';
import { colourNumbers } from './colourNumbers';
import './SwatchTrio.css';

interface SwatchTrioProps {
  /** Weak to strong; `factor` multiplies concentration × path. */
  readonly strengths: readonly { readonly factor: number; readonly colour: SeenColour }[];
  readonly concentration_mM: number;
  readonly path_cm: number;
}

const factorText = (factor: number): string =>
  Math.abs(factor - 1 / 3) < 0.01 ? '⅓ ×' : `${formatGiven(factor)} ×`;

/** A stored colour names its observer by id. */
const observerName = (id: string): string => observers[id as ObserverId]?.name ?? id;

/** The same solution at several strengths, side by side on one surround: hue moves with concentration. */
export function SwatchTrio({ strengths, concentration_mM, path_cm }: SwatchTrioProps) {
  if (strengths.length === 0) return <p className="swatch-trio-missing">No colour could be estimated.</p>;
  return (
    <figure className="swatch-trio">
      <div className="swatch-trio-patches">
        {strengths.map(({ factor, colour }) => (
          <div className="swatch-trio-one" key={factor}>
            <span className="swatch-trio-surround">
              <span
                className="swatch-trio-patch"
                role="img"
                aria-label={`${factorText(factor)} strength: ${colour.words}, ${colourNumbers(colour).lab}, ${colour.srgb}`}
                style={{ backgroundColor: colour.srgb }}
              />
            </span>
            <span className="swatch-trio-text">
              <span className="swatch-trio-factor">
                {factorText(factor)} · {formatGiven(Number((concentration_mM * factor).toPrecision(2)))} mM
              </span>
              <strong>{colour.words}</strong>
              <span className="swatch-trio-numbers">{colourNumbers(colour).lab}</span>
              <span className="swatch-trio-numbers">{colour.srgb}</span>
              {!colour.inGamut && <span className="swatch-trio-warning">beyond this screen</span>}
            </span>
          </div>
        ))}
      </div>
      <figcaption>
        Transmitted light, {formatGiven(path_cm)} cm path, {strengths[0]!.colour.illuminant},{' '}
        {observerName(strengths[0]!.colour.observer)}
      </figcaption>
    </figure>
  );
}
