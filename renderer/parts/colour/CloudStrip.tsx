import { memo, useMemo } from 'react';
import { type ColourCloud } from '../../../core/colour/types';
import { formatShare } from '../number';
import { sortedByHue } from './colourNumbers';
import './CloudStrip.css';

const rows = 5;
/** Patches of the compact form: a table shows many strips at once. */
const compactPatches = 40;

/** `violet 62 %, lilac 30 %, other names 8 %`. */
export function cloudInWords({ words }: ColourCloud, shown = 3): string {
  const named = words.slice(0, shown);
  const rest = words.slice(shown).reduce((sum, { share }) => sum + share, 0);
  const parts = named.map(({ words: name, share }) => `${name} ${formatShare(share)}`);
  return [...parts, ...(rest > 0.005 ? [`other names ${formatShare(rest)}`] : [])].join(', ');
}

interface CloudStripProps {
  readonly cloud: ColourCloud | null;
  /** Hides the words, for table rows; they stay the accessible name. */
  readonly compact?: boolean;
}

/** Every draw from the uncertainties as a small patch, sorted by hue: how wide the range of possible colours is. */
export const CloudStrip = memo(function CloudStrip({ cloud, compact = false }: CloudStripProps) {
  const sorted = useMemo(() => (cloud ? sortedByHue(cloud.draws) : []), [cloud]);
  if (cloud === null || sorted.length === 0) {
    return <span className="cloud-strip-words">no range of colours estimated</span>;
  }
  const every = compact ? Math.max(1, Math.ceil(sorted.length / compactPatches)) : 1;
  const patches = sorted.filter((_, index) => index % every === 0);
  const height = compact ? 1 : rows;
  const columns = Math.ceil(patches.length / height);
  const words = cloudInWords(cloud);
  return (
    <span className="cloud-strip" data-compact={compact || undefined}>
      <svg
        className="cloud-strip-field"
        role="img"
        aria-label={`${sorted.length} possible colours: ${words}`}
        viewBox={`0 0 ${columns} ${height}`}
        preserveAspectRatio="none"
        shapeRendering="crispEdges"
      >
        {patches.map((colour, index) => (
          <rect
            key={index}
            x={Math.floor(index / height)}
            y={index % height}
            width={1.02}
            height={1.02}
            fill={colour.srgb}
          />
        ))}
      </svg>
      {!compact && <span className="cloud-strip-words">{words}</span>}
    </span>
  );
});
