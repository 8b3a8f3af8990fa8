import { useEffect, useState, useSyncExternalStore } from 'react';
import { useExchange } from '../exchange/ExchangeContext';
import { linkTo } from '../router/RouterContext';
import { useServices, useStore } from '../services';
import { useProjectState } from '../session/ProjectSession';
import type { MirrorStatus } from '../../host';
import './Troubles.css';

/** What stands above every view until it is over: saving does not work, or the copies are behind. */
export function Troubles() {
  return (
    <>
      <SaveTrouble />
      <CopyTrouble />
    </>
  );
}

function SaveTrouble() {
  const { health } = useStore().journal;
  const trouble = useSyncExternalStore(health.subscribe, () => health.trouble);
  const { exportProject } = useExchange();
  const project = useProjectState();
  if (trouble === null) return null;
  return (
    <div className="trouble" role="alert">
      <p>
        <strong>Not saved.</strong> {trouble.message} {trouble.remedy}
      </p>
      {project.state === 'open' && (
        <button type="button" onClick={() => exportProject(project.session.project.id)}>
          Export this project…
        </button>
      )}
    </div>
  );
}

function CopyTrouble() {
  const { host } = useServices();
  const [status, setStatus] = useState<MirrorStatus | null>(null);
  useEffect(() => host.mirror.onStatus(setStatus), [host]);
  if (status?.state !== 'failing' || status.problem === null) return null;
  return (
    <div className="trouble" role="status">
      <p>
        <strong>Copies are behind.</strong> {status.problem.message} {status.problem.remedy}
      </p>
      <a className="button" href={linkTo({ view: 'settings' })}>
        Settings
      </a>
    </div>
  );
}
