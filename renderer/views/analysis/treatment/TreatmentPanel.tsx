import { useState } from 'react';
import type { Conditions } from '../../../../core/record/measurement';
import type { Curve } from '../../../../core/record/curve';
import type { TreatmentStep } from '../../../../core/record/treatment';
import { absorbanceSanity } from '../../../../core/measured/treatment/sanity';
import { ErrorPanel } from '../../../parts';
import { SpectrumPlot } from '../../../plots';
import { StepForm } from './StepForm';
import { stepText } from './stepText';
import { TreatedExport } from './TreatedExport';
import { pointsOf, type TreatedCurve } from './treated';

export type Blanks = ReadonlyMap<string, { readonly name: string }>;

interface TreatmentPanelProps {
  readonly curve: Curve;
  readonly steps: readonly TreatmentStep[];
  readonly result: TreatedCurve;
  readonly conditions: Conditions;
  /** What the spectrum is of, for the files that leave the program. */
  readonly title: string;
  readonly blanks: Blanks;
  readonly onSave: (steps: readonly TreatmentStep[], label: string) => Promise<boolean>;
}

const axisWords = {
  absorbance: 'Absorbance',
  transmittance: 'Transmittance',
  'percent-transmittance': 'Transmittance / %',
  'molar-absorptivity': 'Molar absorptivity / L mol⁻¹ cm⁻¹',
  unknown: 'y as it was read',
} as const;

/** Raw and treated spectrum with the steps between them, each of which can be taken back. */
export function TreatmentPanel(props: TreatmentPanelProps) {
  const { curve, steps, result, conditions, title, blanks, onSave } = props;
  const [adding, setAdding] = useState(false);
  const remarks = [
    ...absorbanceSanity(curve).map(({ message }) => message),
    ...(result.shown?.remarks ?? []),
  ];
  const shown = result.shown === null ? null : pointsOf(result.shown);
  return (
    <section className="panel stack" aria-labelledby="analysis-treatment">
      <h2 id="analysis-treatment">Treatment</h2>
      {shown === null || shown.wavenumber_cm1.length < 2 ? (
        <p className="soft">
          Nothing to draw yet: say what the axes hold, with the step “state units”, or take back the step that
          failed.
        </p>
      ) : (
        <SpectrumPlot
          title="The spectrum after these steps"
          predicted={null}
          measured={[{ ...shown, name: 'treated' }]}
          height={300}
          yLabel={axisWords[result.shown!.yUnit]}
        />
      )}
      {result.error !== null && (
        <ErrorPanel
          title="A step cannot be done"
          problems={[
            { code: 'out-of-range', field: '', message: result.error, remedy: 'Take it back below.' },
          ]}
        />
      )}
      {remarks.length > 0 && (
        <ul className="analysis-remarks">
          {remarks.map((remark) => (
            <li key={remark}>{remark}</li>
          ))}
        </ul>
      )}
      {steps.length === 0 ? (
        <p className="soft">No step yet: this is the spectrum as it was read.</p>
      ) : (
        <ol className="analysis-steps">
          {steps.map((step, index) => (
            <li key={index}>
              <span>{stepText(step)}</span>
              <button
                type="button"
                className="button-quiet"
                onClick={() =>
                  void onSave(
                    steps.filter((_, place) => place !== index),
                    `take back a step of treatment`,
                  )
                }
              >
                Take back<span className="visually-hidden"> {stepText(step)}</span>
              </button>
            </li>
          ))}
        </ol>
      )}
      {adding ? (
        <StepForm
          curve={result.shown ?? curve}
          conditions={conditions}
          blanks={blanks}
          onAdd={(step) =>
            void onSave([...steps, step], `treat a spectrum: ${stepText(step)}`).then(
              (done) => done && setAdding(false),
            )
          }
          onClose={() => setAdding(false)}
        />
      ) : (
        <div className="analysis-actions">
          <button type="button" onClick={() => setAdding(true)}>
            Add a step…
          </button>
          {result.shown !== null && (
            <TreatedExport curve={result.shown} steps={steps} conditions={conditions} title={title} />
          )}
        </div>
      )}
    </section>
  );
}
