import { memo, useState, type PointerEvent } from 'react';
import { passedInWords, transmittanceAt, type VisibleTransmittance } from './passedRanges';
import { spectrumGradient, visibleFrom_nm, visibleTo_nm } from './spectralColour';
import './TransmissionStrip.css';

const spectrum = { backgroundImage: spectrumGradient() };

/** One clipped box per strip: cheap enough for thousands of rows, and it prints as it looks. */
function clipOf(samples: VisibleTransmittance): string {
  const count = samples.length;
  const points = Array.from({ length: count }, (_, index) => {
    const passed = Math.max(0, Math.min(1, samples[index]!));
    return `${((100 * index) / Math.max(1, count - 1)).toFixed(2)}% ${(100 * (1 - passed)).toFixed(1)}%`;
  });
  return `polygon(0% 100%, ${points.join(', ')}, 100% 100%)`;
}

interface TransmissionStripProps {
  /** At equal steps from 380 to 780 nm; null where no spectrum could be estimated. */
  readonly transmittance: VisibleTransmittance | null;
  /** With wavelength scale and readout under the pointer, for sheets; without, for table rows. */
  readonly scale?: boolean;
}

/**
 * What of the visible spectrum gets through: violet left, red right, the height of the coloured area is the share of
 * light that passes, the empty part above it is what is absorbed.
 */
export const TransmissionStrip = memo(function TransmissionStrip({
  transmittance,
  scale = false,
}: TransmissionStripProps) {
  const [under, setUnder] = useState<number | null>(null);
  if (transmittance === null || transmittance.length === 0) {
    return <span className="transmission-strip-missing">no spectrum</span>;
  }
  const words = passedInWords(transmittance);
  const read = (event: PointerEvent<HTMLElement>): void => {
    const box = event.currentTarget.getBoundingClientRect();
    if (box.width > 0)
      setUnder(visibleFrom_nm + ((visibleTo_nm - visibleFrom_nm) * (event.clientX - box.left)) / box.width);
  };
  const passed = under === null ? null : transmittanceAt(transmittance, under);
  return (
    <span className="transmission-strip" data-scale={scale || undefined}>
      <span
        className="transmission-strip-field"
        role="img"
        aria-label={`Transmitted light: ${words}`}
        title={scale ? undefined : words}
        onPointerMove={scale ? read : undefined}
        onPointerLeave={scale ? () => setUnder(null) : undefined}
      >
        <span className="transmission-strip-light" style={{ ...spectrum, clipPath: clipOf(transmittance) }} />
      </span>
      {scale && <TransmissionScale />}
      {scale && (
        <span className="transmission-strip-words">
          {passed === null || under === null
            ? words
            : `${Math.round(under)} nm: ${Math.round(passed * 100)} % passes`}
        </span>
      )}
    </span>
  );
});

/** Wavelength marks that line up with a strip of the same width, e.g. in the head of a table column. */
export function TransmissionScale() {
  return (
    <span className="transmission-scale" aria-hidden="true">
      {[400, 500, 600, 700].map((nm) => (
        <span
          key={nm}
          style={{ insetInlineStart: `${(100 * (nm - visibleFrom_nm)) / (visibleTo_nm - visibleFrom_nm)}%` }}
        >
          {nm}
        </span>
      ))}
    </span>
  );
}
