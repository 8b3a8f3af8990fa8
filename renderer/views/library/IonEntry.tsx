import { findMetal } from '../../../core/library/elements';
import type { IonRecord } from '../../../core/library/ions';
import { linkTo } from '../../app/router/RouterContext';
import { Formula } from '../../parts';
import { ValueWithSource } from './ValueWithSource';

/** Everything on file about one metal ion. */
export function IonEntry({ ion }: { readonly ion: IonRecord }) {
  const cm = { unit: 'cm⁻¹' };
  return (
    <aside className="entry panel" aria-label={`Ion ${ion.ion}`}>
      <div className="entry-head">
        <h2>
          <Formula formula={`${ion.symbol}^${ion.oxidationState}+`} />{' '}
          <span className="soft">{findMetal(ion.symbol)?.name}</span>
        </h2>
        <a
          className="button button-quiet"
          href={linkTo({ view: 'library', item: 'ions' })}
          aria-label="Close entry"
        >
          ✕
        </a>
      </div>
      <p>
        d<sup>{ion.dElectrons}</sup>, {ion.period} series
        {ion.note !== null && `. ${ion.note}`}
      </p>
      <div>
        <ValueWithSource name="g" meaning="10Dq of a complex is f times g" value={ion.g} {...cm} />
        <ValueWithSource name="B₀" meaning="Racah parameter B of the free ion" value={ion.B0} {...cm} />
        <ValueWithSource name="C₀" meaning="Racah parameter C of the free ion" value={ion.C0} {...cm} />
        <ValueWithSource name="k" meaning="B of a complex is B₀ (1 − h k)" value={ion.k} />
        <ValueWithSource
          name="ζ₀"
          meaning="Spin-orbit parameter of one d electron"
          value={ion.zeta0}
          {...cm}
        />
        <ValueWithSource
          name="χ opt, octahedral"
          meaning="Optical electronegativity"
          value={ion.chiOpt.oct}
        />
        <ValueWithSource
          name="χ opt, tetrahedral"
          meaning="Optical electronegativity"
          value={ion.chiOpt.tet}
        />
        <ValueWithSource
          name="pairing energy"
          meaning="Mean energy of pairing two electrons; not used where levels are computed exactly"
          value={ion.pairingEnergy}
          {...cm}
        />
      </div>
    </aside>
  );
}
