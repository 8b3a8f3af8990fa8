import type { Prediction } from '../../../../core/prediction/types';
import {
  CautionList,
  ErrorPanel,
  FlagList,
  Formula,
  NumberWithRange,
  SpinBar,
  Swatch,
  TermSymbol,
  TransmissionStrip,
} from '../../../parts';
import type { AskedPrediction } from '../../../app/session/usePrediction';
import { transmittanceOf } from '../../../workers/transmittance';
import { BandLines } from './BandLines';
import './LiveEstimate.css';

interface LiveEstimateProps {
  readonly asked: AskedPrediction;
  /** What is still to be chosen; null when the question is complete. */
  readonly missing: string | null;
}

/** What the program expects of the complex as it stands, beside the choices. */
export function LiveEstimate({ asked, missing }: LiveEstimateProps) {
  const { outcome, current, error } = asked;
  return (
    <section className="live-estimate panel" aria-label="Estimate" aria-busy={!current}>
      {missing !== null ? (
        <p className="soft">{missing}</p>
      ) : error !== null ? (
        <ErrorPanel
          title="No estimate"
          problems={[
            { code: 'not-estimated', field: '', message: error, remedy: 'Reload the window and try again.' },
          ]}
        />
      ) : outcome === null ? (
        <p className="soft">Estimating…</p>
      ) : outcome.ok ? (
        <EstimateCard prediction={outcome.prediction} />
      ) : (
        <ErrorPanel problems={outcome.problems} />
      )}
    </section>
  );
}

function EstimateCard({ prediction }: { readonly prediction: Prediction }) {
  const { formula, dElectrons, groundTerm, tenDq, spin, colour, flags, cautions, conditions } = prediction;
  return (
    <>
      <header>
        <h2>
          <Formula formula={formula} />
        </h2>
        <p className="soft">
          d<sup>{dElectrons}</sup>, ground term <TermSymbol label={groundTerm} />
        </p>
      </header>
      <Swatch colour={colour} size="card" text="full" />
      <TransmissionStrip transmittance={transmittanceOf(prediction)} scale />
      <p className="soft small">
        at {conditions.concentration_mM} mM, {conditions.path_cm} cm
      </p>
      <SpinBar spin={spin} />
      <dl>
        <dt>10Dq</dt>
        <dd>
          <NumberWithRange kind="interval" value={tenDq.value} sigma={tenDq.sigma} />
        </dd>
        <BandLines bands={prediction.bands} />
      </dl>
      <FlagList flags={flags} />
      <CautionList cautions={cautions} />
    </>
  );
}
