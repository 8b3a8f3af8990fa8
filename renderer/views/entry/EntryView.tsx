import { linkTo, useRouter } from '../../app/router/RouterContext';
import { useVersion } from '../../app/session/observable';
import { useProject } from '../../app/session/ProjectSession';
import { ViewHeader } from '../../app/shell/ViewHeader';
import { EmptyState } from '../../parts';
import { EntryForm } from './EntryForm';

/** A new candidate, or, where the address names one, the composition of an existing one. */
export default function EntryView() {
  const { address } = useRouter();
  const { rows, project } = useProject();
  useVersion(rows);
  const candidate = address.item === null ? null : (rows.get(address.item) ?? null);
  if (address.item !== null && candidate === null) {
    if (rows.state === 'reading') return <p className="soft">Opening…</p>;
    return (
      <>
        <ViewHeader title="Not found" />
        <EmptyState
          title="This candidate is not here"
          actions={
            <a className="button" href={linkTo({ view: 'candidates', project: project.id })}>
              All candidates
            </a>
          }
        >
          It may lie in the bin.
        </EmptyState>
      </>
    );
  }
  return (
    <>
      <ViewHeader
        title={candidate === null ? 'New candidate' : 'Change the candidate'}
        summary="Choose on the left; the estimate follows on the right."
      />
      <EntryForm key={candidate?.id ?? 'new'} candidate={candidate} />
    </>
  );
}
