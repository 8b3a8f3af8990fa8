import { massOfFormula, withoutCharge } from '../../../../core/library/molarMass';
import type { ParameterLibrary } from '../../../../core/library/parameterLibrary';
import { useSettings } from '../../../app/services';
import { useProject } from '../../../app/session/ProjectSession';
import { useLibrary } from '../../../app/session/useLibrary';
import { formatFigures, formatGiven } from '../../../parts';
import { orderList, type OrderLine, usesText } from '../../compare/order/orderList';
import { useCompared } from '../../compare/useCompared';
import { eachOnce, Paper, setsOf, type SheetOfPaper } from '../paper/Paper';
import { AllReady } from './AllReady';

interface OrderPageProps {
  readonly names: readonly string[];
  /** Amount of each complex, mmol. */
  readonly scale_mmol: number;
  readonly sheet: SheetOfPaper;
}

/** g; null for a charged ligand, whose acid or salt decides, and where a formula is not one of elements. */
export function massFor(line: OrderLine, amount_mmol: number, library: ParameterLibrary): number | null {
  if (line.kind === 'metal') return null;
  const ligand = [...library.ligands.values()].find(({ abbreviation }) => abbreviation === line.short);
  if (ligand === undefined || ligand.charge !== 0) return null;
  const molar = massOfFormula(withoutCharge(ligand.formula, ligand.charge));
  return molar === null ? null : (molar * amount_mmol) / 1000;
}

export const amountFor = ({ uses }: OrderLine, scale_mmol: number): number =>
  scale_mmol * uses.reduce((sum, { count }) => sum + count, 0);

/** What to have at hand for a list of complexes, with amounts for one batch of each. */
export function OrderPage({ names, scale_mmol, sheet }: OrderPageProps) {
  const { project } = useProject();
  const library = useLibrary();
  const { settings } = useSettings();
  const comparison = useCompared(names);
  const predictions = comparison.compared.map(({ prediction }) => prediction);
  const list = orderList(
    predictions.map(({ formula, composition }) => ({
      formula: composition.isomer == null ? formula : `${composition.isomer}-${formula}`,
      composition,
    })),
    new Set(settings.shelf),
    library,
  );
  return (
    <AllReady comparison={comparison}>
      {predictions.length > 0 && (
        <Paper
          {...sheet}
          kind="Order list"
          title="What to have at hand"
          about={project.name}
          madeWith={setsOf(predictions.map(({ madeWith }) => madeWith))}
          cautions={eachOnce([list.cautions, ...predictions.map(({ cautions }) => cautions)])}
          reading={`Amounts are the bare stoichiometry for ${formatGiven(scale_mmol)} mmol of each complex, without excess; a mass is that of the pure neutral ligand (standard atomic weights). Purity, salt, solvent and excess are the business of a procedure.`}
        >
          <h2>For {predictions.map(({ formula }) => formula).join(', ')}</h2>
          <table>
            <thead>
              <tr>
                <th scope="col">Got</th>
                <th scope="col">What</th>
                <th scope="col">Short</th>
                <th scope="col">As ligand</th>
                <th scope="col">Per formula unit</th>
                <th scope="col">Amount</th>
                <th scope="col">Mass</th>
                <th scope="col">Purity</th>
                <th scope="col">At hand</th>
              </tr>
            </thead>
            <tbody>
              {list.lines.map((line) => {
                const amount = amountFor(line, scale_mmol);
                const mass = massFor(line, amount, library);
                return (
                  <tr key={`${line.kind} ${line.short}`}>
                    <td>☐</td>
                    <th scope="row">{line.what}</th>
                    <td>{line.kind === 'metal' ? '' : line.short}</td>
                    <td>{line.formula}</td>
                    <td>{usesText(line)}</td>
                    <td className="figures">{formatFigures(amount, 3)} mmol</td>
                    <td className="figures">
                      {mass === null ? 'by the salt' : `${formatFigures(mass, 3)} g`}
                    </td>
                    <td />
                    <td>{line.onShelf ? 'on the shelf' : line.kind === 'metal' ? '' : 'to order'}</td>
                  </tr>
                );
              })}
            </tbody>
          </table>
        </Paper>
      )}
    </AllReady>
  );
}
