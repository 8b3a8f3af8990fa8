import type { bandFeatures, MeasurementContent } from '../../../../core/record/measurement';
import type { Sample } from '../../../../core/record/sample';

/** Kinds that are typed; spectra come from files. */
export type TypedKind = 'band list' | 'moment' | 'observed colour' | 'note';
export type Feature = (typeof bandFeatures)[number];

/** One band as typed; texts, so that a slip stays on screen until it is mended. */
export interface BandDraft {
  readonly position: string;
  readonly uncertainty: string;
  readonly absorptivity: string;
  readonly feature: Feature;
}

export interface ConditionsDraft {
  readonly batch: string;
  readonly phase: NonNullable<Sample['phase']> | '';
  readonly date: string;
  readonly operator: string;
  readonly solvent: string;
  readonly temperature: string;
  readonly concentration: string;
  readonly path: string;
  readonly instrument: string;
  readonly remark: string;
}

export interface MeasurementDraft extends ConditionsDraft {
  readonly kind: TypedKind;
  readonly reportedIn: 'nm' | 'cm-1';
  readonly bands: readonly BandDraft[];
  readonly moment: string;
  readonly momentUncertainty: string;
  readonly method: 'Evans' | 'balance' | 'magnetometer' | 'typed';
  readonly words: string;
  readonly lightSource: string;
}

export const blankBand: BandDraft = { position: '', uncertainty: '', absorptivity: '', feature: 'maximum' };

export const blankConditions = (operator: string, date: string): ConditionsDraft => ({
  batch: '',
  phase: '',
  date,
  operator,
  solvent: '',
  temperature: '',
  concentration: '',
  path: '',
  instrument: '',
  remark: '',
});

export const blankMeasurement = (operator: string, date: string): MeasurementDraft => ({
  ...blankConditions(operator, date),
  kind: 'band list',
  reportedIn: 'nm',
  bands: [blankBand],
  moment: '',
  momentUncertainty: '',
  method: 'Evans',
  words: '',
  lightSource: '',
});

const text = (value: number | null | undefined): string =>
  value === null || value === undefined ? '' : String(Number(value.toPrecision(7)));

/** The draft of a correction: what stands, ready to be mended. Null for kinds that cannot be typed. */
export function draftOf(content: MeasurementContent, sample: Sample | null): MeasurementDraft | null {
  const { conditions, remark } = content;
  const base: MeasurementDraft = {
    ...blankMeasurement(conditions.operator ?? '', conditions.date ?? ''),
    batch: sample?.batch ?? '',
    phase: sample?.phase ?? '',
    solvent: conditions.solvent ?? '',
    temperature: text(conditions.temperature_K?.value),
    concentration: text(conditions.concentration_mM?.value),
    path: text(conditions.path_cm?.value),
    instrument: conditions.instrument ?? '',
    remark,
  };
  switch (content.kind) {
    case 'band list':
      return {
        ...base,
        kind: content.kind,
        reportedIn: content.reportedIn,
        bands: content.bands.map(({ energy_cm1, molarAbsorptivity, feature }) => ({
          position: text(content.reportedIn === 'nm' ? 1e7 / energy_cm1.value : energy_cm1.value),
          uncertainty: text(
            energy_cm1.u !== null && content.reportedIn === 'nm'
              ? (1e7 * energy_cm1.u) / energy_cm1.value ** 2
              : energy_cm1.u,
          ),
          absorptivity: text(molarAbsorptivity?.value),
          feature,
        })),
      };
    case 'moment':
      return {
        ...base,
        kind: content.kind,
        method: content.method,
        moment: text(content.moment_BM.value),
        momentUncertainty: text(content.moment_BM.u),
      };
    case 'observed colour':
      return { ...base, kind: content.kind, words: content.words, lightSource: content.lightSource ?? '' };
    case 'note':
      return { ...base, kind: content.kind };
    default:
      return null;
  }
}
