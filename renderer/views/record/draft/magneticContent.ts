import { SpinhueError } from '../../../../core/errors';
import {
  balanceMoment,
  chiTFromMoment,
  evansMoment,
  halfMolarMass,
  type MomentResult,
} from '../../../../core/measured';
import { momentSquaredPerChiT } from '../../../../core/measured/magnetism/moment';
import type { Conditions } from '../../../../core/record/measurement';
import { readNumber } from '../../../app/form';
import type { MagneticDraft, MomentContent } from './measurementDraft';
import { pastedCells } from './pastedCells';
import type { Reader } from './reader';
import type { Substance } from './substance';

/** Whether the moment is worked out from what was read off, rather than typed. */
export const isComputed = ({ method, shift, massSusceptibility }: MagneticDraft): boolean =>
  (method === 'Evans' && shift.trim() !== '') || (method === 'balance' && massSusceptibility.trim() !== '');

type Diamagnetism = MomentContent['diamagnetism'];

function diamagnetismOf(draft: MagneticDraft, substance: Substance, reader: Reader): Diamagnetism | null {
  const remedy = 'Choose another way to correct for diamagnetism.';
  const { basis } = draft;
  switch (basis) {
    case 'none':
      return { chi_cm3_mol: 0, basis };
    case 'pascal sum':
      return substance.pascal_cm3_mol === null
        ? reader.refuse('diamagnetism', 'A part of the substance has no Pascal constant.', remedy)
        : { chi_cm3_mol: substance.pascal_cm3_mol, basis };
    case 'half molar mass': {
      const mass = massOf(draft, substance, reader);
      return mass === null ? null : { chi_cm3_mol: halfMolarMass(mass), basis };
    }
    case 'typed': {
      const value = reader.needed(draft.diamagnetism, 'diamagnetic susceptibility', -Infinity);
      if (value === null) return null;
      if (value > 0)
        return reader.refuse(
          'diamagnetic susceptibility',
          'It is positive, but tables give it negative.',
          'Enter it with its minus sign.',
        );
      return { chi_cm3_mol: value * 1e-6, basis };
    }
  }
}

function massOf(draft: MagneticDraft, substance: Substance, reader: Reader): number | null {
  if (draft.molarMass.trim() !== '') return reader.number(draft.molarMass, 'molar mass');
  return (
    substance.molarMass_g_mol ??
    reader.refuse('molar mass', 'It cannot be computed for this substance.', 'Enter it.')
  );
}

export interface MomentRead {
  readonly readings: Record<string, number>;
  readonly diamagnetism: Diamagnetism;
  readonly moment_BM: MomentContent['moment_BM'];
}

