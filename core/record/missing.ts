import type { Conditions, MeasurementContent } from './measurement';
import type { Sample } from './sample';

/** Something that nobody wrote down though others will need it. It is shown, never demanded. */
export interface MissingField {
  readonly field: string;
  readonly label: string;
  /** `needed` where a result cannot be had without it, `wanted` where it would be missed later. */
  readonly weight: 'needed' | 'wanted';
}

const labels: Record<keyof Conditions, string> = {
  date: 'date',
  operator: 'operator',
  instrument: 'instrument',
  solvent: 'solvent (or none, for a solid)',
  temperature_K: 'temperature',
  concentration_mM: 'concentration',
  path_cm: 'path length',
  blank: 'blank',
  bandwidth_nm: 'spectral bandwidth',
};

/** Conditions that each kind of measurement is hard to use without. */
const needed: Record<MeasurementContent['kind'], readonly (keyof Conditions)[]> = {
  spectrum: ['solvent', 'concentration_mM', 'path_cm'],
  'band list': ['solvent'],
  moment: ['temperature_K'],
  'moment series': [],
  emission: ['solvent', 'temperature_K'],
  'observed colour': [],
  note: [],
};
const wanted: Record<MeasurementContent['kind'], readonly (keyof Conditions)[]> = {
  spectrum: ['temperature_K', 'blank', 'instrument', 'bandwidth_nm', 'operator', 'date'],
  'band list': ['temperature_K', 'date'],
  moment: ['solvent', 'instrument', 'operator', 'date'],
  'moment series': ['instrument', 'operator', 'date'],
  emission: ['instrument', 'operator', 'date'],
  'observed colour': ['solvent', 'concentration_mM', 'date'],
  note: [],
};

/**
 * What a measurement does not say. The list follows the minimum information for UV-Vis spectra of NFDI4Chem (compound or
 * sample and solvent required; concentration, path, temperature, blank, instrument, bandwidth, operator, date expected).
 */
export function missingFields(content: MeasurementContent, sampleId: string | null): MissingField[] {
  const missing: MissingField[] = [];
  const look = (names: readonly (keyof Conditions)[], weight: MissingField['weight']) => {
    for (const name of names) {
      if (content.conditions[name] === null)
        missing.push({ field: `conditions.${name}`, label: labels[name], weight });
    }
  };
  if (sampleId === null && content.kind !== 'note')
    missing.push({ field: 'sampleId', label: 'sample or batch', weight: 'needed' });
  look(needed[content.kind], 'needed');
  look(wanted[content.kind], 'wanted');
  if (content.kind === 'observed colour' && content.lightSource === null) {
    missing.push({ field: 'lightSource', label: 'light source', weight: 'wanted' });
  }
  if (
    (content.kind === 'moment' || content.kind === 'moment series') &&
    content.diamagnetism.basis === 'none'
  ) {
    missing.push({ field: 'diamagnetism', label: 'diamagnetic correction', weight: 'wanted' });
  }
  return missing;
}

/** What a sample does not say though molar absorptivity and moment depend on it. */
export function missingOfSample(sample: Sample): MissingField[] {
  const missing: MissingField[] = [];
  const look = (field: keyof Sample, label: string, weight: MissingField['weight']) => {
    if (sample[field] === null) missing.push({ field, label, weight });
  };
  look('molarMass_g_mol', 'molar mass with counter-ion and solvate', 'needed');
  look('formula', 'formula', 'wanted');
  look('purity_percent', 'purity', 'wanted');
  look('phase', 'phase', 'wanted');
  return missing;
}
