import { useMemo } from 'react';
import { fromWavenumber } from '../../../../core/units';
import type { Prediction } from '../../../../core/prediction/types';
import type { Candidate } from '../../../../core/record/project';
import { inputOf } from '../../../app/session/candidateInput';
import { useProject } from '../../../app/session/ProjectSession';
import { usePrediction } from '../../../app/session/usePrediction';
import {
  ErrorPanel,
  formatFigures,
  formatGiven,
  formatShare,
  Formula,
  NumberWithRange,
  TermSymbol,
  writeRange,
} from '../../../parts';
import { Paper, type SheetOfPaper } from '../paper/Paper';
import { PaperRemarks } from '../paper/PaperRemarks';
import { PaperSample } from '../paper/PaperSample';
import { PaperSpectrum } from '../paper/PaperSpectrum';
import { bandsOnPaper, kindOnPaper } from './bandsOnPaper';

const draws = 200;

interface CandidateCardProps {
  readonly candidate: Candidate;
  readonly sheet: SheetOfPaper;
}

/** Everything that is expected of one complex, on one page. */
export function CandidateCard({ candidate, sheet }: CandidateCardProps) {
  const { conditions } = useProject();
  const input = useMemo(() => inputOf(candidate, conditions), [candidate, conditions]);
  const { counterIon } = candidate;
  const options = useMemo(() => ({ counterIon, draws }), [counterIon]);
  const { outcome, current, error } = usePrediction(input, options);
  if (error !== null)
    return <ErrorPanel problems={[{ code: 'not-estimated', field: '', message: error }]} title="No card" />;
  if (outcome === null || !current) return <p className="soft">Estimating…</p>;
  if (!outcome.ok)
    return <ErrorPanel problems={outcome.problems} title="This candidate cannot be estimated as it stands" />;
  return <CardPage candidate={candidate} prediction={outcome.prediction} sheet={sheet} />;
}

const inNm = (energy_cm1: number, sigma_cm1: number): string => {
  const at = (value: number): number => fromWavenumber(Math.max(0, value), 'nm');
  const { value, range } = writeRange(at(energy_cm1), at(energy_cm1 - sigma_cm1), at(energy_cm1 + sigma_cm1));
  return range === null ? value : `${value} (${range})`;
};

function CardPage({
  candidate,
  prediction,
  sheet,
}: CandidateCardProps & { readonly prediction: Prediction }) {
  const { project } = useProject();
  const { composition, spin, conditions, cloud, colourAtThreeStrengths } = prediction;
  const { shown, left } = bandsOnPaper(prediction.bands);
  const kind = [composition.geometry.replaceAll('-', ' '), composition.isomer].filter(Boolean).join(', ');
  return (
    <Paper
      {...sheet}
      kind="Candidate card"
      title={<Formula formula={prediction.formula} />}
      about={
        <>
          {candidate.name !== '' && candidate.name !== null && (
            <>
              {candidate.name}
              <br />
            </>
          )}
          {kind}, d<sup>{prediction.dElectrons}</sup>
          {candidate.counterIon !== null && <>, with {candidate.counterIon}</>}
          <br />
          {project.name}
        </>
      }
      madeWith={[prediction.madeWith]}
      cautions={prediction.cautions}
      reading="Numbers in brackets are 68 % ranges; for ε the range that should hold 95 %. Band widths are full widths at half height."
    >
      <h2>
        Seen colour at {formatGiven(conditions.concentration_mM)} mM × {formatGiven(conditions.path_cm)} cm,
        daylight D65
      </h2>
      {colourAtThreeStrengths.length === 0 ? (
        <p>No colour could be estimated.</p>
      ) : (
        <div className="paper-samples">
          {colourAtThreeStrengths.map(({ factor, colour }) => (
            <PaperSample
              key={factor}
              colour={colour}
              caption={factor === 1 ? 'as stated' : factor < 1 ? 'a third of it' : `${factor} times it`}
            />
          ))}
        </div>
      )}
      {cloud && cloud.words.length > 0 && (
        <p>
          It could be:{' '}
          {cloud.words
            .slice(0, 6)
            .map(({ words, share }) => `${words} ${formatShare(share)}`)
            .join(', ')}{' '}
          of {cloud.draws.length} draws.
        </p>
      )}
      <div className="paper-columns">
        <div>
          <h2>Field and repulsion</h2>
          <table>
            <tbody>
              {(
                [
                  ['10Dq', prediction.tenDq],
                  ['B', prediction.racahB],
                  ['C', prediction.racahC],
                  ['ζ', prediction.zeta],
                ] as const
              ).map(([name, { value, sigma }]) => (
                <tr key={name}>
                  <th scope="row">{name}</th>
                  <td>
                    <NumberWithRange kind="interval" value={value} sigma={sigma} />
                  </td>
                </tr>
              ))}
            </tbody>
          </table>
        </div>
        <div>
          <h2>Spin state</h2>
          <p>
            <strong>{spin.words}</strong>
            {spin.probabilityHigh !== null &&
              `: high spin ${formatShare(spin.probabilityHigh)}, low spin ${formatShare(1 - spin.probabilityHigh)}`}
          </p>
          <p>
            Ground term <TermSymbol label={prediction.groundTerm} />; {spin.unpairedElectrons} unpaired
          </p>
          {spin.gap && (
            <p>
              Low above high spin by{' '}
              <NumberWithRange kind="interval" value={spin.gap.value} sigma={spin.gap.sigma} />
            </p>
          )}
          <p>
            Moment, spin-only (found for such ions):{' '}
            <NumberWithRange
              kind="plain"
              unit="μB"
              value={spin.momentSpinOnly_BM}
              range={spin.momentRange_BM}
            />
          </p>
        </div>
      </div>
      <h2>Bands</h2>
      <table>
        <thead>
          <tr>
            <th scope="col">To</th>
            <th scope="col">Kind</th>
            <th scope="col">Centre</th>
            <th scope="col">Wavelength / nm</th>
            <th scope="col">Width / cm⁻¹</th>
            <th scope="col">ε / L mol⁻¹ cm⁻¹</th>
          </tr>
        </thead>
        <tbody>
          {shown.map((band, index) => (
            <tr key={index}>
              <th scope="row">
                <TermSymbol label={band.label} /> {band.component}
              </th>
              <td>{kindOnPaper[band.kind]}</td>
              <td>
                <NumberWithRange value={band.energy_cm1} sigma={band.sigma_cm1} />
              </td>
              <td className="figures">{inNm(band.energy_cm1, band.sigma_cm1)}</td>
              <td className="figures">{formatFigures(band.width_cm1, 2)}</td>
              <td className="figures">
                {formatFigures(band.molarAbsorptivity, 1)} ({formatFigures(band.molarAbsorptivityRange[0], 1)}
                –{formatFigures(band.molarAbsorptivityRange[1], 1)})
              </td>
            </tr>
          ))}
        </tbody>
      </table>
      {left > 0 && <p className="paper-small">{left} more, weak or far up, stand on the sheet.</p>}
      <PaperSpectrum prediction={prediction} />
      {prediction.flags.length > 0 && (
        <>
          <h2>Where it may fail</h2>
          <PaperRemarks flags={prediction.flags} />
        </>
      )}
      <h2>Left out</h2>
      <p className="paper-small">{prediction.leftOut.join(' ') || 'Nothing known.'}</p>
    </Paper>
  );
}
