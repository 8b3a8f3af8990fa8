import { type ReactNode } from 'react';
import { type PlotView } from './view';

/** The drawing of a plot; the surface around it carries its name. Scales as a whole where a page is narrower (print). */
export function PlotSvg({ view, children }: { readonly view: PlotView; readonly children: ReactNode }) {
  const { width, height } = view;
  return (
    <svg width={width} height={height} viewBox={`0 0 ${width} ${height}`} aria-hidden="true">
      {children}
    </svg>
  );
}
