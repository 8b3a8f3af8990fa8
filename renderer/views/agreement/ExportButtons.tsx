import { siTableCsv, siTableText, type SiBand } from '../../../core/record/out/siTable';
import { toCsv } from '../../../core/record/out/csv';
import { currentContent } from '../../../core/record/revisions';
import { useAction, useServices } from '../../app/services';
import { useToast } from '../../parts';
import type { BandPair } from './recordPairs';
import type { RecordPairs } from './useRecordPairs';

interface ExportButtonsProps {
  readonly record: RecordPairs;
  readonly nameOf: (candidateId: string) => string;
}

const header = [
  'Complex',
  'Predicted band',
  'Predicted/cm-1',
  'Predicted standard deviation/cm-1',
  'Measured/cm-1',
  'Measured standard uncertainty/cm-1',
  'Read as',
  'Residual/cm-1',
  'Residual/sigma',
  'In-sample',
  'Frozen after measuring',
];

/** The pairs as tables for others: comma-separated, JSON, and as for supporting information. */
export function ExportButtons({ record, nameOf }: ExportButtonsProps) {
  const { host } = useServices();
  const act = useAction();
  const toast = useToast();
  const save = (kind: 'csv' | 'json' | 'text', suggestedName: string, data: string): void =>
    void act(async () => {
      const answer = await host.saveFile({ kind, suggestedName, data });
      if (answer.saved) toast({ message: `Saved as ${answer.name}` });
    });
  const si = (): SiBand[] => record.pairs.map((pair) => siBand(record, pair, nameOf));
  const rows = record.pairs.map((pair) => [
    nameOf(pair.candidateId),
    pair.predicted?.label ?? null,
    pair.predicted?.energy_cm1 ?? null,
    pair.predicted?.sigma_cm1 ?? null,
    pair.measured,
    pair.u,
    pair.feature,
    pair.residual,
    pair.score,
    pair.isInSample ? 'yes' : 'no',
    pair.frozenAfterwards ? 'yes' : 'no',
  ]);
  const json = (): string =>
    `${JSON.stringify(
      record.pairs.map((pair) => ({ complex: nameOf(pair.candidateId), ...pair })),
      null,
      1,
    )}\n`;
  return (
    <>
      <button type="button" onClick={() => save('csv', 'agreement.csv', toCsv([header, ...rows]))}>
        Pairs as CSV
      </button>
      <button type="button" onClick={() => save('json', 'agreement.json', json())}>
        Pairs as JSON
      </button>
      <button type="button" onClick={() => save('text', 'bands.txt', siTableText(si()))}>
        Bands as text
      </button>
      <button type="button" onClick={() => save('csv', 'bands.csv', siTableCsv(si()))}>
        Bands as CSV
      </button>
    </>
  );
}

function siBand(record: RecordPairs, pair: BandPair, nameOf: (id: string) => string): SiBand {
  const measurement = record.measurements.find(({ id }) => id === pair.measurementId)!;
  const content = currentContent(measurement);
  const place = Number(pair.id.split(' ').at(-1));
  const listed = content.kind === 'band list' ? (content.bands[place] ?? null) : null;
  const fitted = record.analyses
    .get(measurement.id)
    ?.bandFit?.bands.find(({ centre_cm1 }) => centre_cm1 === pair.measured);
  return {
    compound: nameOf(pair.candidateId),
    medium: content.conditions.solvent,
    energy_cm1: { value: pair.measured, u: pair.u },
    feature: pair.feature,
    molarAbsorptivity: listed?.molarAbsorptivity ?? null,
    width_cm1: listed?.width_cm1 ?? fitted?.fwhm_cm1 ?? null,
    assignment: pair.predicted?.label ?? null,
    calculated_cm1: pair.predicted?.energy_cm1 ?? null,
  };
}
