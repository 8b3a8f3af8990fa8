import { useEffect, useState } from 'react';
import type { MirroredProject, Snapshot, SnapshotReason } from '../../host';
import { useExchange } from '../../app/exchange/ExchangeContext';
import { inWords, minuteOf, useAction, useServices } from '../../app/services';

const reasonWords: Record<SnapshotReason, string> = {
  continuous: 'kept by the clock',
  'by-hand': 'taken by hand',
  'before-import': 'before an import',
  'before-restore': 'before going back',
  'before-upgrade': 'before an upgrade',
  'before-recalibration': 'before new parameters',
  'changed-elsewhere': 'changed by another program, put aside',
};

/** Earlier states of one project; each is looked at before anything of it is taken. */
export function SnapshotList({ project }: { readonly project: MirroredProject }) {
  const { host } = useServices();
  const act = useAction();
  const { offerBundle } = useExchange();
  const [snapshots, setSnapshots] = useState<readonly Snapshot[] | null>(null);
  const [error, setError] = useState<string | null>(null);
  const { projectId, name, writtenAt } = project;
  useEffect(() => {
    let current = true;
    host.mirror.snapshots(projectId).then(
      (found) => current && setSnapshots(found),
      (cause: unknown) => current && setError(inWords(cause)),
    );
    return () => {
      current = false;
    };
  }, [host, projectId, writtenAt]);
  const look = (title: string, read: () => Promise<string>): void =>
    void act(async () =>
      offerBundle({ name: title, bytes: new TextEncoder().encode(await read()) }, 'before-restore'),
    );
  return (
    <>
      {error !== null && <p className="field-error">{error}</p>}
      <table className="plain-table">
        <thead>
          <tr>
            <th scope="col">State of</th>
            <th scope="col">Why it was kept</th>
            <th scope="col">Size</th>
            <th scope="col">
              <span className="visually-hidden">Go back</span>
            </th>
          </tr>
        </thead>
        <tbody>
          <tr>
            <th scope="row">{minuteOf(writtenAt)}</th>
            <td>the copy itself</td>
            <td className="figures">{project.bytes.toLocaleString('en-GB')} bytes</td>
            <td>
              <button
                type="button"
                onClick={() => look(`the copy of ${name}`, () => host.mirror.read(projectId))}
              >
                Look at it…
              </button>
            </td>
          </tr>
          {(snapshots ?? []).map(({ id, takenAt, reason, bytes }) => (
            <tr key={id}>
              <th scope="row">{minuteOf(takenAt)}</th>
              <td>{reasonWords[reason]}</td>
              <td className="figures">{bytes.toLocaleString('en-GB')} bytes</td>
              <td>
                <button
                  type="button"
                  onClick={() =>
                    look(`the snapshot of ${minuteOf(takenAt)}`, () =>
                      host.mirror.readSnapshot(projectId, id),
                    )
                  }
                >
                  Look at it…
                </button>
              </td>
            </tr>
          ))}
        </tbody>
      </table>
    </>
  );
}
