import { useCallback, useEffect, useMemo, useRef } from 'react';
import { menuCommand, useCommands } from '../commands';
import { addDemo } from '../boot/demo';
import { useRouter } from '../router/RouterContext';
import { useAction, useServices, useSettings } from '../services';
import { setTourPlace, useTourPlace } from './tourPlace';
import { tourSteps } from './steps';
import './Tour.css';

/** Goes to a stop in the demo project, which is put in again where somebody deleted it. */
export function useTour(): (step: number | null) => void {
  const { store } = useServices();
  const { go } = useRouter();
  const { set } = useSettings();
  const act = useAction();
  return useCallback(
    (step) => {
      set('tourDone', true);
      if (step === null) {
        setTourPlace(null);
        return;
      }
      void act(async () => {
        const projects = await store.projects.listWithCounts();
        const demo = projects.find((project) => project.demo)?.id ?? (await addDemo(store));
        const { view, project } = tourSteps[step]!;
        go({ view, project: project ? demo : null });
        setTourPlace(step);
      });
    },
    [store, go, set, act],
  );
}

/** The tour beside the view it speaks of: nothing is covered or locked, and it can be left at any time. */
export function Tour() {
  const place = useTourPlace();
  const visit = useTour();
  const panel = useRef<HTMLElement>(null);
  useCommands(useMemo(() => [menuCommand('show-tour', () => visit(0))], [visit]));
  useEffect(() => {
    if (place === null) return;
    // After the view has taken the focus on arrival.
    const timer = setTimeout(() => panel.current?.focus(), 50);
    return () => clearTimeout(timer);
  }, [place]);
  if (place === null) return null;
  const { title, text } = tourSteps[place]!;
  const last = place === tourSteps.length - 1;
  return (
    <section
      className="tour"
      aria-label="Tour"
      tabIndex={-1}
      ref={panel}
      onKeyDown={(event) => event.key === 'Escape' && visit(null)}
    >
      <h2>{title}</h2>
      <p>{text}</p>
      <div className="tour-actions">
        <span className="soft small">
          {place + 1} of {tourSteps.length}
        </span>
        <button type="button" className="button-quiet" onClick={() => visit(null)}>
          End the tour
        </button>
        {place > 0 && (
          <button type="button" onClick={() => visit(place - 1)}>
            Back
          </button>
        )}
        {!last && (
          <button type="button" className="button-main" onClick={() => visit(place + 1)}>
            Next
          </button>
        )}
      </div>
    </section>
  );
}

/** At the very first start: the tour is offered, never forced. */
export function TourOffer() {
  const { settings, set } = useSettings();
  const visit = useTour();
  if (settings.tourDone) return null;
  return (
    <section className="panel tour-offer" aria-label="Tour">
      <p>New here? Six stops through the demo project, two minutes.</p>
      <div className="tour-actions">
        <button type="button" className="button-quiet" onClick={() => set('tourDone', true)}>
          Not now
        </button>
        <button type="button" onClick={() => visit(0)}>
          Take the tour
        </button>
      </div>
    </section>
  );
}
