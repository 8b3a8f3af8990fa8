import type { Problem } from '../../../../core/errors';
import { accepted, type Checked, refused } from '../../../../core/errors';
import type { Conditions, ListedBand, MeasurementContent } from '../../../../core/record/measurement';
import type { Uncertain } from '../../../../core/record/uncertain';
import { readNumber } from '../../../app/form';
import type { BandDraft, ConditionsDraft, MeasurementDraft } from './measurementDraft';

const words = (text: string): string | null => (text.trim() === '' ? null : text.trim().slice(0, 200));

/** Collects what is wrong while numbers are read, so that all of it is said at once. */
class Reader {
  readonly problems: Problem[] = [];

  refuse(field: string, message: string, remedy: string): null {
    this.problems.push({ code: 'out-of-range', field, message, remedy });
    return null;
  }

  /** Null for an empty text; a problem for anything that is no number above `above`. */
  number(text: string, field: string, above = 0): number | null {
    if (text.trim() === '') return null;
    const value = readNumber(text);
    if (value === null)
      return this.refuse(field, `“${text}” is not a number.`, 'Enter digits, or leave it empty.');
    if (value <= above)
      return this.refuse(field, `${text} is not above ${above}.`, 'Correct it, or leave it empty.');
    return value;
  }

  certain(text: string, field: string): { value: number; u: null } | null {
    const value = this.number(text, field);
    return value === null ? null : { value, u: null };
  }
}

/** Conditions as typed; an empty field is a missing one, never a zero. */
function conditionsFrom(draft: ConditionsDraft, reader: Reader): Conditions {
  return {
    date: draft.date === '' ? null : draft.date,
    operator: words(draft.operator),
    instrument: words(draft.instrument),
    solvent: words(draft.solvent),
    temperature_K: reader.certain(draft.temperature, 'temperature'),
    concentration_mM: reader.certain(draft.concentration, 'concentration'),
    path_cm: reader.certain(draft.path, 'path length'),
    blank: null,
    bandwidth_nm: null,
  };
}

export function conditionsOf(draft: ConditionsDraft): Checked<Conditions> {
  const reader = new Reader();
  const conditions = conditionsFrom(draft, reader);
  return reader.problems.length > 0 ? refused(...reader.problems) : accepted(conditions);
}

function band(draft: BandDraft, index: number, unit: 'nm' | 'cm-1', reader: Reader): ListedBand | null {
  const place = `band ${index + 1}`;
  const position = reader.number(draft.position, `${place}, position`);
  const spread = reader.number(draft.uncertainty, `${place}, uncertainty`);
  const absorptivity = reader.number(draft.absorptivity, `${place}, molar absorptivity`);
  if (position === null) {
    if (draft.position.trim() === '')
      reader.refuse(`${place}, position`, 'A band needs its position.', 'Enter it, or remove the line.');
    return null;
  }
  // A slip of the unit is easily made: d-d and charge-transfer bands lie between 100 nm and 10 000 nm.
  const energy = unit === 'nm' ? 1e7 / position : position;
  if (energy < 1000 || energy > 100_000) {
    const other = unit === 'nm' ? 'cm⁻¹' : 'nm';
    return reader.refuse(
      `${place}, position`,
      `${draft.position} ${unit === 'nm' ? 'nm' : 'cm⁻¹'} lies outside what is measured as an absorption band.`,
      `Is it in ${other}?`,
    );
  }
  return {
    energy_cm1: {
      value: energy,
      u: spread === null ? null : unit === 'nm' ? (1e7 * spread) / position ** 2 : spread,
    },
    feature: draft.feature,
    molarAbsorptivity: absorptivity === null ? null : { value: absorptivity, u: null },
    width_cm1: null,
    note: '',
  };
}

const isBlank = ({ position, uncertainty, absorptivity }: BandDraft): boolean =>
  `${position}${uncertainty}${absorptivity}`.trim() === '';

/** The measurement that a draft describes, or everything that is wrong with it. */
export function contentOf(draft: MeasurementDraft): Checked<MeasurementContent> {
  const reader = new Reader();
  const common = {
    conditions: conditionsFrom(draft, reader),
    remark: draft.remark.trim(),
    attachments: [],
  };
  const content = particulars(draft, reader, common);
  return content === null || reader.problems.length > 0 ? refused(...reader.problems) : accepted(content);
}

