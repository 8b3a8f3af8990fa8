import { standingCaution } from '../../../core/library/cautions';
import { defaultLibrary } from '../../../core/library/parameterLibrary';
import { modelVersion } from '../../../core/prediction/modelVersion';
import { externalLinks, type LinkId } from '../../host';
import { linkTo } from '../../app/router/RouterContext';
import { useAction, useServices } from '../../app/services';
import { ViewHeader } from '../../app/shell/ViewHeader';

/** What one names in a report of a fault or in a paper. */
export default function AboutView() {
  const { host } = useServices();
  const act = useAction();
  return (
    <>
      <ViewHeader title="About this program" summary="What to name in a paper or in a report of a fault." />
      <div className="stack">
        <section className="panel" aria-labelledby="about-version">
          <h2 id="about-version">Version</h2>
          <table className="plain-table">
            <tbody>
              {(
                [
                  ['Program', `Spinhue ${host.info.version}`],
                  ['Runs in', host.info.engine],
                  ['Model of the predictions', `version ${modelVersion}`],
                  ['Library of parameters', `version ${defaultLibrary.version}, hash ${defaultLibrary.hash}`],
                  ['Licence', 'MIT'],
                ] as const
              ).map(([name, text]) => (
                <tr key={name}>
                  <th scope="row">{name}</th>
                  <td style={{ overflowWrap: 'anywhere' }}>{text}</td>
                </tr>
              ))}
            </tbody>
          </table>
        </section>
        <section className="panel stack" aria-labelledby="about-trust">
          <h2 id="about-trust">What it is worth, and what not</h2>
          <p>
            Predictions are estimates before a synthesis. They never say that something is safe to make.{' '}
            {standingCaution}
          </p>
          <p>
            Nothing leaves this machine: no network, no telemetry. See{' '}
            <a href={linkTo({ view: 'methods' })}>methods and sources</a> for how each number is made and when
            it fails.
          </p>
        </section>
        <section className="panel stack" aria-labelledby="about-links">
          <h2 id="about-links">Sources on the web</h2>
          <p className="soft">Opened in the system’s browser, only when you press one.</p>
          <div>
            {Object.entries(externalLinks).map(([id, { title }]) => (
              <button
                key={id}
                type="button"
                className="button-quiet"
                onClick={() => void act(() => host.openExternal(id as LinkId))}
              >
                {title}
              </button>
            ))}
          </div>
        </section>
      </div>
    </>
  );
}
