import type { IonRecord, ParameterLibrary, TransitionPeriod } from '../library';
import { defaultDoubts } from './defaultDoubts';
import type { Factor } from './ligandStrength';

const mean = (values: readonly number[]): number =>
  values.reduce((sum, value) => sum + value, 0) / values.length;

/** Natural logarithms of the tabulated g by charge, for one row of the transition series. */
function logsByCharge(library: ParameterLibrary, period: TransitionPeriod): Map<number, number[]> {
  const found = new Map<number, number[]>();
  for (const ion of library.ions.values()) {
    if (ion.period !== period || ion.g.value === null) continue;
    found.set(ion.oxidationState, [...(found.get(ion.oxidationState) ?? []), Math.log(ion.g.value)]);
  }
  return found;
}

/**
 * Mean ln g of 3d ions of one charge; beyond the charges in the table the last step is continued at half its size, as
 * the steps in the table themselves shrink (2+ to 3+ to 4+).
 */
function meanOfCharge(
  library: ParameterLibrary,
  charge: number,
): { log: number; extrapolated: number } | null {
  const logs = logsByCharge(library, '3d');
  const known = logs.get(charge);
  if (known !== undefined) return { log: mean(known), extrapolated: 0 };
  const charges = [...logs.keys()].sort((a, b) => a - b);
  const [before, last] = charges.slice(-2);
  if (charge < charges[0]! || before === undefined || last === undefined) return null;
  const step = mean(logs.get(last)!) - mean(logs.get(before)!);
  let log = mean(logs.get(last)!);
  for (let z = last, part = step / 2; z < charge; z++, part /= 2) log += part;
  return { log, extrapolated: charge - last };
}

/** How much stronger the field is one or two rows down, from the pairs in the table (Jorgensen: about 1.45, 1.75). */
function periodLog(library: ParameterLibrary, period: TransitionPeriod): number {
  if (period === '3d') return 0;
  const differences: number[] = [];
  for (const ion of library.ions.values()) {
    if (ion.period !== period || ion.g.value === null) continue;
    const light = meanOfCharge(library, ion.oxidationState);
    if (light !== null && light.extrapolated === 0) differences.push(Math.log(ion.g.value) - light.log);
  }
  return mean(differences);
}

const jahnTellerIons = new Set(['Cr2+', 'Mn3+', 'Cu2+', 'Ti3+']);

/** The metal's factor g in 10Dq = f g (cm⁻¹), from the table or by analogy of charge and row; null for neither. */
export function metalStrength(ion: IonRecord, library: ParameterLibrary): Factor | null {
  const { g } = ion;
  if (g.value !== null) {
    const soft = jahnTellerIons.has(ion.ion) || g.status === 'own' || /low confidence/.test(g.note ?? '');
    const sigma =
      g.sigma !== null ? g.sigma / g.value : soft ? defaultDoubts.softG : defaultDoubts.publishedG;
    return {
      value: g.value,
      sigma,
      route: 'published-factors',
      reasons: [{ kind: 'source', text: `g(${ion.ion}) = ${g.value} (${g.source})` }],
    };
  }
  const base = meanOfCharge(library, ion.oxidationState);
  if (base === null) return null;
  const value = Math.exp(base.log + periodLog(library, ion.period));
  return {
    value,
    sigma: Math.hypot(defaultDoubts.analogyG, 0.07 * base.extrapolated),
    route: 'donor-class',
    reasons: [
      {
        kind: 'assumption',
        text: `no g is in print for ${ion.ion}; ${Math.round(value / 100) * 100} taken from ions of charge ${ion.oxidationState}+ and the step between the rows of the periodic table`,
      },
      { kind: 'settle', text: `the first band of a simple ${ion.ion} complex would give g` },
    ],
  };
}
