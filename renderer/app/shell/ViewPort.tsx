import { Suspense, useEffect, useRef } from 'react';
import { EmptyState, ErrorPanel } from '../../parts';
import { linkTo, useRouter } from '../router/RouterContext';
import { useProjectState } from '../session/ProjectSession';
import type { ViewDefinition } from '../view';
import { ViewHeader } from './ViewHeader';
import { ViewErrorBoundary } from './ViewErrorBoundary';

const home = (
  <a className="button" href={linkTo({ view: 'start' })}>
    All projects
  </a>
);

/** Draws the view that the address names, or says why it cannot. */
export function ViewPort({ views }: { readonly views: readonly ViewDefinition[] }) {
  const { address } = useRouter();
  const view = views.find(({ id }) => id === address.view);
  const place = `${address.view} ${address.project} ${address.item}`;
  const main = useFocusOnArrival(place);
  useWindowTitle(view?.title ?? 'Not found');
  return (
    <main id="content" className="frame-content" tabIndex={-1} ref={main}>
      <ViewErrorBoundary key={place}>
        {view ? (
          <Suspense fallback={<p className="soft">Opening…</p>}>
            <Placed view={view} />
          </Suspense>
        ) : (
          <>
            <ViewHeader title="Not found" />
            <EmptyState title="There is no such view" actions={home}>
              The address names “{address.view}”, which this version does not have.
            </EmptyState>
          </>
        )}
      </ViewErrorBoundary>
    </main>
  );
}

function Placed({ view }: { readonly view: ViewDefinition }) {
  const { address } = useRouter();
  const project = useProjectState();
  const View = view.component;
  if (view.place === 'workbench') return <View />;
  if (project.state === 'open' && project.session.project.id === address.project) return <View />;
  if (project.state === 'failed') {
    return (
      <ErrorPanel
        title="The project cannot be read"
        problems={[{ code: 'integrity', field: '', message: project.message }]}
      >
        {home}
      </ErrorPanel>
    );
  }
  if (project.state === 'missing' || address.project === null) {
    return (
      <>
        <ViewHeader title="Not found" />
        <EmptyState
          title="This project is not here"
          actions={
            <>
              {home}
              <a className="button" href={linkTo({ view: 'bin' })}>
                Look into the bin
              </a>
            </>
          }
        >
          It may have been deleted, or it belongs to another profile on this machine.
        </EmptyState>
      </>
    );
  }
  return <p className="soft">Opening the project…</p>;
}

/** After a change of view the keyboard goes on from the new content, not from the link that was left. */
function useFocusOnArrival(place: string) {
  const main = useRef<HTMLElement>(null);
  const first = useRef(true);
  useEffect(() => {
    if (first.current) first.current = false;
    else {
      main.current?.focus({ preventScroll: true });
      main.current?.scrollTo?.(0, 0);
    }
  }, [place]);
  return main;
}

function useWindowTitle(title: string): void {
  const project = useProjectState();
  const name = project.state === 'open' ? project.session.project.name : null;
  useEffect(() => {
    document.title = [title, name, 'Spinhue'].filter(Boolean).join(' – ');
  }, [title, name]);
}
