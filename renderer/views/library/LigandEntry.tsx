import type { LigandRecord } from '../../../core/library/ligands';
import { linkTo } from '../../app/router/RouterContext';
import { formatFigures, SourceNote } from '../../parts';
import { ValueWithSource } from './ValueWithSource';

const piWords = { donor: 'π donor', acceptor: 'π acceptor', none: 'no π interaction' };

/** Everything on file about one ligand. */
export function LigandEntry({ ligand }: { readonly ligand: LigandRecord }) {
  return (
    <aside className="entry panel" aria-label={`Ligand ${ligand.abbreviation}`}>
      <div className="entry-head">
        <h2>
          {ligand.abbreviation} <span className="soft">{ligand.commonName}</span>
        </h2>
        <a
          className="button button-quiet"
          href={linkTo({ view: 'library', item: 'ligands' })}
          aria-label="Close entry"
        >
          ✕
        </a>
      </div>
      <dl>
        <dt>In names</dt>
        <dd>{ligand.iupacName}</dd>
        <dt>Charge</dt>
        <dd>{ligand.charge === 0 ? 'neutral' : ligand.charge}</dd>
        <dt>Places it takes</dt>
        <dd>
          {ligand.denticity} ({ligand.donorAtoms.join(', ')})
        </dd>
        <dt>Class</dt>
        <dd>
          {ligand.class}, {piWords[ligand.piCharacter]}
          {ligand.piNote !== null && `: ${ligand.piNote}`}
        </dd>
        <dt>Charge transfer</dt>
        <dd>{ligand.chargeTransfer.text}</dd>
      </dl>
      <div>
        <ValueWithSource
          name="f"
          meaning="10Dq of the complex is f times g of the ion; water is 1.00"
          value={ligand.f}
        />
        {ligand.place && <PlaceInSeries place={ligand.place} />}
        <ValueWithSource
          name="h"
          meaning="B falls by the share h times k of the ion; water is 1.0"
          value={ligand.h}
        />
        <ValueWithSource name="χ opt" meaning="Optical electronegativity" value={ligand.chiOpt} />
      </div>
      <Anchors anchors={ligand.anchors} />
      <AngularOverlap sets={ligand.angularOverlap} />
      <Hazards hazards={ligand.hazards} />
    </aside>
  );
}

function PlaceInSeries({ place }: { readonly place: NonNullable<LigandRecord['place']> }) {
  return (
    <p className="value-note">
      In a series: stronger than {place.strongerThan.join(', ') || 'none named'}, weaker than{' '}
      {place.weakerThan.join(', ') || 'none named'}. {place.source}
    </p>
  );
}

function Anchors({ anchors }: Pick<LigandRecord, 'anchors'>) {
  if (anchors.length === 0) return null;
  return (
    <section>
      <h3>Complexes with this ligand alone</h3>
      {anchors.map(({ complex, tenDq, source, status, note }, index) => (
        <div key={index} className="value">
          <span className="value-figure">
            {complex}: 10Dq <span className="value-number">{formatFigures(tenDq, 4)} cm⁻¹</span>
          </span>
          <SourceNote source={source} status={status ?? 'unknown'} />
          {note !== null && <span className="value-note">{note}</span>}
        </div>
      ))}
    </section>
  );
}

function AngularOverlap({ sets }: { readonly sets: LigandRecord['angularOverlap'] }) {
  if (sets.length === 0) return null;
  return (
    <section>
      <h3>Angular overlap</h3>
      {sets.map(({ metal, eSigma, ePi, context, source, status, note }, index) => (
        <div key={index} className="value">
          <span className="value-figure">
            {metal}: e<sub>σ</sub> <span className="value-number">{formatFigures(eSigma, 4)}</span> e
            <sub>π</sub> <span className="value-number">{ePi === 0 ? '0' : formatFigures(ePi, 4)} cm⁻¹</span>
          </span>
          <span className="value-note">{context}</span>
          <SourceNote source={source} status={status ?? 'unknown'} />
          {note !== null && <span className="value-note">{note}</span>}
        </div>
      ))}
    </section>
  );
}

function Hazards({ hazards }: Pick<LigandRecord, 'hazards'>) {
  return (
    <section>
      <h3>Cautions</h3>
      {hazards.length === 0 ? (
        <p className="soft">None on file. That means not assessed, not safe.</p>
      ) : (
        <ul>
          {hazards.map(({ text, ghs, source }) => (
            <li key={text}>
              {text} {ghs.join(', ')} <span className="value-note">{source}</span>
            </li>
          ))}
        </ul>
      )}
      <p className="soft small">The current safety data sheet and your local rules come first.</p>
    </section>
  );
}
