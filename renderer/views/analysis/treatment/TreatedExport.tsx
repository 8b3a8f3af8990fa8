import { writeJcamp } from '../../../../core/measured/jcamp/write';
import type { CurveData } from '../../../../core/record/curve';
import { curveCsv } from '../../../../core/record/out/curveCsv';
import type { Conditions } from '../../../../core/record/measurement';
import type { TreatmentStep } from '../../../../core/record/treatment';
import { useAction, useServices } from '../../../app/services';
import { useToast } from '../../../parts';
import { stepText } from './stepText';
import { treatedLabels } from './treatedLabels';

interface TreatedExportProps {
  readonly curve: CurveData;
  readonly steps: readonly TreatmentStep[];
  readonly conditions: Conditions;
  /** What the spectrum is of, and its name. */
  readonly title: string;
}

/** The treated numbers as files that other programs read, with the steps that led to them. */
export function TreatedExport({ curve, steps, conditions, title }: TreatedExportProps) {
  const { host } = useServices();
  const act = useAction();
  const toast = useToast();
  const save = (ending: 'jdx' | 'csv', write: () => string): void =>
    void act(async () => {
      const name = title.replace(/[^\p{L}\p{N}]+/gu, '-').replace(/^-+|-+$/g, '') || 'spectrum';
      const kind = ending === 'csv' ? 'csv' : 'spectrum';
      const answer = await host.saveFile({ kind, suggestedName: `${name}.${ending}`, data: write() });
      if (answer.saved) toast({ message: `Saved as ${answer.name}` });
    });
  const header = {
    title,
    origin: 'Spinhue',
    owner: conditions.operator ?? 'not stated',
    labels: treatedLabels(steps.map(stepText), conditions),
  };
  return (
    <>
      <button type="button" onClick={() => save('jdx', () => writeJcamp(curve, header))}>
        Save as JCAMP-DX
      </button>
      <button type="button" onClick={() => save('csv', () => curveCsv(curve))}>
        Save as CSV
      </button>
    </>
  );
}
