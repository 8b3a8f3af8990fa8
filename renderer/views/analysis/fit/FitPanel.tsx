import { useMemo, useState } from 'react';
import { findBands } from '../../../../core/measured/bandFit/findBands';
import type { BandFit, BandFitRequest } from '../../../../core/measured/bandFit/fitBands';
import type { GaussianBand } from '../../../../core/measured/bandFit/model';
import { recordBandFit } from '../../../../core/measured/records';
import type { BandFitRecord } from '../../../../core/record/analysis';
import type { YUnit } from '../../../../core/record/curve';
import { readNumber } from '../../../app/form';
import { ErrorPanel, Progress, SegmentedChoice } from '../../../parts';
import { BandFitPlot } from '../../../plots';
import { useFitting } from '../useFitting';
import type { FitPoints } from '../treatment/treated';
import { CountTable } from './CountTable';
import { FitResult } from './FitResult';
import { fitCurves, within } from './fitCurves';
import { StartTable, type StartDraft } from './StartTable';

interface FitPanelProps {
  /** Null where the spectrum has no wavenumbers. */
  readonly points: FitPoints | null;
  readonly quantity: YUnit;
  readonly kept: BandFitRecord | null;
  /** The latest fit whole, with what is not kept; it may be of other numbers. */
  readonly last: BandFit | null;
  readonly onFit: (fit: BandFit) => void;
  readonly onSave: (fit: BandFitRecord | null, label: string) => Promise<boolean>;
}

/** Where nobody said a width: d-d bands of solutions are 2000 to 5000 cm⁻¹ wide (common practice). */
const usualWidth_cm1 = 3000;

const text = (value: number, figures: number): string => String(Number(value.toPrecision(figures)));
const draftOf = ({ centre_cm1, fwhm_cm1, height }: GaussianBand): StartDraft => ({
  centre: text(centre_cm1, 5),
  width: text(fwhm_cm1, 3),
  height: text(height, 3),
});

