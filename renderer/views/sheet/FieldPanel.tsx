import type { Estimate, EstimateRoute } from '../../../core/estimation/types';
import type { Prediction } from '../../../core/prediction/types';
import { Explain, NumberWithRange, type QuantityId, Why } from '../../parts';
import { QuantityLine } from './QuantityLine';

const routeWords: Record<EstimateRoute, string> = {
  'measured-complex': 'measured on this very complex',
  'measured-relative': 'measured on a close relative',
  'published-factors': 'from published factors',
  'metal-specific': 'from values for this metal',
  'donor-class': 'by analogy within the donor class',
  'series-place': 'by place in the spectrochemical series',
  'free-ion': 'from the free ion',
  'not-estimated': 'not estimated',
};

/** The parameters of the field with range, route and account. */
export function FieldPanel({ prediction }: { readonly prediction: Prediction }) {
  const { tenDqBySpin } = prediction;
  return (
    <section className="panel" aria-labelledby="sheet-field">
      <h2 id="sheet-field">Field and repulsion</h2>
      <dl className="quantities">
        <Quantity
          name="10Dq"
          help="tenDq"
          meaning="splitting of the d shell by the ligands"
          estimate={prediction.tenDq}
        />
        {tenDqBySpin && <BySpin {...tenDqBySpin} />}
        <Quantity
          name="B"
          help="racahB"
          meaning="Racah parameter of electron repulsion"
          estimate={prediction.racahB}
        />
        <Quantity name="C" meaning="second Racah parameter" estimate={prediction.racahC} />
        <Quantity
          name="ζ"
          help="zeta"
          meaning="spin-orbit parameter of one electron"
          estimate={prediction.zeta}
        />
      </dl>
    </section>
  );
}

/** Bonds are longer in the high-spin state: each state has a field of its own. */
const BySpin = ({ high, low }: NonNullable<Prediction['tenDqBySpin']>) => (
  <QuantityLine
    name="10Dq at the bond lengths of"
    value={
      <>
        <span className="small">high spin</span>{' '}
        <NumberWithRange kind="interval" value={high.value} sigma={high.sigma} />
        <br />
        <span className="small">low spin</span>{' '}
        <NumberWithRange kind="interval" value={low.value} sigma={low.sigma} />
      </>
    }
  />
);

interface QuantityProps {
  readonly name: string;
  readonly meaning: string;
  readonly help?: QuantityId;
  readonly estimate: Estimate;
}

function Quantity({ name, meaning, help, estimate }: QuantityProps) {
  return (
    <QuantityLine
      name={
        <>
          <abbr title={meaning}>{name}</abbr> <span className="small">{routeWords[estimate.route]}</span>
          {help && <Explain quantity={help} />}
        </>
      }
      value={<NumberWithRange kind="interval" value={estimate.value} sigma={estimate.sigma} />}
      account={<Why reasons={estimate.reasons} of={name} />}
    />
  );
}
