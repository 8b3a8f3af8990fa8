import type { bandFeatures, ListedBand, MeasurementContent } from '../../../../core/record/measurement';
import type { Sample } from '../../../../core/record/sample';

/** Kinds that have a form. Of a spectrum only what stands around its numbers is typed: they come from a file. */
export type TypedKind = MeasurementContent['kind'];
export type MomentContent = Extract<MeasurementContent, { kind: 'moment' }>;
export type DiamagneticBasis = MomentContent['diamagnetism']['basis'];
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
  readonly temperatureU: string;
  readonly concentration: string;
  readonly concentrationU: string;
  readonly path: string;
  readonly pathU: string;
  readonly blank: string;
  readonly bandwidth: string;
  readonly instrument: string;
  readonly remark: string;
}

/** What was read off for a moment. */
export interface MagneticDraft {
  readonly moment: string;
  readonly momentUncertainty: string;
  readonly method: MomentContent['method'];
  readonly shift: string;
  readonly shiftU: string;
  readonly spectrometer: string;
  readonly magnet: 'along' | 'across';
  readonly massSusceptibility: string;
  readonly massSusceptibilityU: string;
  /** Empty: the computed one. */
  readonly molarMass: string;
  readonly basis: DiamagneticBasis;
  readonly diamagnetism: string;
  /** Pasted lines of temperature, value, uncertainty. */
  readonly series: string;
  readonly seriesQuantity: 'chiT' | 'moment';
}

export interface MeasurementDraft extends ConditionsDraft, MagneticDraft {
  readonly kind: TypedKind;
  readonly reportedIn: 'nm' | 'cm-1';
  readonly bands: readonly BandDraft[];
  readonly excitation: string;
  readonly lifetime: string;
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
  temperatureU: '',
  concentration: '',
  concentrationU: '',
  path: '',
  pathU: '',
  blank: '',
  bandwidth: '',
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
  shift: '',
  shiftU: '',
  spectrometer: '',
  magnet: 'along',
  massSusceptibility: '',
  massSusceptibilityU: '',
  molarMass: '',
  basis: 'pascal sum',
  diamagnetism: '',
  series: '',
  seriesQuantity: 'chiT',
  excitation: '',
  lifetime: '',
  words: '',
  lightSource: '',
});

const text = (value: number | null | undefined): string =>
  value === null || value === undefined ? '' : String(Number(value.toPrecision(7)));

const bandDrafts = (bands: readonly ListedBand[], unit: 'nm' | 'cm-1'): BandDraft[] =>
  bands.map(({ energy_cm1, molarAbsorptivity, feature }) => ({
    position: text(unit === 'nm' ? 1e7 / energy_cm1.value : energy_cm1.value),
    uncertainty: text(
      energy_cm1.u !== null && unit === 'nm' ? (1e7 * energy_cm1.u) / energy_cm1.value ** 2 : energy_cm1.u,
    ),
    absorptivity: text(molarAbsorptivity?.value),
    feature,
  }));

/** A susceptibility as it is typed, 1e-6 of the cgs unit. */
const millionths = (value: number | undefined): string => (value === undefined ? '' : text(value * 1e6));

function momentDraft({ method, readings, diamagnetism, moment_BM }: MomentContent): Partial<MagneticDraft> {
  const known = 'shift_Hz' in readings || 'massSusceptibility_cm3_g' in readings;
  return {
    method,
    moment: known ? '' : text(moment_BM.value),
    momentUncertainty: known ? '' : text(moment_BM.u),
    shift: text(readings['shift_Hz']),
    shiftU: text(readings['shift_Hz_u']),
    spectrometer: text(readings['spectrometer_MHz']),
    magnet: readings['fieldAcross'] === 1 ? 'across' : 'along',
    massSusceptibility: millionths(readings['massSusceptibility_cm3_g']),
    massSusceptibilityU: millionths(readings['massSusceptibility_cm3_g_u']),
    molarMass: text(readings['molarMass_g_mol']),
    // The value that was used stays, also where the composition would now give another one.
    basis: known && diamagnetism.basis !== 'none' ? 'typed' : 'none',
    diamagnetism: diamagnetism.basis === 'none' ? '' : millionths(diamagnetism.chi_cm3_mol),
  };
}

/** The draft of a correction: what stands, ready to be mended. */
export function draftOf(content: MeasurementContent, sample: Sample | null): MeasurementDraft {
  const { conditions, remark } = content;
  const base: MeasurementDraft = {
    ...blankMeasurement(conditions.operator ?? '', conditions.date ?? ''),
    kind: content.kind,
    batch: sample?.batch ?? '',
    phase: sample?.phase ?? '',
    solvent: conditions.solvent ?? '',
    temperature: text(conditions.temperature_K?.value),
    temperatureU: text(conditions.temperature_K?.u),
    concentration: text(conditions.concentration_mM?.value),
    concentrationU: text(conditions.concentration_mM?.u),
    path: text(conditions.path_cm?.value),
    pathU: text(conditions.path_cm?.u),
    blank: conditions.blank ?? '',
    bandwidth: text(conditions.bandwidth_nm),
    instrument: conditions.instrument ?? '',
    remark,
  };
  switch (content.kind) {
    case 'band list':
      return {
        ...base,
        reportedIn: content.reportedIn,
        bands: bandDrafts(content.bands, content.reportedIn),
      };
    case 'moment':
      return { ...base, ...momentDraft(content) };
    case 'moment series':
      return {
        ...base,
        seriesQuantity: 'chiT',
        series: content.points
          .map(({ temperature_K, chiT }) =>
            [temperature_K, chiT.value, ...(chiT.u === null ? [] : [chiT.u])].join('\t'),
          )
          .join('\n'),
        basis: content.diamagnetism.basis === 'none' ? 'none' : 'typed',
        diamagnetism:
          content.diamagnetism.basis === 'none' ? '' : millionths(content.diamagnetism.chi_cm3_mol),
      };
    case 'emission':
      return {
        ...base,
        reportedIn: 'nm',
        bands: bandDrafts(content.maxima, 'nm'),
        excitation: text(content.excitation_nm),
        lifetime: text(content.lifetime_us?.value),
      };
    case 'observed colour':
      return { ...base, words: content.words, lightSource: content.lightSource ?? '' };
    case 'spectrum':
    case 'note':
      return base;
  }
}
