import type { ColourCloud } from '../../../core/colour/types';
import { colourDifference } from '../../../core/colour';
import type { Prediction } from '../../../core/prediction/types';
import { useProject } from '../../app/session/ProjectSession';
import { CloudStrip, SwatchTrio, TransmissionStrip } from '../../parts';
import { ColourCloudPlot } from '../../plots';
import { transmittanceOf } from '../../workers/transmittance';

interface ColourPanelProps {
  readonly prediction: Prediction;
  readonly cloud: ColourCloud | null | undefined;
}

/** Distance within which a predicted colour counts as met: no prediction is finer. */
const tolerance = 15;

/** What the eye would see, at three strengths, and how far that may be off. */
export function ColourPanel({ prediction, cloud }: ColourPanelProps) {
  const { project } = useProject();
  const { conditions, colour, colourAtThreeStrengths } = prediction;
  const target = project.targetLab;
  return (
    <section className="panel colour-panel" aria-labelledby="sheet-colour">
      <h2 id="sheet-colour">Seen colour</h2>
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
    </section>
  );
}
