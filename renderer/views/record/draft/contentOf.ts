import { accepted, type Checked, refused } from '../../../../core/errors';
import type { Conditions, ListedBand, MeasurementContent } from '../../../../core/record/measurement';
import type { Uncertain } from '../../../../core/record/uncertain';
import type { Substance } from './substance';
import { momentOf, seriesOf } from './magneticContent';
import { Reader, words } from './reader';
import type { BandDraft, ConditionsDraft, MeasurementDraft } from './measurementDraft';

/** Conditions as typed; an empty field is a missing one, never a zero. */
function conditionsFrom(draft: ConditionsDraft, reader: Reader): Conditions {
  return {
    date: draft.date === '' ? null : draft.date,
    operator: words(draft.operator),
    instrument: words(draft.instrument),
    solvent: words(draft.solvent),
    temperature_K: reader.uncertain(draft.temperature, draft.temperatureU, 'temperature'),
    concentration_mM: reader.uncertain(draft.concentration, draft.concentrationU, 'concentration'),
    path_cm: reader.uncertain(draft.path, draft.pathU, 'path length'),
    blank: words(draft.blank),
    bandwidth_nm: reader.number(draft.bandwidth, 'spectral bandwidth'),
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

/** The bands of a draft from low to high energy; null with a problem where there is none. */
function bandsOf(draft: MeasurementDraft, unit: 'nm' | 'cm-1', reader: Reader): ListedBand[] | null {
  const bands = draft.bands
    .filter((each) => !isBlank(each))
    .map((each, index) => band(each, index, unit, reader))
    .filter((each) => each !== null);
  if (bands.length === 0 && reader.problems.length === 0)
    return reader.refuse('bands', 'No band is entered.', 'Enter the position of at least one band.');
  return bands.sort((one, other) => one.energy_cm1.value - other.energy_cm1.value);
}

/**
 * The measurement that a draft describes, or everything that is wrong with it.
 *
 * @param substance What molar mass and diamagnetism are computed for.
 * @param before Where it corrects a measurement: its numbers of a spectrum stay.
 */
export function contentOf(
  draft: MeasurementDraft,
  substance: Substance,
  before: MeasurementContent | null = null,
): Checked<MeasurementContent> {
  const reader = new Reader();
  const common = {
    conditions: conditionsFrom(draft, reader),
    remark: draft.remark.trim(),
    attachments: [],
  };
  const content = particulars(draft, substance, before, reader, common);
  return content === null || reader.problems.length > 0 ? refused(...reader.problems) : accepted(content);
}

type Common = Pick<MeasurementContent, 'conditions' | 'remark' | 'attachments'>;

function particulars(
  draft: MeasurementDraft,
  substance: Substance,
  before: MeasurementContent | null,
  reader: Reader,
  common: Common,
): MeasurementContent | null {
  switch (draft.kind) {
    case 'spectrum':
      return before?.kind === 'spectrum'
        ? { ...before, ...common }
        : reader.refuse('spectrum', 'A spectrum comes from a file.', 'Import or paste it.');
    case 'band list': {
      const bands = bandsOf(draft, draft.reportedIn, reader);
      return bands && { kind: 'band list', ...common, reportedIn: draft.reportedIn, bands };
    }
    case 'emission': {
      const maxima = bandsOf(draft, draft.reportedIn, reader);
      const excitation_nm = reader.number(draft.excitation, 'excitation');
      const lifetime_us = reader.uncertain(draft.lifetime, '', 'lifetime');
      return maxima && { kind: 'emission', ...common, maxima, excitation_nm, lifetime_us };
    }
    case 'moment': {
      const moment = momentOf(draft, common.conditions, substance, reader);
      return moment && { kind: 'moment', ...common, method: draft.method, ...moment };
    }
    case 'moment series': {
      const series = seriesOf(draft, substance, reader);
      return series && { kind: 'moment series', ...common, ...series };
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

/** A correction that was not touched keeps how it was come by. */
const sameSize = <T extends { readonly chi_cm3_mol: number }>(before: T, corrected: T): T =>
  sameNumber(before.chi_cm3_mol, corrected.chi_cm3_mol) ? before : corrected;

/** A corrected measurement keeps what the form does not show: widths and notes of bands, how a value was come by. */
export function keepingTheRest(
  before: MeasurementContent,
  corrected: MeasurementContent,
): MeasurementContent {
  if (before.kind === 'band list' && corrected.kind === 'band list')
    return { ...corrected, bands: keepingBands(before.bands, corrected.bands) };
  if (before.kind === 'moment' && corrected.kind === 'moment') {
    // A moment that was typed says nothing new about its correction for diamagnetism.
    const typed = Object.keys({ ...before.readings, ...corrected.readings }).length === 0;
    const diamagnetism = typed ? before.diamagnetism : sameSize(before.diamagnetism, corrected.diamagnetism);
    return { ...corrected, diamagnetism };
  }
  if (before.kind === 'moment series' && corrected.kind === 'moment series')
    return { ...corrected, diamagnetism: sameSize(before.diamagnetism, corrected.diamagnetism) };
  if (before.kind === 'emission' && corrected.kind === 'emission')
    return {
      ...corrected,
      maxima: keepingBands(before.maxima, corrected.maxima),
      lifetime_us: keepingUncertainty(before.lifetime_us, corrected.lifetime_us),
    };
  if (before.kind === 'observed colour' && corrected.kind === 'observed colour')
    return { ...corrected, lab: before.lab };
  return corrected;
}
