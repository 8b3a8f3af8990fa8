import { useEffect, useState } from 'react';
import type { MirrorStatus } from '../../host';
import { minuteOf, useAction, useServices } from '../../app/services';
import { askForLastingStorage, type StorageState } from '../../store';

const megabytes = (bytes: number): string => `${(bytes / 1e6).toFixed(1)} MB`;

function useDataState() {
  const { host } = useServices();
  const [storage, setStorage] = useState<StorageState | null>(null);
  const [mirror, setMirror] = useState<MirrorStatus | null>(null);
  useEffect(() => {
    let current = true;
    void askForLastingStorage().then((state) => current && setStorage(state));
    host.mirror.status().then(
      (status) => current && setMirror(status),
      () => undefined,
    );
    const unsubscribe = host.mirror.onStatus(setMirror);
    return () => {
      current = false;
      unsubscribe();
    };
  }, [host]);
  return { storage, mirror, setMirror };
}

export function DataSection() {
  const { host } = useServices();
  const act = useAction();
  const { storage, mirror, setMirror } = useDataState();
  return (
    <section className="panel" aria-labelledby="settings-data">
      <h2 id="settings-data">Where your data lie</h2>
      <p className="soft">Everything stays on this machine. Nothing is sent anywhere.</p>
      <dl>
        <dt>Database</dt>
        <dd>{storage === null ? 'asking…' : lastingWords(storage)}</dd>
        <dt>Folder of copies</dt>
        <dd>{mirror === null ? 'asking…' : <MirrorWords mirror={mirror} />}</dd>
        <dt>Program</dt>
        <dd>
          Spinhue {host.info.version}, {host.info.engine}
        </dd>
      </dl>
      {host.info.abilities.chooseMirrorFolder && (
        <div>
          <button
            type="button"
            onClick={() => void act(async () => setMirror(await host.mirror.chooseFolder()))}
          >
            Choose the folder…
          </button>
        </div>
      )}
    </section>
  );
}

function lastingWords({ persisted, used_bytes, allowed_bytes }: StorageState): string {
  const lasting =
    persisted === true
      ? 'the system promised to keep it'
      : persisted === false
        ? 'the system may clear it when space runs short: keep copies'
        : 'the system does not say whether it keeps it';
  const space =
    used_bytes === null || allowed_bytes === null
      ? ''
      : `; ${megabytes(used_bytes)} used of ${megabytes(allowed_bytes)} allowed`;
  return lasting + space;
}

function MirrorWords({ mirror }: { readonly mirror: MirrorStatus }) {
  return (
    <>
      {mirror.folder ?? 'none'}
      {mirror.lastWrittenAt !== null && `, last written ${minuteOf(mirror.lastWrittenAt)}`}
      {mirror.problem !== null && (
        <span className="soft">
          {' '}
          {mirror.problem.message} {mirror.problem.remedy}
        </span>
      )}
    </>
  );
}
