import type { ReactNode } from 'react';
import { colourDifference } from '../../../../core/colour';
import type { Prediction } from '../../../../core/prediction/types';
import type { BandKind } from '../../../../core/transitions/types';
import { useProject } from '../../../app/session/ProjectSession';
import { formatShare, Formula, NumberWithRange, TermSymbol } from '../../../parts';
import { useCompared } from '../../compare/useCompared';
import { eachOnce, Paper, setsOf, type SheetOfPaper } from '../paper/Paper';
import { PaperRemarks } from '../paper/PaperRemarks';
import { PaperSample } from '../paper/PaperSample';
import { AllReady } from './AllReady';

const bands =
  (kinds: readonly BandKind[], most: number) =>
  ({ bands: all }: Prediction): ReactNode => {
    const shown = all.filter(({ kind }) => kinds.includes(kind)).slice(0, most);
    if (shown.length === 0) return 'none';
    return shown.map(({ label, energy_cm1, sigma_cm1 }, index) => (
      <div key={index}>
        <TermSymbol label={label} /> <NumberWithRange value={energy_cm1} sigma={sigma_cm1} />
      </div>
    ));
  };

function difference({ colour }: Prediction, first: Prediction): ReactNode {
  if (colour === first.colour) return 'the first';
  if (colour === null || first.colour === null) return 'not estimated';
  return colourDifference(colour.lab, first.colour.lab).toFixed(0);
}

const rows: readonly (readonly [string, (each: Prediction, first: Prediction) => ReactNode])[] = [
  ['Seen colour', ({ colour }) => <PaperSample colour={colour} />],
  ['ΔE₀₀ to the first', difference],
  ['10Dq', ({ tenDq: { value, sigma } }) => <NumberWithRange kind="interval" value={value} sigma={sigma} />],
  ['B', ({ racahB: { value, sigma } }) => <NumberWithRange kind="interval" value={value} sigma={sigma} />],
  [
    'Spin state',
    ({ spin }) => (
      <>
        <strong>{spin.words}</strong>
        {spin.probabilityHigh !== null && <div>high spin {formatShare(spin.probabilityHigh)}</div>}
      </>
    ),
  ],
  [
    'Moment',
    ({ spin }) => (
      <NumberWithRange kind="plain" unit="μB" value={spin.momentSpinOnly_BM} range={spin.momentRange_BM} />
    ),
  ],
  ['Ground term', ({ groundTerm }) => <TermSymbol label={groundTerm} />],
  ['Spin-allowed bands', bands(['spin-allowed'], 4)],
  ['Lowest spin-flip level', bands(['spin-forbidden'], 1)],
  ['Charge transfer', bands(['LMCT', 'MLCT', 'intervalence', 'ligand'], 1)],
  [
    'Where it may fail',
    ({ flags }) => <PaperRemarks flags={flags.filter(({ severity }) => severity !== 'note')} />,
  ],
];

interface ComparisonSheetProps {
  readonly names: readonly string[];
  readonly sheet: SheetOfPaper;
}

/** Two to six complexes side by side on one page. */
export function ComparisonSheet({ names, sheet }: ComparisonSheetProps) {
  const { project } = useProject();
  const comparison = useCompared(names);
  const predictions = comparison.compared.map(({ prediction }) => prediction);
  const [first] = predictions;
  return (
    <AllReady comparison={comparison}>
      {first && (
        <Paper
          {...sheet}
          kind="Comparison sheet"
          title={predictions.length === 1 ? 'One complex' : `${predictions.length} complexes side by side`}
          about={project.name}
          madeWith={setsOf(predictions.map(({ madeWith }) => madeWith))}
          cautions={eachOnce(predictions.map(({ cautions }) => cautions))}
          reading={`Numbers in brackets are 68 % ranges. Colours at ${first.conditions.concentration_mM} mM × ${first.conditions.path_cm} cm or the strength that a candidate names, daylight D65. Notes and what each estimate leaves out stand on the card of each complex.`}
        >
          <table className="paper-compared">
            <thead>
              <tr>
                <td />
                {predictions.map(({ id, formula, composition }) => (
                  <th key={id} scope="col">
                    <strong>
                      <Formula formula={formula} />
                    </strong>
                    <div>
                      {[composition.geometry.replaceAll('-', ' '), composition.isomer]
                        .filter(Boolean)
                        .join(', ')}
                    </div>
                  </th>
                ))}
              </tr>
            </thead>
            <tbody>
              {rows.map(([name, cell]) => (
                <tr key={name}>
                  <th scope="row">{name}</th>
                  {predictions.map((each) => (
                    <td key={each.id}>{cell(each, first)}</td>
                  ))}
                </tr>
              ))}
            </tbody>
          </table>
        </Paper>
      )}
    </AllReady>
  );
}
