import { useLayoutEffect, useRef, useState, type ReactNode, type Ref } from 'react';
import { standingCaution } from '../../../../core/library/cautions';
import type { Caution } from '../../../../core/prediction/types';
import { minuteOf, useServices } from '../../../app/services';
import { margin_mm, paperSizes, typeSizes_pt, type PaperSize } from './paperSize';
import './paper.css';

/** Parameters and model of the numbers on a page. */
export interface MadeWith {
  readonly parameterSet: string;
  readonly parameterHash: string;
  readonly modelVersion: string;
}

export interface SheetOfPaper {
  readonly size: PaperSize;
  readonly page: Ref<HTMLElement>;
  /** Who hands it over; may be empty. */
  readonly by: string;
}

interface PaperProps extends SheetOfPaper {
  /** `Candidate card` */
  readonly kind: string;
  readonly title: ReactNode;
  readonly about: ReactNode;
  readonly madeWith: readonly MadeWith[];
  /** No page goes without the cautions of what is on it. */
  readonly cautions: readonly Caution[];
  /** What the numbers are, `Ranges in brackets hold 68 %.` */
  readonly reading: string;
  readonly children: ReactNode;
}

const pxPerMm = 96 / 25.4;

/** Takes the largest type with which everything fits on one page. */
function useFit(size: PaperSize, content: unknown) {
  const body = useRef<HTMLDivElement>(null);
  const [fits, setFits] = useState(true);
  useLayoutEffect(() => {
    const element = body.current;
    if (!element) return;
    // A hair less than the page, for rounding between screen and printer.
    const room = (paperSizes[size].height_mm - 2 * margin_mm) * pxPerMm - 4;
    const held = typeSizes_pt.some((type) => {
      element.style.fontSize = `${type}pt`;
      return element.offsetHeight <= room;
    });
    setFits(held);
  }, [size, content]);
  return { body, fits };
}

/** One page: head, content, cautions, and at the foot what the numbers were made with. */
export function Paper(props: PaperProps) {
  const { size, kind, title, about, madeWith, cautions, reading, by, page, children } = props;
  const { host } = useServices();
  const { body, fits } = useFit(size, props);
  const [made] = useState(() => minuteOf(new Date().toISOString()));
  return (
    <>
      {!fits && (
        <p className="report-note" role="status">
          This does not fit on one page in legible type: it will take two. Take something off it, or hand it
          over as it is.
        </p>
      )}
      <article className="paper" data-size={size} ref={page} aria-label={kind}>
        <div ref={body}>
          <header className="paper-head">
            <div>
              <p className="paper-kind">{kind}</p>
              <h1>{title}</h1>
            </div>
            <p className="paper-about">
              {about}
              {by !== '' && (
                <>
                  <br />
                  {by}
                </>
              )}
            </p>
          </header>
          {children}
          <PaperCautions cautions={cautions} />
          <footer className="paper-foot">
            <p>{reading}</p>
            {madeWith.map(({ parameterSet, parameterHash, modelVersion }) => (
              <p key={parameterHash + modelVersion}>
                Parameters: {parameterSet}, hash {parameterHash}; model version {modelVersion}.
              </p>
            ))}
            <p>
              Spinhue {host.info.version}, {made}. Predictions are estimates and no measurement.
            </p>
          </footer>
        </div>
      </article>
    </>
  );
}

function PaperCautions({ cautions }: { readonly cautions: readonly Caution[] }) {
  return (
    <section className="paper-cautions" aria-label="Safety cautions">
      <h2>Before anything is made</h2>
      {cautions.length === 0 ? (
        <p>No caution on file for these substances. That means not assessed, not safe.</p>
      ) : (
        <ul className="paper-small">
          {cautions.map(({ id, about, text, codes, source }) => (
            <li key={`${id} ${about}`}>
              <strong>{about}.</strong> {text} {codes.join(', ')} <em>({source})</em>
            </li>
          ))}
        </ul>
      )}
      <p>{standingCaution}</p>
    </section>
  );
}

/** Cautions of several complexes, each once. */
export const eachOnce = (lists: readonly (readonly Caution[])[]): readonly Caution[] => [
  ...new Map(lists.flat().map((caution) => [`${caution.id} ${caution.about}`, caution])).values(),
];

/** Sets of parameters of several predictions, each once. */
export const setsOf = (list: readonly MadeWith[]): readonly MadeWith[] => [
  ...new Map(list.map((each) => [each.parameterHash + each.modelVersion, each])).values(),
];
