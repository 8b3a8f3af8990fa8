import { useState, type KeyboardEvent } from 'react';
import { nearestPoint, stepReading, type ReadPoint, type ReadSeries } from './series';

export interface PlotReading {
  /** Point being read; null once it no longer exists. */
  readonly active: ReadPoint | null;
  readonly text: string | null;
  readonly pointAt: (
    toPixel: (x: number, y: number) => readonly [number, number],
    place: readonly [number, number],
    alongX: boolean,
  ) => void;
  /** The point that the key led to; null for a key that reads nothing. */
  readonly onKey: (event: KeyboardEvent) => ReadPoint | null;
  readonly clear: () => void;
}

/** Reading a plot point by point, by pointer or arrow keys. */
export function usePlotReading(series: readonly ReadSeries[]): PlotReading {
  const [at, setAt] = useState<ReadPoint | null>(null);
  const there = at !== null && at.index < (series[at.series]?.xs.length ?? 0) ? at : null;
  return {
    active: there,
    text: there && series[there.series]!.text(there.index),
    pointAt: (toPixel, place, alongX) => setAt(nearestPoint(series, toPixel, place, alongX)),
    onKey: (event) => {
      const next = stepReading(series, there, event.key, event.shiftKey ? 10 : 1);
      if (next) setAt(next);
      return next;
    },
    clear: () => setAt(null),
  };
}