/** A sum of Gaussians in wavenumber fitted to the spectrum; how many is for the chemist to say. */
export function FitPanel({ points, quantity, kept, last, onFit, onSave }: FitPanelProps) {
  const [start, setStart] = useState<readonly StartDraft[]>(() => (kept?.start ?? []).map(draftOf));
  const [baseline, setBaseline] = useState<'none' | 'linear'>(kept?.baseline ?? 'none');
  const [range, setRange] = useState(() => ({
    low: kept?.range_cm1 ? text(kept.range_cm1[0], 6) : '',
    high: kept?.range_cm1 ? text(kept.range_cm1[1], 6) : '',
  }));
  const [problem, setProblem] = useState<string | null>(null);
  const bands = useFitting<'bands'>();
  const counts = useFitting<'counts'>();
  const [compared, setCompared] = useState<Awaited<ReturnType<typeof counts.fit>>>(null);
  const limits = limitsOf(range);
  const used = useMemo(
    () => (points === null ? null : within(points, limits)),
    // The two ends, not the pair: it is made anew with each drawing.
    // eslint-disable-next-line react-hooks/exhaustive-deps
    [points, limits?.[0], limits?.[1]],
  );
  const curves = useMemo(() => (kept === null || used === null ? null : fitCurves(kept, used)), [kept, used]);
  if (points === null || used === null)
    return (
      <section className="panel" aria-labelledby="analysis-fit">
        <h2 id="analysis-fit">Band fit</h2>
        <p className="soft">A fit needs an axis of wavelength or wavenumber: state the units above.</p>
      </section>
    );
  const data = { wavenumber_cm1: used.wavenumber_cm1, absorbance: used.value, baseline };
  const suggest = (): void => {
    setStart(findBands(used.wavenumber_cm1, used.value).map(draftOf));
    setProblem(null);
  };
  const fit = (): void => {
    const read = start.map(readStart);
    const bad = read.findIndex((each) => each === null);
    if (start.length === 0) return setProblem('Say where bands are: add one, or take the suggestion.');
    if (bad >= 0) return setProblem(`Band ${bad + 1}: centre, width and height must be numbers above zero.`);
    setProblem(null);
    const request: BandFitRequest = { ...data, start: read as GaussianBand[] };
    void bands.fit({ kind: 'bands', request }).then(async (result) => {
      if (result === null) return;
      onFit(result);
      await onSave(recordBandFit(request, result, limits), `fit ${result.bands.length} bands`);
    });
  };
  /** The kept fit once more, for what is not kept with it: correlation and remarks. */
  const again = (): void => {
    if (kept === null) return;
    const request: BandFitRequest = { ...data, baseline: kept.baseline, start: kept.start };
    void bands.fit({ kind: 'bands', request }).then((result) => {
      if (result === null) return;
      if (isSame(kept, result)) onFit(result);
      else setProblem('The same start gives another fit now: fit again to keep it.');
    });
  };
  return (
    <section className="panel stack" aria-labelledby="analysis-fit">
      <h2 id="analysis-fit">Band fit</h2>
      <BandFitPlot
        measured={used}
        fit={curves?.fit ?? null}
        bands={curves?.bands ?? []}
        baseline={curves?.baseline ?? null}
        noise={kept === null ? null : noiseOf(kept)}
        quantity={quantity === 'molar-absorptivity' ? 'Molar absorptivity / L mol⁻¹ cm⁻¹' : 'Absorbance'}
        title="Spectrum and fitted bands"
        note="Bands are Gaussians in wavenumber. A maximum is not a centre: overlap moves it. Click on the curve, or press Enter on the point being read, to start a band there."
        starts={start.flatMap(({ centre }) => startPlace(centre))}
        onPick={({ wavenumber_cm1: centre_cm1, value: height }) => {
          if (height > 0) setStart([...start, draftOf({ centre_cm1, fwhm_cm1: usualWidth_cm1, height })]);
        }}
      />
      <StartTable start={start} range={range} onStart={setStart} onRange={setRange} />
      <div className="analysis-actions">
        <SegmentedChoice
          legend="Baseline of the fit"
          options={[
            { id: 'none', label: 'no baseline' },
            { id: 'linear', label: 'linear baseline' },
          ]}
          value={baseline}
          onChange={setBaseline}
        />
        <button type="button" onClick={suggest}>
          Suggest from the curve
        </button>
        <button
          type="button"
          onClick={() => setStart([...start, { centre: '', width: String(usualWidth_cm1), height: '' }])}
        >
          Add a band
        </button>
        <button
          type="button"
          disabled={counts.running}
          onClick={() => void counts.fit({ kind: 'counts', request: data, most: 5 }).then(setCompared)}
        >
          Compare one to five bands
        </button>
        <button type="button" className="button-main" disabled={bands.running} onClick={fit}>
          Fit
        </button>
        {kept !== null && (
          <button
            type="button"
            className="button-quiet"
            onClick={() => void onSave(null, 'remove a band fit')}
          >
            Remove the fit
          </button>
        )}
      </div>
      {(bands.running || counts.running) && (
        <Progress
          label={bands.running ? 'Fitting' : 'Comparing numbers of bands'}
          done={0}
          total={null}
          onCancel={bands.running ? bands.stop : counts.stop}
        />
      )}
      {[problem, bands.error, counts.error].map(
        (message) =>
          message !== null && (
            <ErrorPanel
              key={message}
              title="No fit"
              problems={[{ code: 'out-of-range', field: '', message }]}
            />
          ),
      )}
      {compared && (
        <CountTable
          counts={compared}
          onTake={(fitted) => {
            setStart(fitted.bands.map(draftOf));
            setCompared(null);
          }}
        />
      )}
      {kept !== null && (
        <FitResult
          kept={kept}
          last={last !== null && isSame(kept, last) ? last : null}
          onAgain={again}
          running={bands.running}
        />
      )}
    </section>
  );
}

const isSame = (kept: BandFitRecord, fit: BandFit): boolean =>
  kept.bands.length === fit.bands.length &&
  kept.bands.every(
    ({ centre_cm1 }, index) => Math.abs(centre_cm1 - fit.bands[index]!.centre_cm1) < 1e-6 * centre_cm1,
  );

/** Standard deviation of one point about the fit; null where as many points as parameters leave none. */
function noiseOf({ rss, points, bands, baseline }: BandFitRecord): number | null {
  const free = points - 3 * bands.length - (baseline === 'linear' ? 2 : 0);
  return free > 0 ? Math.sqrt(rss / free) : null;
}

/** A centre while it is being typed: drawn as soon as it makes sense. */
const startPlace = (centre: string): number[] => {
  const at = readNumber(centre);
  return at !== null && at > 0 ? [at] : [];
};

function limitsOf({ low, high }: { low: string; high: string }): [number, number] | null {
  const [from, to] = [readNumber(low), readNumber(high)];
  if (from === null && to === null) return null;
  const ends: [number, number] = [from ?? 0, to ?? 1e6];
  return ends[0] < ends[1] ? ends : null;
}

function readStart({ centre, width, height }: StartDraft): GaussianBand | null {
  const [centre_cm1, fwhm_cm1, top] = [readNumber(centre), readNumber(width), readNumber(height)];
  if (centre_cm1 === null || fwhm_cm1 === null || top === null) return null;
  return centre_cm1 > 0 && fwhm_cm1 > 0 && top > 0 ? { centre_cm1, fwhm_cm1, height: top } : null;
}
