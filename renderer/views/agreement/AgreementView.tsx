import { type ReactNode, useMemo, useState } from 'react';
import { complexFormula } from '../../../core/library/complexFormula';
import { linkTo, useRouter } from '../../app/router/RouterContext';
import { useProject } from '../../app/session/ProjectSession';
import { useLibrary } from '../../app/session/useLibrary';
import { ViewHeader } from '../../app/shell/ViewHeader';
import { EmptyState, ErrorPanel, Formula, SegmentedChoice } from '../../parts';
import { AgreementFigures } from './AgreementFigures';
import { AgreementPlots } from './AgreementPlots';
import { ExportButtons } from './ExportButtons';
import { FieldSection } from './FieldSection';
import { type Grouping, groupings, groupName } from './groupings';
import { GroupTable } from './GroupTable';
import { Outliers } from './Outliers';
import { PairTable } from './PairTable';
import { RecalibrationPanel } from './recalibration/RecalibrationPanel';
import { countedPairs } from './recordPairs';
import { SpinAgreement } from './SpinAgreement';
import { spinPairsOf } from './spinPairs';
import { useRecordPairs } from './useRecordPairs';
import './AgreementView.css';

/** How good the predictions of the project have been, and what the parameters can learn from it. */
export default function AgreementView() {
  const { project, rows } = useProject();
  const { go } = useRouter();
  const library = useLibrary();
  const [grouping, setGrouping] = useState<Grouping>('metal');
  const { value, error } = useRecordPairs();
  const spins = useMemo(() => (value ? spinPairsOf(value.measurements, value.frozen) : []), [value]);
  const nameOf = (id: string): string => complexFormula(rows.get(id)!.composition, library);
  const head = (
    <ViewHeader
      title="Agreement"
      summary="Measured beside predicted, as the prediction stood before the measurement."
      actions={value && value.pairs.length > 0 ? <ExportButtons record={value} nameOf={nameOf} /> : undefined}
    />
  );
  if (error !== null)
    return (
      <>
        {head}
        <ErrorPanel
          title="The record cannot be read"
          problems={[{ code: 'integrity', field: '', message: error }]}
        />
      </>
    );
  if (!value)
    return (
      <>
        {head}
        <p className="soft">Opening…</p>
      </>
    );
  const { pairs } = value;
  const counted = countedPairs(pairs);
  const inSample = pairs.filter((pair) => pair.isInSample);
  const groupOf = ({ candidateId }: { candidateId: string }): string =>
    groupName(rows.get(candidateId)!.composition, grouping, library);
  const linkOf = (candidateId: string): ReactNode => (
    <a href={linkTo({ view: 'record', project: project.id, item: candidateId })}>
      <Formula formula={nameOf(candidateId)} />
    </a>
  );
  const openRecord = (candidateId: string): void =>
    go({ view: 'record', project: project.id, item: candidateId });
  if (pairs.length === 0 && spins.length === 0)
    return (
      <>
        {head}
        <EmptyState
          title="No pair yet"
          actions={
            <a className="button" href={linkTo({ view: 'record', project: project.id })}>
              To the lab record
            </a>
          }
        >
          A measured band, or a spectrum whose bands are fitted and assigned, makes a pair with the prediction
          that was frozen before it.
        </EmptyState>
        {value.sets.length > 0 && <RecalibrationPanel record={value} />}
      </>
    );
  return (
    <>
      {head}
      <div className="stack">
        <section className="panel stack" aria-labelledby="agreement-figures">
          <h2 id="agreement-figures">Bands</h2>
          {counted.length === 0 ? (
            <p className="soft">Nothing that can be counted yet; the table below says why.</p>
          ) : (
            <AgreementFigures pairs={pairs} />
          )}
          <Outliers pairs={counted} linkOf={linkOf} />
          {inSample.length > 0 && (
            <p className="soft">
              {inSample.length} {inSample.length === 1 ? 'pair is' : 'pairs are'} in-sample: the complex
              itself went into the parameters of its prediction. They are shown below and never counted above.
            </p>
          )}
        </section>
        {counted.length > 0 && (
          <section className="panel stack" aria-labelledby="agreement-groups">
            <h2 id="agreement-groups">By group</h2>
            <SegmentedChoice legend="Group by" options={groupings} value={grouping} onChange={setGrouping} />
            <GroupTable pairs={pairs} groupOf={groupOf} />
            <AgreementPlots
              pairs={counted}
              nameOf={nameOf}
              groupOf={groupOf}
              onOpen={(id) => openRecord(counted.find((pair) => pair.id === id)!.candidateId)}
            />
          </section>
        )}
        {value.fields.length > 0 && <FieldSection pairs={value.fields} complexOf={linkOf} />}
        <SpinAgreement spins={spins} nameOf={nameOf} />
        {pairs.length > 0 && (
          <section className="panel stack" aria-labelledby="agreement-pairs">
            <h2 id="agreement-pairs">All pairs</h2>
            <PairTable pairs={pairs} complexOf={({ candidateId }) => linkOf(candidateId)} />
          </section>
        )}
        <RecalibrationPanel record={value} />
      </div>
    </>
  );
}
