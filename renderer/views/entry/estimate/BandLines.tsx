import type { Band } from '../../../../core/transitions/types';
import { NumberWithRange, TermSymbol } from '../../../parts';

const shown = 3;

/** The first spin-allowed bands, for a quick look. */
export function BandLines({ bands }: { readonly bands: readonly Band[] }) {
  const allowed = bands.filter(({ kind }) => kind === 'spin-allowed').slice(0, shown);
  if (allowed.length === 0) {
    return (
      <>
        <dt>Bands</dt>
        <dd className="soft">no spin-allowed d–d band</dd>
      </>
    );
  }
  return allowed.map(({ label, energy_cm1, sigma_cm1 }, index) => (
    <div key={`${label}-${index}`} className="live-band">
      <dt>
        to <TermSymbol label={label} />
      </dt>
      <dd>
        <NumberWithRange value={energy_cm1} sigma={sigma_cm1} />
      </dd>
    </div>
  ));
}
