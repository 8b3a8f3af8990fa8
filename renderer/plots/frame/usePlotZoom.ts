import { useState } from 'react';
import { isZoomed, windowWith, zoomAbout, zoomTo, type Window } from './zoom';

interface Place {
  readonly x: number;
  readonly y: number;
}

export interface PlotZoom {
  readonly shown: Window;
  readonly zoomed: boolean;
  readonly by: (factor: number, about?: Place) => void;
  readonly to: (one: Place, other: Place) => void;
  /** Brings a place into sight where only a part is shown. */
  readonly show: (place: Place) => void;
  readonly reset: () => void;
}

const middle = ([from, to]: readonly [number, number]): number => (from + to) / 2;

/** What part of the plot is shown; falls back to the whole when the whole changes. */
export function usePlotZoom(whole: Window, axes: 'x' | 'xy'): PlotZoom {
  const key = [...whole.x, ...whole.y].join(' ');
  const [state, setState] = useState<{ key: string; window: Window } | null>(null);
  const shown = state?.key === key ? state.window : whole;
  const keep = (window: Window): void => setState({ key, window });
  return {
    shown,
    zoomed: isZoomed(shown, whole),
    by: (factor, about = { x: middle(shown.x), y: middle(shown.y) }) =>
      keep(zoomAbout(shown, whole, about, factor, axes)),
    to: (one, other) => keep(zoomTo(whole, one, other, axes)),
    show: (place) => {
      if (isZoomed(shown, whole)) keep(windowWith(shown, whole, place, axes));
    },
    reset: () => setState(null),
  };
}
