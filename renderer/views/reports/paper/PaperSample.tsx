import type { SeenColour } from '../../../../core/colour/types';
import { colourNumbers } from '../../../parts';

/** A colour sample on the neutral surround, named so that it can be read in black and white. */
export function PaperSample({
  colour,
  caption,
}: {
  readonly colour: SeenColour | null;
  readonly caption?: string;
}) {
  if (colour === null) return <span>colour not estimated</span>;
  const { lab, hex } = colourNumbers(colour);
  return (
    <span className="paper-sample">
      <span className="paper-surround" aria-hidden="true">
        <span className="paper-patch" style={{ backgroundColor: colour.srgb }} />
      </span>
      <span>
        {caption !== undefined && <>{caption}: </>}
        <strong>{colour.words}</strong>
        <br />
        {lab}, {hex}
        {!colour.inGamut && ', beyond sRGB'}
      </span>
    </span>
  );
}
