import { complexFormula } from '../../../core/library/complexFormula';
import { Field } from '../../app/form';
import { useRouter } from '../../app/router/RouterContext';
import { useVersion } from '../../app/session/observable';
import { useProject } from '../../app/session/ProjectSession';
import { useLibrary } from '../../app/session/useLibrary';
import { ViewHeader } from '../../app/shell/ViewHeader';
import { CandidateRecord } from './CandidateRecord';
import { ProjectRecord } from './ProjectRecord';
import './RecordView.css';

/** Measurements of one candidate, or the agreement over the whole project. */
export default function RecordView() {
  const { address, go } = useRouter();
  const { project, rows } = useProject();
  useVersion(rows);
  const library = useLibrary();
  const candidate = rows.get(address.item ?? '');
  return (
    <>
      <ViewHeader title="Lab record" summary="What was measured, beside what was predicted before it was." />
      <div className="stack">
        <Field label="Candidate">
          {(attributes) => (
            <select
              {...attributes}
              value={candidate?.id ?? ''}
              onChange={(event) =>
                go({ view: 'record', project: project.id, item: event.currentTarget.value || null })
              }
            >
              <option value="">the whole project</option>
              {rows.values().map((each) => (
                <option key={each.id} value={each.id}>
                  {complexFormula(each.composition, library)} {each.name}
                </option>
              ))}
            </select>
          )}
        </Field>
        {candidate ? <CandidateRecord key={candidate.id} candidate={candidate} /> : <ProjectRecord />}
      </div>
    </>
  );
}
