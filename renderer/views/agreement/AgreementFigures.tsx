import { formatFigures } from '../../parts';
import { shareText } from './figureText';
import { agreementOf, countedPairs, type BandPair } from './recordPairs';
import './AgreementFigures.css';

export { shareText };

const energy = (value: number): string => `${formatFigures(value, 3)} cm⁻¹`;

/** How well prediction and measurement agree, with what was not counted. */
export function AgreementFigures({ pairs }: { readonly pairs: readonly BandPair[] }) {
  const agreement = agreementOf(pairs);
  if (agreement === null) return null;
  const { errors, within68, within95 } = agreement;
  const left = pairs.length - countedPairs(pairs).length;
  return (
    <>
      <dl className="agreement-figures">
        <div>
          <dt>Pairs counted</dt>
          <dd>{errors.n}</dd>
        </div>
        <div>
          <dt>Bias, predicted − measured</dt>
          <dd>{energy(errors.bias)}</dd>
        </div>
        <div>
          <dt>Mean absolute error</dt>
          <dd>{energy(errors.meanAbsolute)}</dd>
        </div>
        <div>
          <dt>Root mean square error</dt>
          <dd>{energy(errors.rootMeanSquare)}</dd>
        </div>
        <div>
          <dt>Median absolute error</dt>
          <dd>{energy(errors.medianAbsolute)}</dd>
        </div>
        <div>
          <dt>Inside the 68 % range</dt>
          <dd>{shareText(within68)}</dd>
        </div>
        <div>
          <dt>Inside the 95 % range</dt>
          <dd>{shareText(within95)}</dd>
        </div>
      </dl>
      <p className="soft small">
        Bands that nobody assigned were paired by the closest match, which flatters the agreement where a
        measured band lies between two predicted ones. Bands of one complex err together, so that the
        intervals are narrower than they ought to be.
        {left > 0 &&
          ` Not counted: ${left} (shoulders, bands without a partner, in-sample, or measured before freezing).`}
      </p>
    </>
  );
}
