import type { ParameterChange, Recalibration } from '../../../../core/agreement/recalibration';
import { estimateField } from '../../../../core/estimation/estimateField';
import { complexFormula } from '../../../../core/library/complexFormula';
import { complexKey, type ParameterLibrary } from '../../../../core/library/parameterLibrary';
import type { PlainObservation } from '../../../../core/agreement/recalibration';

const factorWords: Readonly<Record<string, string>> = {
  f: 'field factor f of',
  g: 'field factor g of',
  h: 'nephelauxetic factor h of',
  k: 'nephelauxetic factor k of',
};

/** What a change is about: words, with ions between them as formulas. */
export interface Subject {
  readonly words: string;
  readonly ion: string | null;
  readonly more: string;
  readonly unit: string;
}

/** `ligand.nh3.f` as people say it. */
export function subjectOf(key: string, library: ParameterLibrary): Subject {
  const [kind = '', subject = '', quantity = ''] = key.split('.');
  const ligand = (id: string): string => library.ligands.get(id)?.commonName ?? id;
  const words = factorWords[quantity] ?? `${quantity} of`;
  if (kind === 'anchor') {
    return { words: '10Dq of', ion: subject, more: `with ${ligand(quantity)} alone`, unit: 'cm⁻¹' };
  }
  if (kind === 'ion') return { words, ion: subject, more: '', unit: quantity === 'g' ? 'cm⁻¹' : '' };
  return { words: `${words} ${ligand(subject)}`, ion: null, more: '', unit: '' };
}

/** `Cr3+` with its charge marked, so that it is set as a superscript. */
export const ionFormula = (ion: string): string => ion.replace(/^([A-Z][a-z]?)/, '$1^');

export const spoken = ({ words, ion, more }: Subject): string => [words, ion, more].filter(Boolean).join(' ');

/**
 * Share of what is proposed that still comes from the value in use: precisions add up, so it is the ratio of the relative
 * variances after and before.
 */
export function shareInUse({ before, after }: ParameterChange): number {
  const [was, is] = [before.sigma / before.value, after.sigma / after.value];
  return was > 0 ? Math.min(1, (is / was) ** 2) : 1;
}

/** A value measured on one complex, which will stand in for the estimate of that complex. */
export interface OwnRow {
  readonly key: string;
  readonly formula: string;
  readonly quantity: '10Dq' | 'B';
  readonly estimated: { readonly value: number; readonly sigma: number | null } | null;
  readonly measured: { readonly value: number; readonly sigma: number };
}

/** One line for each value measured on a complex, beside the estimate that it would replace. */
export function ownRows(
  { measuredComplexes }: Recalibration,
  observations: readonly PlainObservation[],
  library: ParameterLibrary,
): OwnRow[] {
  return Object.entries(measuredComplexes).flatMap(([key, measured]): OwnRow[] => {
    const observation = observations.find(({ composition }) =>
      key.startsWith(`complex.${complexKey(composition)}.`),
    );
    if (observation === undefined) return [];
    const { composition, spin } = observation;
    const quantity = key.endsWith('.B') ? 'B' : '10Dq';
    const field = estimateField(composition, library);
    const estimate = quantity === 'B' ? field?.racahB : field?.fields[spin ?? 'middle'];
    return [
      {
        key,
        formula: complexFormula(composition, library),
        quantity,
        estimated: estimate?.value == null ? null : { value: estimate.value, sigma: estimate.sigma },
        measured,
      },
    ];
  });
}
