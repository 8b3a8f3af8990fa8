import { useMemo } from 'react';
import { standingCaution } from '../../../../core/library/cautions';
import { useAction, useServices, useSettings } from '../../../app/services';
import { useLibrary } from '../../../app/session/useLibrary';
import { CautionList, useToast } from '../../../parts';
import { type Ordered, orderCsv, orderList, orderText, usesText } from './orderList';

/** What has to be at hand for the complexes, with the cautions that belong to it. */
export function OrderPanel({ complexes }: { readonly complexes: readonly Ordered[] }) {
  const library = useLibrary();
  const { settings } = useSettings();
  const { host } = useServices();
  const act = useAction();
  const toast = useToast();
  const list = useMemo(
    () => orderList(complexes, new Set(settings.shelf), library),
    [complexes, settings.shelf, library],
  );
  const copy = (): void =>
    void act(async () => {
      await navigator.clipboard.writeText(orderText(list, standingCaution));
      toast({ message: 'Order list copied with its cautions' });
    });
  const save = (): void =>
    void act(async () => {
      const data = orderCsv(list, standingCaution);
      const answer = await host.saveFile({ kind: 'csv', suggestedName: 'order-list.csv', data });
      if (answer.saved) toast({ message: `Saved as ${answer.name}` });
    });
  return (
    <section className="panel stack" aria-labelledby="compare-order">
      <div className="compare-order-head">
        <h2 id="compare-order">What to have at hand</h2>
        <div className="compare-buttons">
          <button type="button" onClick={copy}>
            Copy
          </button>
          <button type="button" onClick={save}>
            CSV
          </button>
          <button type="button" onClick={() => void act(() => host.print())}>
            Print
          </button>
        </div>
      </div>
      <div className="compare-table">
        <table className="plain-table">
          <thead>
            <tr>
              <th scope="col">What</th>
              <th scope="col">Short</th>
              <th scope="col">As ligand</th>
              <th scope="col">For each formula unit</th>
              <th scope="col">At hand</th>
            </tr>
          </thead>
          <tbody>
            {list.lines.map((line) => (
              <tr key={`${line.kind} ${line.short}`}>
                <th scope="row">{line.what}</th>
                <td>{line.kind === 'metal' ? '' : line.short}</td>
                <td>{line.formula}</td>
                <td>{usesText(line)}</td>
                <td>{line.kind === 'metal' ? '' : line.onShelf ? 'on the shelf' : 'to order'}</td>
              </tr>
            ))}
          </tbody>
        </table>
      </div>
      <p className="soft small">
        Which salt, which solvent and how much excess is the business of a procedure. A charged ligand is
        brought in as its acid or a salt.
      </p>
      <CautionList cautions={list.cautions} of="order list" />
    </section>
  );
}
