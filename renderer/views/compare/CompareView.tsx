import { useMemo } from 'react';
import { linkTo, useRouter } from '../../app/router/RouterContext';
import { useProject } from '../../app/session/ProjectSession';
import { ViewHeader } from '../../app/shell/ViewHeader';
import { EmptyState, ErrorPanel } from '../../parts';
import { counted } from '../../store';
import { comparedAtMost, compareItem, namesIn } from './compareItem';
import { CompareSpectra } from './CompareSpectra';
import { CompareTable } from './CompareTable';
import { OrderPanel } from './order/OrderPanel';
import { useCompared } from './useCompared';
import './CompareView.css';

/** Complexes side by side, in one picture, and what to order for them. */
export default function CompareView() {
  const { address, go } = useRouter();
  const { project } = useProject();
  const names = useMemo(() => namesIn(address.item), [address.item]);
  const { compared, waiting, refused } = useCompared(names);
  const ordered = useMemo(
    () =>
      compared.map(({ prediction: { formula, composition } }) => ({
        formula: composition.isomer == null ? formula : `${composition.isomer}-${formula}`,
        composition,
      })),
    [compared],
  );
  const back = (
    <a className="button" href={linkTo({ view: 'candidates', project: project.id })}>
      Candidates
    </a>
  );
  if (names.length === 0) {
    return (
      <>
        <ViewHeader title="Compare" />
        <EmptyState title="Nothing is chosen" actions={back}>
          Select two to six candidates in the table, or results of a search, and press Compare.
        </EmptyState>
      </>
    );
  }
  const sideBySide = names.length <= comparedAtMost;
  const remove = (name: string): void =>
    go({
      view: 'compare',
      project: project.id,
      item: compareItem(names.filter((each) => each !== name)) || null,
    });
  return (
    <>
      <ViewHeader
        title={sideBySide ? 'Compare' : 'Order list'}
        summary={
          waiting > 0
            ? `${counted(names.length, 'complex').replace('complexs', 'complexes')}, ${waiting} still being estimated…`
            : sideBySide
              ? 'What is expected of each; ranges hold 68 %.'
              : `Side by side are at most ${comparedAtMost}; for ${names.length} the order list is shown.`
        }
        actions={back}
      />
      <div className="stack" aria-busy={waiting > 0}>
        <ErrorPanel
          title="Not shown"
          problems={refused.map(({ name, message }) => ({
            code: 'not-estimated' as const,
            field: name,
            message,
          }))}
        />
        {compared.length > 0 && sideBySide && (
          <>
            <section className="panel" aria-label="Side by side">
              <CompareTable compared={compared} onRemove={remove} />
            </section>
            <CompareSpectra compared={compared} />
          </>
        )}
        {compared.length > 0 && <OrderPanel complexes={ordered} />}
      </div>
    </>
  );
}
