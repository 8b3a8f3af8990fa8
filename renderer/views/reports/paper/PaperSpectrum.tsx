import { useMemo } from 'react';
import { estimateDraws, spectrumRange } from '../../../../core/prediction';
import type { Prediction } from '../../../../core/prediction/types';
import { absorptionCurve, spectrumGrid } from '../../../../core/spectrum/absorptionCurve';
import { formatFigures } from '../../../parts';

const from_nm = 250;
const to_nm = 1400;
const grid = spectrumGrid(100, from_nm, to_nm).toReversed();
const draws = 200;
const [width, height] = [560, 190];
const box = { left: 54, right: 10, top: 8, bottom: 46 };
const [lowest, highest] = [1e7 / to_nm, 1e7 / from_nm];

const xOf = (at: number): number =>
  box.left + ((at - lowest) / (highest - lowest)) * (width - box.left - box.right);
const wavenumbers = [10_000, 15_000, 20_000, 25_000, 30_000, 35_000, 40_000];
const wavelengths = [1000, 700, 600, 500, 400, 350, 300, 250];

/** The range that bands in the visible need; the foot of a charge-transfer band may leave the frame. */
function topOf(high: Float64Array): number {
  const visible = high.filter((_, index) => grid[index]! <= 1e7 / 380);
  const most = Math.max(1, ...visible);
  const step = 10 ** Math.floor(Math.log10(most));
  return Math.ceil((1.05 * most) / step) * step;
}

/** Predicted spectrum for paper: a black line, its 68 % range in light grey between thin lines. */
export function PaperSpectrum({ prediction }: { readonly prediction: Prediction }) {
  const { bands, tenDq, racahB, racahC, composition } = prediction;
  const drawn = useMemo(() => {
    if (bands.length === 0) return null;
    const { molarAbsorptivity } = absorptionCurve(bands, grid);
    const { low, high } = spectrumRange(
      estimateDraws({ bands, tenDq, racahB, racahC, composition }, draws),
      grid,
    );
    const top = topOf(high);
    const yOf = (value: number): number =>
      height - box.bottom - (Math.min(value, top) / top) * (height - box.top - box.bottom);
    const point = (value: number, index: number): string =>
      `${xOf(grid[index]!).toFixed(1)} ${yOf(value).toFixed(1)}`;
    const line = (values: Float64Array): string => `M${Array.from(values, point).join('L')}`;
    const back = Array.from(low, point).reverse();
    return { line: line(molarAbsorptivity), extent: `${line(high)}L${back.join('L')}Z`, top, yOf };
  }, [bands, tenDq, racahB, racahC, composition]);
  if (drawn === null) return <p>No band of this complex could be estimated.</p>;
  const { line, extent, top, yOf } = drawn;
  const floor = height - box.bottom;
  return (
    <figure className="paper-figure">
      <svg
        viewBox={`0 0 ${width} ${height}`}
        role="img"
        aria-label="Predicted absorption spectrum with its 68 % range; the bands are in the table"
        fontSize="9.5"
      >
        <path d={extent} fill="#dddddd" stroke="#888888" strokeWidth="0.5" />
        <path d={line} fill="none" stroke="#000000" strokeWidth="1.3" />
        <path
          d={`M${box.left} ${box.top}V${floor}H${width - box.right}`}
          fill="none"
          stroke="#000000"
          strokeWidth="0.8"
        />
        {[0, 0.5, 1].map((share) => (
          <g key={share}>
            <path d={`M${box.left - 4} ${yOf(share * top)}H${box.left}`} stroke="#000000" strokeWidth="0.8" />
            <text x={box.left - 6} y={yOf(share * top) + 3} textAnchor="end">
              {share === 0 ? '0' : formatFigures(share * top, 2)}
            </text>
          </g>
        ))}
        {wavenumbers.map((at) => (
          <g key={at}>
            <path d={`M${xOf(at)} ${floor}v4`} stroke="#000000" strokeWidth="0.8" />
            <text x={xOf(at)} y={floor + 14} textAnchor={at === 40_000 ? 'end' : 'middle'}>
              {formatFigures(at, 3)}
            </text>
          </g>
        ))}
        {wavelengths.map((nm) => (
          <text
            key={nm}
            x={xOf(1e7 / nm)}
            y={floor + 27}
            textAnchor={nm === 250 ? 'end' : 'middle'}
            fill="#333333"
          >
            {nm}
          </text>
        ))}
        <text x={box.left - 6} y={floor + 14} textAnchor="end">
          cm⁻¹
        </text>
        <text x={box.left - 6} y={floor + 27} textAnchor="end" fill="#333333">
          nm
        </text>
        <text x={(box.left + width) / 2} y={height - 4} textAnchor="middle">
          wavenumber above, wavelength below; line: central estimate, grey: 68 % of the draws
        </text>
        <text transform={`translate(11 ${(box.top + floor) / 2}) rotate(-90)`} textAnchor="middle">
          ε / L mol⁻¹ cm⁻¹
        </text>
      </svg>
    </figure>
  );
}
