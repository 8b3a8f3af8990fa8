import type { Measurement, MeasurementContent } from '../../../core/record/measurement';
import { missingFields } from '../../../core/record/missing';
import { currentContent } from '../../../core/record/revisions';
import type { Sample } from '../../../core/record/sample';
import { dayOf, minuteOf } from '../../app/services';
import { linkTo } from '../../app/router/RouterContext';
import { MomentPlot } from '../../plots';
import { contentText } from './contentText';
import { FileLinks } from './FileLinks';

interface MeasurementListProps {
  readonly measurements: readonly Measurement[];
  readonly samples: readonly Sample[];
  readonly onCorrect: (measurement: Measurement) => void;
  readonly onDelete: (measurement: Measurement) => void;
}

const correctedText = (times: number): string =>
  times === 1 ? 'Corrected once' : `Corrected ${times} times`;

/** What was measured, newest first, with what nobody wrote down and every former state. */
export function MeasurementList({ measurements, samples, onCorrect, onDelete }: MeasurementListProps) {
  return (
    <ul className="record-list">
      {measurements.map((measurement) => {
        const content = currentContent(measurement);
        const { date, operator, solvent, temperature_K } = content.conditions;
        const missing = missingFields(content, measurement.sampleId);
        const sample = samples.find(({ id }) => id === measurement.sampleId);
        const around = [
          sample && `batch ${sample.batch}`,
          sample?.phase,
          solvent,
          temperature_K && `${temperature_K.value} K`,
          date && dayOf(date),
          operator,
        ].filter(Boolean);
        return (
          <li key={measurement.id}>
            <div>
              <strong>{contentText(content)}</strong>
              {around.length > 0 && <p>{around.join(', ')}</p>}
              {content.kind !== 'note' && content.remark !== '' && <p>{content.remark}</p>}
              <FileLinks content={content} />
              {content.kind === 'moment series' && (
                <details>
                  <summary>Plot and table</summary>
                  <MomentPlot
                    series={[{ name: 'measured', kind: 'measured', points: seriesPoints(content) }]}
                    height={240}
                  />
                </details>
              )}
              {missing.length > 0 && (
                <p className="soft small">Not written down: {missing.map(({ label }) => label).join(', ')}</p>
              )}
              {measurement.revisions.length > 1 && (
                <details>
                  <summary>{correctedText(measurement.revisions.length - 1)}</summary>
                  <ol>
                    {measurement.revisions.map((each) => (
                      <li key={each.number}>
                        {minuteOf(each.at)}
                        {each.by !== '' && `, ${each.by}`}: {contentText(each.content)}
                        {each.why !== '' && <span className="soft"> ({each.why})</span>}
                      </li>
                    ))}
                  </ol>
                </details>
              )}
            </div>
            <div className="record-actions">
              {(content.kind === 'spectrum' || content.kind === 'band list') && (
                <a
                  className="button"
                  href={linkTo({ view: 'analysis', project: measurement.projectId, item: measurement.id })}
                >
                  {content.kind === 'spectrum' ? 'Treat and fit…' : 'Assign and fit…'}
                </a>
              )}
              <button type="button" onClick={() => onCorrect(measurement)}>
                Correct…
              </button>
              <button type="button" className="button-quiet" onClick={() => onDelete(measurement)}>
                Delete
              </button>
            </div>
          </li>
        );
      })}
    </ul>
  );
}

const seriesPoints = ({ points }: Extract<MeasurementContent, { kind: 'moment series' }>) =>
  points.map(({ temperature_K, chiT }) => ({ temperature_K, chiT: chiT.value, u: chiT.u }));
