import { linkTo } from '../../app/router/RouterContext';
import { ViewHeader } from '../../app/shell/ViewHeader';
import { quantities, quantityIds, QuantityText } from '../../parts';

/** Every quantity with its account, and how ranges are made. */
export default function MethodsView() {
  return (
    <>
      <ViewHeader
        title="Methods and sources"
        summary="What each quantity is, how it is computed, after whom, and when it fails."
      />
      <div className="stack">
        {quantityIds.map((id) => (
          <section key={id} className="panel" aria-labelledby={`method-${id}`}>
            <h2 id={`method-${id}`}>{quantities[id].name}</h2>
            <QuantityText quantity={id} />
          </section>
        ))}
        <section className="panel stack" aria-labelledby="method-ranges">
          <h2 id="method-ranges">Ranges</h2>
          <p>
            A range in brackets is one standard deviation to each side and should hold 68 % of complexes.
            Doubts that two complexes share, such as that about a common ligand, move both the same way.
            Whether the ranges hold what they promise is checked on published complexes that inform no
            parameter, and in each project by its own measurements.
          </p>
        </section>
        <section className="panel stack" aria-labelledby="method-values">
          <h2 id="method-values">Values</h2>
          <p>
            Each value has its source and how far that was checked beside it in the{' '}
            <a href={linkTo({ view: 'library' })}>library</a>. A value that nobody has is missing there, not
            guessed.
          </p>
        </section>
      </div>
    </>
  );
}
