import { useDeferredValue } from 'react';
import type { ColourCloud } from '../../../core/colour/types';
import type { Prediction } from '../../../core/prediction/types';
import type { Candidate } from '../../../core/record/project';
import { CautionList, FlagList } from '../../parts';
import { BandTable } from './BandTable';
import { ColourPanel } from './ColourPanel';
import { FieldPanel } from './FieldPanel';
import { FrozenPanel } from './FrozenPanel';
import { LevelPanel } from './LevelPanel';
import { NotesPanel } from './NotesPanel';
import { SpectrumPanel } from './SpectrumPanel';
import { SpinPanel } from './SpinPanel';
import { type Viewing } from './viewing/viewing';
import { ViewingPanel } from './viewing/ViewingPanel';
import './Sheet.css';

interface SheetProps {
  readonly candidate: Candidate;
  readonly prediction: Prediction;
  /** Undefined while it is being drawn; null where no colour could be estimated. */
  readonly cloud: ColourCloud | null | undefined;
  readonly viewing: Viewing;
  readonly onViewing: (change: Partial<Viewing>) => void;
  readonly onReset: (() => void) | null;
  readonly onKeep: (() => void) | null;
}

/** Everything that is said of one complex, the answers first, their account below. */
export function Sheet(props: SheetProps) {
  const { candidate, prediction, cloud, viewing } = props;
  // Figures take longer to draw than numbers: the numbers are on screen first.
  const withFigures = useDeferredValue(true, false);
  return (
    <div className="sheet">
      {prediction.flags.length > 0 && (
        <section className="sheet-wide">
          <FlagList flags={prediction.flags} />
        </section>
      )}
      <ViewingPanel
        viewing={viewing}
        onChange={props.onViewing}
        onReset={props.onReset}
        onKeep={props.onKeep}
      />
      <ColourPanel prediction={prediction} cloud={cloud} viewing={viewing} />
      <div className="sheet-column">
        <SpinPanel prediction={prediction} />
        <FieldPanel prediction={prediction} />
      </div>
      {withFigures && <SpectrumPanel prediction={prediction} solvent={viewing.solvent} />}
      <BandTable prediction={prediction} solvent={viewing.solvent} />
      {withFigures && <LevelPanel prediction={prediction} />}
      <section className="panel sheet-wide" aria-labelledby="sheet-left-out">
        <h2 id="sheet-left-out">Left out of this estimate</h2>
        {prediction.leftOut.length === 0 ? (
          <p className="soft">Nothing known.</p>
        ) : (
          <ul className="sheet-left-out">
            {prediction.leftOut.map((sentence) => (
              <li key={sentence}>{sentence}</li>
            ))}
          </ul>
        )}
      </section>
      <div className="sheet-wide">
        <CautionList cautions={prediction.cautions} />
      </div>
      <FrozenPanel candidate={candidate} />
      <NotesPanel candidate={candidate} />
      <footer className="sheet-wide sheet-made-with">
        Made with {prediction.madeWith.parameterSet}, hash {prediction.madeWith.parameterHash.slice(0, 12)},
        model version {prediction.madeWith.modelVersion}. Ranges are 68 %.
      </footer>
    </div>
  );
}
