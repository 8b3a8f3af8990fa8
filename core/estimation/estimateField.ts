import {
  complexKey,
  findIon,
  type IonRecord,
  type LigandRecord,
  type ParameterLibrary,
  type SourcedValue,
} from '../library';
import type { Composition } from '../record/composition';
import type { CubicGeometry } from '../dshell/types';
import { defaultDoubts } from './defaultDoubts';
import { distanceExponent, distanceFactor, spinDistances, tableSpin } from './distance';
import { averageStrength, type DonorField } from './fieldStrength';
import { applicabilityFlags, leftOutOf } from './applicability';
import { besideOxo, isOxoCation } from './overlapField';
import { racahParameters, type DonorShare } from './racah';
import { estimate, notEstimated } from './uncertain';
import type { Estimate, Flag } from './types';

/** 10Dq at the metal-ligand distance of each spin state, and halfway between them. */
export interface SpinFields {
  readonly high: Estimate;
  readonly low: Estimate;
  readonly middle: Estimate;
}

/** Everything that is estimated of the field of a complex before its levels are computed. */
export interface FieldEstimate {
  readonly ion: IonRecord;
  readonly dElectrons: number;
  readonly composition: Composition;
  /** The cubic field whose levels stand for the complex; null for other polyhedra. */
  readonly cubic: CubicGeometry | null;
  readonly donors: readonly DonorField[];
  readonly fields: SpinFields;
  /** Whether the two spin states differ in 10Dq here (d4 to d7 of the 3d row in an octahedron). */
  readonly twoDistances: boolean;
  readonly racahB: Estimate;
  readonly racahC: Estimate;
  readonly zeta: Estimate;
  readonly flags: readonly Flag[];
  readonly leftOut: readonly string[];
}

export const donorShares = (composition: Composition, library: ParameterLibrary): DonorShare[] =>
  Object.entries(composition.ligands).flatMap(([id, count]) => {
    const ligand: LigandRecord | undefined = library.ligands.get(id);
    return ligand === undefined ? [] : [{ ligand, places: count * ligand.denticity }];
  });

/** Multiplies an estimate by a factor that is itself uncertain (relative sigma), under the name of its cause. */
export function scaled(base: Estimate, factor: number, sigma: number, cause: string, text: string): Estimate {
  if (base.value === null) return base;
  const value = base.value * factor;
  const shares = (base.shares ?? []).map((share) => ({ ...share, sigma: share.sigma * factor }));
  return estimate(value, [...shares, { cause, sigma: value * sigma }], base.route, [
    ...base.reasons,
    { kind: 'assumption', text, sigma: value * sigma },
  ]);
}

function spinFields(base: Estimate, ion: IonRecord, donors: readonly DonorShare[]): SpinFields | null {
  const choice = ion.dElectrons >= 4 && ion.dElectrons <= 7 && ion.period === '3d';
  const distances = choice ? spinDistances(ion, donors) : null;
  if (distances === null || base.value === null) return null;
  const { high_pm, low_pm } = distances;
  const middle_pm = (high_pm + low_pm) / 2;
  const from = tableSpin(ion) === 'low' ? low_pm : high_pm;
  const at = (to: number, spin: string): Estimate => {
    if (to === from) return base;
    const factor = distanceFactor(from, to);
    const sigma = Math.abs(Math.log(from / to)) * distanceExponent.sigma;
    const text = `10Dq goes as r^-5.5: ${factor.toFixed(2)} times for the ${spin} distance of ${Math.round(to)} pm`;
    return scaled(base, factor, sigma, `distance:${ion.ion}`, text);
  };
  return { high: at(high_pm, 'high-spin'), low: at(low_pm, 'low-spin'), middle: at(middle_pm, 'mean') };
}

function ofGeometry(octahedral: Estimate, composition: Composition, ion: IonRecord): Estimate {
  if (octahedral.value === null) return octahedral;
  if (composition.geometry === 'tetrahedral') {
    return scaled(
      octahedral,
      4 / 9,
      defaultDoubts.tetrahedral,
      `tetrahedral:${ion.ion}`,
      'a tetrahedral field is 4/9 of the octahedral one of the same donors, with e below t2',
    );
  }
  if (isOxoCation(composition)) {
    return scaled(
      octahedral,
      besideOxo,
      0.06,
      `oxo-cation:${ion.ion}`,
      `10Dq of the donors beside the oxo ligand, ${besideOxo} times what they give without it`,
    );
  }
  return octahedral;
}

/** A value measured on this very complex, from the record: it beats every estimate. */
function measuredHere(value: SourcedValue | undefined, composition: Composition): Estimate | null {
  if (value?.value == null) return null;
  const sigma = value.sigma ?? value.value * defaultDoubts.anchor.medium;
  const shares = [{ cause: `measured:${complexKey(composition)}`, sigma }];
  return estimate(value.value, shares, 'measured-complex', [
    { kind: 'source', text: `measured on this complex: ${value.source}` },
  ]);
}

function zetaOf(ion: IonRecord): Estimate {
  if (ion.zeta0.value === null) return notEstimated(`no spin-orbit parameter of ${ion.ion} is on file`);
  const value = ion.zeta0.value * 0.85;
  const sigma = value * defaultDoubts.zeta;
  return estimate(value, [{ cause: `zeta:${ion.ion}`, sigma }], 'free-ion', [
    { kind: 'source', text: `zeta0(${ion.ion}) = ${ion.zeta0.value} (${ion.zeta0.source})` },
    { kind: 'assumption', text: 'reduced to 85 % by covalency', sigma },
  ]);
}

const cubicOf = (geometry: string): CubicGeometry | null =>
  geometry === 'octahedral' || geometry === 'tetrahedral' ? geometry : null;

/**
 * Field parameters of a complex by the most trusted route for each part. Never throws for chemistry: what cannot be
 * estimated is an estimate without value whose reasons say why.
 */
export function estimateField(composition: Composition, library: ParameterLibrary): FieldEstimate | null {
  const ion = findIon(library, composition.metal, composition.oxidationState);
  if (ion === undefined) return null;
  const parts = donorShares(composition, library);
  const oxoCation = isOxoCation(composition);
  const others = oxoCation ? parts.filter(({ ligand }) => ligand.id !== 'oxo') : parts;
  const { tenDq, donors } = averageStrength(others, ion, composition.geometry, library);
  const noField = ion.dElectrons === 0 || ion.dElectrons === 10;
  const known = library.complexes.get(complexKey(composition));
  const base = noField
    ? notEstimated(`a d${ion.dElectrons} ion has no transitions within the d shell`)
    : (measuredHere(known?.tenDq, composition) ?? ofGeometry(tenDq, composition, ion));
  const sixfold = composition.geometry === 'octahedral' || composition.geometry === 'tetragonal';
  // A measured 10Dq belongs to the spin state it was measured in: there is nothing to scale.
  const two = known?.tenDq === undefined && sixfold && !oxoCation ? spinFields(base, ion, parts) : null;
  const racah = racahParameters(ion, parts, composition.geometry, library);
  return {
    ion,
    dElectrons: ion.dElectrons,
    composition,
    cubic: oxoCation ? null : cubicOf(composition.geometry),
    donors,
    fields: two ?? { high: base, low: base, middle: base },
    twoDistances: two !== null,
    racahB: measuredHere(known?.B, composition) ?? racah.B,
    racahC: measuredHere(known?.C, composition) ?? racah.C,
    zeta: zetaOf(ion),
    flags: applicabilityFlags(composition, ion, parts, base, library),
    leftOut: leftOutOf(composition, ion),
  };
}
