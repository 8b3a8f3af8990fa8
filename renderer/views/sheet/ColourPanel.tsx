import { useMemo } from 'react';
import type { ColourCloud } from '../../../core/colour/types';
import { colourDifference, colourOfPowder, fullShadeScale } from '../../../core/colour';
import type { Prediction } from '../../../core/prediction/types';
import { useProject } from '../../app/session/ProjectSession';
import { CloudStrip, Explain, formatShare, Swatch, SwatchTrio, TransmissionStrip } from '../../parts';
import { ColourCloudPlot } from '../../plots';
import { transmittanceOf } from '../../workers/transmittance';
import type { Viewing } from './viewing/viewing';

interface ColourPanelProps {
  readonly prediction: Prediction;
  readonly cloud: ColourCloud | null | undefined;
  readonly viewing: Viewing;
}

/** What the eye would see, at three strengths, and how far that may be off. */
export function ColourPanel({ prediction, cloud, viewing }: ColourPanelProps) {
  return (
    <section className="panel colour-panel" aria-labelledby="sheet-colour">
      <div className="with-explain">
        <h2 id="sheet-colour">Seen colour</h2>
        <Explain quantity="colour" />
      </div>
      {viewing.matter === 'powder' ? (
        <PowderColour prediction={prediction} viewing={viewing} />
      ) : (
        <SolutionColour prediction={prediction} cloud={cloud} />
      )}
    </section>
  );
}

/** Distance within which a predicted colour counts as met: no prediction is finer. */
const tolerance = 15;

function SolutionColour({ prediction, cloud }: Omit<ColourPanelProps, 'viewing'>) {
  const { project } = useProject();
  const { conditions, colour, colourAtThreeStrengths } = prediction;
  const target = project.targetLab;
  const met =
    cloud && target ? cloud.draws.filter(({ lab }) => colourDifference(lab, target) <= tolerance) : null;
  return (
    <div className="stack">
      <SwatchTrio
        strengths={colourAtThreeStrengths}
        concentration_mM={conditions.concentration_mM}
        path_cm={conditions.path_cm}
      />
      <TransmissionStrip transmittance={transmittanceOf(prediction)} scale />
      {target && colour && (
        <p>
          ΔE<sub>00</sub> to the target of this project: {colourDifference(colour.lab, target).toFixed(0)}
          {cloud && met && (
            <>
              ; within {tolerance} of it with a chance of{' '}
              {formatShare(met.length / Math.max(1, cloud.draws.length))}
            </>
          )}
        </p>
      )}
      <h3>What else it could be</h3>
      {cloud === undefined ? (
        <p className="soft">Drawing from the uncertainties…</p>
      ) : (
        <CloudStrip cloud={cloud} />
      )}
      {cloud && (
        <details>
          <summary>On the a*b* plane</summary>
          <ColourCloudPlot
            draws={cloud.draws}
            centre={colour}
            target={target === null ? null : { lab: target, tolerance, name: 'target' }}
            difference={colourDifference}
            differenceName="CIEDE2000"
          />
        </details>
      )}
    </div>
  );
}

const shades = [
  { factor: 0.1, caption: 'a tenth of the full shade' },
  { factor: 1, caption: 'full shade' },
  { factor: 10, caption: 'ten times the full shade' },
] as const;

function PowderColour({
  prediction: { bands, colour },
  viewing: { illuminant, observer },
}: Omit<ColourPanelProps, 'cloud'>) {
  const colours = useMemo(() => {
    const scale = fullShadeScale(bands);
    return shades.map(({ factor, caption }) => ({
      caption,
      colour: colourOfPowder(bands, { scale: scale * factor, illuminant, observer }),
    }));
  }, [bands, illuminant, observer]);
  if (colour === null) return <p className="soft">No colour could be estimated.</p>;
  return (
    <div className="stack">
      {colours.map((shade) => (
        <Swatch key={shade.caption} colour={shade.colour} caption={shade.caption} />
      ))}
      <p className="soft">
        A second-class estimate after Kubelka and Munk: the spectrum of the solution on a white ground. Grain
        size, scattering, gloss and changes in the solid are left out; at the full shade the darkest
        wavelength reflects 15 %.
      </p>
    </div>
  );
}
