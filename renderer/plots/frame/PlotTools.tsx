import { useState, type ReactNode, type RefObject } from 'react';
import { rasterise } from '../figure/rasterise';
import { fileStem, useSaveFigure } from '../figure/SaveFigure';
import { standaloneSvg, svgFileText } from '../figure/standaloneSvg';
import { type LegendEntry } from './Legend';
import { type PlotZoom } from './usePlotZoom';
import { type PlotView } from './view';

interface PlotToolsProps {
  readonly title: string;
  readonly stage: RefObject<HTMLDivElement | null>;
  readonly view: PlotView;
  readonly legend: readonly LegendEntry[];
  /** Null where the plot does not zoom. */
  readonly zoom: PlotZoom | null;
  readonly tableShown: boolean;
  readonly onTable: () => void;
  readonly empty: boolean;
  readonly children?: ReactNode;
}

/** Own switches of the plot, zoom, table, and the two figure files. */
export function PlotTools(props: PlotToolsProps) {
  const { title, stage, view, legend, zoom } = props;
  const save = useSaveFigure();
  const [failure, setFailure] = useState<string | null>(null);
  const figure = (): SVGSVGElement | null => {
    const drawing = stage.current?.querySelector<SVGSVGElement>('svg:not(.plot-overlay)');
    const samples = stage.current?.parentElement?.querySelectorAll<SVGSVGElement>('.plot-legend svg') ?? [];
    return drawing
      ? standaloneSvg({
          title,
          drawing,
          width: view.width,
          height: view.height,
          legend,
          samples: [...samples],
        })
      : null;
  };
  const saveAs = async (kind: 'svg' | 'png'): Promise<void> => {
    const svg = figure();
    if (!svg) return;
    try {
      setFailure(null);
      const text = svgFileText(svg);
      const [width, height] = [Number(svg.getAttribute('width')), Number(svg.getAttribute('height'))];
      const content =
        kind === 'svg' ? new Blob([text], { type: 'image/svg+xml' }) : await rasterise(text, width, height);
      await save(`${fileStem(title)}.${kind}`, content);
    } catch (error) {
      setFailure(error instanceof Error ? error.message : String(error));
    }
  };
  return (
    <div className="plot-tools">
      {!props.empty && (
        <>
          {props.children}
          {zoom && (
            <span className="plot-zoom" role="group" aria-label="Zoom">
              <button type="button" aria-label="Zoom in" onClick={() => zoom.by(0.6)}>
                +
              </button>
              <button
                type="button"
                aria-label="Zoom out"
                disabled={!zoom.zoomed}
                onClick={() => zoom.by(1 / 0.6)}
              >
                −
              </button>
              <button type="button" disabled={!zoom.zoomed} onClick={zoom.reset}>
                All
              </button>
            </span>
          )}
          <button type="button" aria-expanded={props.tableShown} onClick={props.onTable}>
            Table
          </button>
          <button type="button" aria-label={`Save ${title} as SVG`} onClick={() => void saveAs('svg')}>
            SVG
          </button>
          <button
            type="button"
            aria-label={`Save ${title} as PNG at 300 dpi`}
            onClick={() => void saveAs('png')}
          >
            PNG
          </button>
        </>
      )}
      {failure !== null && <p role="alert">The figure could not be saved: {failure}</p>}
    </div>
  );
}
