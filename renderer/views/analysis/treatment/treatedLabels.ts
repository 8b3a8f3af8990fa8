import type { Conditions } from '../../../../core/record/measurement';

type Label = readonly [label: string, value: string];

const stated = (label: string, value: string | number | null | undefined): Label[] =>
  value === null || value === undefined || value === '' ? [] : [[label, String(value)]];

/** What was written down about a spectrum, and its steps of treatment, as labels of a JCAMP-DX file (version 4.24). */
export function treatedLabels(steps: readonly string[], conditions: Conditions): Label[] {
  const { date, instrument, temperature_K, concentration_mM, path_cm, solvent, blank } = conditions;
  return [
    // DATE of version 4.24 has a year of two digits; this one of version 5 cannot be misread.
    ...stated('LONGDATE', date?.replaceAll('-', '/')),
    ...stated('SPECTROMETER/DATA SYSTEM', instrument),
    ...stated('TEMPERATURE', temperature_K === null ? null : (temperature_K.value - 273.15).toFixed(2)),
    ...stated('PATHLENGTH', path_cm?.value),
    ...stated('SAMPLING PROCEDURE', solvent === null ? null : `solution or medium: ${solvent}`),
    ...stated('CONCENTRATIONS', concentration_mM === null ? null : `(C) ${concentration_mM.value} MMOL/L`),
    ...stated('$REFERENCE', blank),
    ...steps.map((step, i): Label => [`$TREATMENT STEP ${i + 1}`, step]),
  ];
}