/** The readings of a method with the susceptibility and moment they give; null with problems where some are missing. */
export function computedMoment(
  draft: MagneticDraft,
  { temperature_K, concentration_mM }: Conditions,
  substance: Substance,
  reader: Reader,
): (MomentRead & { readonly result: MomentResult }) | null {
  const diamagnetism = diamagnetismOf(draft, substance, reader);
  if (temperature_K === null)
    return reader.refuse('temperature', 'A moment needs the temperature.', 'Enter it below.');
  if (diamagnetism === null) return null;
  const diamagnetic_cm3_mol = diamagnetism.chi_cm3_mol;
  const readings: Record<string, number> = {};
  const note = (name: string, value: number | null): void => {
    if (value !== null) readings[name] = value;
  };
  note('temperature_K', temperature_K.value);
  let result: MomentResult;
  try {
    if (draft.method === 'Evans') {
      const shift = reader.needed(draft.shift, 'shift', -Infinity);
      const u = reader.number(draft.shiftU, 'uncertainty of the shift');
      const spectrometer_MHz = reader.needed(draft.spectrometer, 'spectrometer frequency');
      if (concentration_mM === null)
        return reader.refuse('concentration', 'Evans’s method needs the concentration.', 'Enter it below.');
      if (shift === null || spectrometer_MHz === null) return null;
      result = evansMoment({
        shift_Hz: { value: shift, u },
        spectrometer_MHz,
        concentration_mM,
        temperature_K,
        field: draft.magnet,
        diamagnetic_cm3_mol,
      });
      note('shift_Hz', shift);
      note('shift_Hz_u', u);
      note('spectrometer_MHz', spectrometer_MHz);
      note('concentration_mM', concentration_mM.value);
      note('fieldAcross', draft.magnet === 'across' ? 1 : 0);
    } else {
      const value = reader.needed(draft.massSusceptibility, 'mass susceptibility', -Infinity);
      const u = reader.number(draft.massSusceptibilityU, 'uncertainty of the mass susceptibility');
      const molarMass_g_mol = massOf(draft, substance, reader);
      if (value === null || molarMass_g_mol === null) return null;
      const massSusceptibility_cm3_g = { value: value * 1e-6, u: u === null ? null : u * 1e-6 };
      result = balanceMoment({
        massSusceptibility_cm3_g,
        molarMass_g_mol,
        temperature_K,
        diamagnetic_cm3_mol,
      });
      note('massSusceptibility_cm3_g', massSusceptibility_cm3_g.value);
      note('massSusceptibility_cm3_g_u', massSusceptibility_cm3_g.u);
      note('molarMass_g_mol', molarMass_g_mol);
    }
  } catch (error) {
    if (error instanceof SpinhueError)
      return reader.refuse(error.field ?? 'moment', error.message, 'Correct it.');
    throw error;
  }
  return { readings, diamagnetism, moment_BM: result.moment_BM, result };
}

/** A moment as it was typed or as it follows from readings. */
export function momentOf(
  draft: MagneticDraft,
  conditions: Conditions,
  substance: Substance,
  reader: Reader,
): MomentRead | null {
  if (isComputed(draft)) {
    const computed = computedMoment(draft, conditions, substance, reader);
    if (computed === null) return null;
    const { readings, diamagnetism, moment_BM } = computed;
    return { readings, diamagnetism, moment_BM };
  }
  const value = reader.number(draft.moment, 'moment', -1e-9);
  const u = reader.number(draft.momentUncertainty, 'uncertainty of the moment');
  if (value === null)
    return draft.moment.trim() === ''
      ? reader.refuse('moment', 'The moment is missing.', 'Enter it in Bohr magnetons, or the readings.')
      : null;
  return { readings: {}, diamagnetism: { chi_cm3_mol: 0, basis: 'none' }, moment_BM: { value, u } };
}

/** Corrected values of chi T at many temperatures from pasted lines. */
export function seriesOf(draft: MagneticDraft, substance: Substance, reader: Reader) {
  const isMoment = draft.seriesQuantity === 'moment';
  const points = pastedCells(draft.series).map((cells, line) => {
    const [temperature, value, spread] = cells.slice(0, 3).map(readNumber);
    if (temperature == null || value == null || temperature <= 0 || (isMoment && value < 0))
      return reader.refuse(
        `line ${line + 1} of the series`,
        `“${cells.join(' ')}” is no temperature in kelvin with its ${isMoment ? 'moment' : 'χT'}.`,
        'Correct the line, or remove it.',
      );
    const u = spread == null || spread < 0 ? null : spread;
    return {
      temperature_K: temperature,
      chiT: isMoment
        ? { value: chiTFromMoment(value), u: u === null ? null : (2 * value * u) / momentSquaredPerChiT }
        : { value, u },
    };
  });
  const known = points.filter((point) => point !== null);
  if (known.length === 0 && reader.problems.length === 0)
    return reader.refuse('series', 'No temperature is entered.', 'Paste one line a temperature.');
  const diamagnetism = diamagnetismOf(draft, substance, reader);
  return diamagnetism && { diamagnetism, points: known };
}
