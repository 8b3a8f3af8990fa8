import {
  computedLines,
  LevelDiagram,
  BandFitPlot,
  BlandAltmanPlot,
  ColourCloudPlot,
  MomentPlot,
  ParetoPlot,
  ParityPlot,
  ResidualPlot,
  SpectrumPlot,
} from '../../plots';
import { fit, moments, pairs, paretoPoints } from './plotSamples';
import { bands, chargeTransfer, cloud, grid, sumOf, violet } from './samples';
import { Section } from './Section';

const octahedral = { geometry: 'octahedral' } as const;
const d6 = computedLines({ ...octahedral, dElectrons: 6, B: 800, C: 3_600, axes: 'over-B', upTo: 40 });
const d5 = computedLines({ ...octahedral, dElectrons: 5, B: 800, C: 3_600, axes: 'over-B', upTo: 40 });
const d3 = computedLines({ ...octahedral, dElectrons: 3, B: 725, C: 2_900, axes: 'absolute', upTo: 30_000 });
const all = [...bands, chargeTransfer];
const mean = pairs.reduce((sum, { measured, predicted }) => sum + measured - predicted, 0) / pairs.length;
const sd = Math.sqrt(
  pairs.reduce((sum, { measured, predicted }) => sum + (measured - predicted - mean) ** 2, 0) /
    (pairs.length - 1),
);

export function PlotsPage() {
  return (
    <>
      <Section title="Levels">
        <LevelDiagram
          title="Levels of d6, octahedral"
          axes="over-B"
          lines={d6}
          candidate={{ x: 18, sigma: 1.6, name: 'candidate' }}
        />
        <div className="gallery-row">
          <div className="gallery-wide">
            <LevelDiagram
              title="Levels of d3, octahedral"
              axes="absolute"
              lines={d3}
              candidate={{ x: 17_400, sigma: 1_100, name: '[Cr(H2O)6]3+' }}
            />
          </div>
          <div className="gallery-wide">
            <LevelDiagram title="Levels of d5, octahedral" axes="over-B" lines={d5} />
          </div>
        </div>
        <LevelDiagram title="No field" axes="absolute" lines={[]} />
      </Section>
      <Section title="Spectrum">
        <SpectrumPlot
          predicted={{ wavenumber_cm1: grid, value: sumOf(all) }}
          range={{ low: sumOf(all, 0.6, 500), high: sumOf(all, 1.6, -500) }}
          bands={all}
          measured={[{ name: 'in 0.1 M acid', wavenumber_cm1: grid, value: sumOf(bands, 1.1, 260) }]}
        />
        <SpectrumPlot title="Nothing estimated" predicted={null} />
      </Section>
      <Section title="Colour cloud">
        <ColourCloudPlot
          draws={cloud.draws}
          centre={violet}
          target={{ lab: [50, 40, -40], tolerance: 20, name: 'wished violet' }}
        />
      </Section>
      <Section title="Agreement">
        <div className="gallery-row">
          <div className="gallery-wide">
            <ParityPlot pairs={pairs} quantity="10Dq" onOpen={() => undefined} />
          </div>
          <div className="gallery-wide">
            <ResidualPlot pairs={pairs} quantity="10Dq" />
            <BlandAltmanPlot
              pairs={pairs}
              quantity="10Dq"
              limits={{
                bias: mean,
                lower: mean - 1.96 * sd,
                upper: mean + 1.96 * sd,
                biasInterval: [
                  mean - (2 * sd) / Math.sqrt(pairs.length),
                  mean + (2 * sd) / Math.sqrt(pairs.length),
                ],
              }}
            />
          </div>
        </div>
        <ParityPlot title="No pairs" pairs={[]} quantity="10Dq" />
      </Section>
      <Section title="Moment and choice">
        <div className="gallery-row">
          <div className="gallery-wide">
            <MomentPlot series={moments} />
          </div>
          <div className="gallery-wide">
            <ParetoPlot points={paretoPoints} costName="ligands to order" onOpen={() => undefined} />
          </div>
        </div>
      </Section>
      <Section title="Band fit">
        <BandFitPlot {...fit} noise={0.004} quantity="Absorbance" />
      </Section>
    </>
  );
}