function particulars(
  draft: MeasurementDraft,
  reader: Reader,
  common: Pick<MeasurementContent, 'conditions' | 'remark' | 'attachments'>,
): MeasurementContent | null {
  switch (draft.kind) {
    case 'band list': {
      const bands = draft.bands
        .filter((each) => !isBlank(each))
        .map((each, index) => band(each, index, draft.reportedIn, reader))
        .filter((each) => each !== null);
      if (bands.length === 0 && reader.problems.length === 0)
        return reader.refuse('bands', 'No band is entered.', 'Enter the position of at least one band.');
      bands.sort((one, other) => one.energy_cm1.value - other.energy_cm1.value);
      return { kind: 'band list', ...common, reportedIn: draft.reportedIn, bands };
    }
    case 'moment': {
      const value = reader.number(draft.moment, 'moment', -1e-9);
      const u = reader.number(draft.momentUncertainty, 'uncertainty of the moment');
      if (value === null)
        return draft.moment.trim() === ''
          ? reader.refuse('moment', 'The moment is missing.', 'Enter it in Bohr magnetons.')
          : null;
      return {
        kind: 'moment',
        ...common,
        method: draft.method,
        readings: {},
        diamagnetism: { chi_cm3_mol: 0, basis: 'none' },
        moment_BM: { value, u },
      };
    }
    case 'observed colour': {
      const seen = words(draft.words);
      if (seen === null)
        return reader.refuse('colour', 'The colour is missing.', 'Say in words what you see.');
      return {
        kind: 'observed colour',
        ...common,
        words: seen,
        lightSource: words(draft.lightSource),
        lab: null,
      };
    }
    case 'note':
      return common.remark === ''
        ? reader.refuse('note', 'The note is empty.', 'Write something, or cancel.')
        : { kind: 'note', ...common };
  }
}

const sameNumber = (one: number, other: number): boolean =>
  Number(one.toPrecision(7)) === Number(other.toPrecision(7));

/** A value that was not touched keeps the uncertainty that the form does not show. */
function keepingUncertainty<T extends Uncertain | null>(before: T, corrected: T): T {
  if (before === null || corrected === null) return corrected;
  return sameNumber(before.value, corrected.value) && corrected.u === null ? before : corrected;
}

function keepingConditions(before: Conditions, corrected: Conditions): Conditions {
  return {
    ...corrected,
    temperature_K: keepingUncertainty(before.temperature_K, corrected.temperature_K),
    concentration_mM: keepingUncertainty(before.concentration_mM, corrected.concentration_mM),
    path_cm: keepingUncertainty(before.path_cm, corrected.path_cm),
    blank: before.blank,
    bandwidth_nm: before.bandwidth_nm,
  };
}

/** A band whose position was not touched keeps its width and note; a moved one is another band. */
const keepingBands = (before: readonly ListedBand[], corrected: readonly ListedBand[]): ListedBand[] =>
  corrected.map((band) => {
    const same = before.find(({ energy_cm1 }) => sameNumber(energy_cm1.value, band.energy_cm1.value));
    return same === undefined
      ? band
      : {
          ...band,
          energy_cm1: keepingUncertainty(same.energy_cm1, band.energy_cm1),
          molarAbsorptivity: keepingUncertainty(same.molarAbsorptivity, band.molarAbsorptivity),
          width_cm1: same.width_cm1,
          note: same.note,
        };
  });

/** A corrected measurement keeps what the form does not show: attachments, readings, uncertainties, widths. */
export function keepingTheRest(
  before: MeasurementContent,
  corrected: MeasurementContent,
): MeasurementContent {
  const rest = {
    attachments: before.attachments,
    conditions: keepingConditions(before.conditions, corrected.conditions),
  };
  if (before.kind === 'band list' && corrected.kind === 'band list')
    return { ...corrected, ...rest, bands: keepingBands(before.bands, corrected.bands) };
  if (before.kind === 'moment' && corrected.kind === 'moment')
    return { ...corrected, ...rest, readings: before.readings, diamagnetism: before.diamagnetism };
  if (before.kind === 'observed colour' && corrected.kind === 'observed colour')
    return { ...corrected, ...rest, lab: before.lab };
  return { ...corrected, ...rest };
}
