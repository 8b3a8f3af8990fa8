import { type ReactNode } from 'react';

/** One line of a legend; `sample` is SVG inside a box of 32 × 14. */
export interface LegendEntry {
  readonly text: string;
  readonly sample: ReactNode;
}

/** What each line style and marker means. */
export function Legend({ entries }: { readonly entries: readonly LegendEntry[] }) {
  if (entries.length === 0) return null;
  return (
    <ul className="plot-legend" aria-label="Legend">
      {entries.map(({ text, sample }) => (
        <li key={text}>
          <svg width={32} height={14} viewBox="0 0 32 14" aria-hidden="true">
            {sample}
          </svg>
          <span>{text}</span>
        </li>
      ))}
    </ul>
  );
}
