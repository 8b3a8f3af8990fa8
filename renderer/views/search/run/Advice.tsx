import { formatShare, Formula } from '../../../parts';
import { patientAsker } from '../asking/searchAsker';
import { useReply } from '../asking/useReply';
import { partName } from '../results/partNames';
import type { SearchRun } from './searchRun';

/** Where nothing meets the whole wish: which part to give up, and what that would buy. */
export function Advice({ run }: { readonly run: SearchRun }) {
  const { wish, overlay } = run.setup;
  const { reply, current, error } = useReply({ kind: 'relax', wish, overlay }, patientAsker);
  if (error !== null) return <p role="alert">{error}</p>;
  if (!current || reply === null) return <p className="soft">Looking for the part that stands in the way…</p>;
  if (reply.kind !== 'advice') return null;
  const helpful = reply.relaxations.filter(({ probability }) => probability >= 1e-6);
  return (
    <section className="panel stack" aria-labelledby="search-advice">
      <h2 id="search-advice">What to give up</h2>
      {helpful.length === 0 ? (
        <p>
          No single part stands in the way: at least two have to give. Widen the windows, or allow more metals
          or ligands.
        </p>
      ) : (
        <>
          <table className="plain-table">
            <thead>
              <tr>
                <th scope="col">Without</th>
                <th scope="col">the rest is met with</th>
                <th scope="col">by</th>
                <th scope="col">which offers there</th>
              </tr>
            </thead>
            <tbody>
              {helpful.map(({ part, formula, probability, offers }) => (
                <tr key={part}>
                  <th scope="row">{partName(part)}</th>
                  <td className="figures">{formatShare(probability)}</td>
                  <td>
                    <Formula formula={formula} />
                  </td>
                  <td>{offers}</td>
                </tr>
              ))}
            </tbody>
          </table>
          <p className="soft small">
            From a sample in even steps through the space: it shows where the trouble lies.
          </p>
        </>
      )}
    </section>
  );
}
