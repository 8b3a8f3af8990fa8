import type { LigandRecord } from '../../library';
import type { GeometryId } from '../../record/composition';

/** An orbital of the ligands that an electron leaves. */
export interface DonorOrbital {
  readonly name: string;
  /** Below the orbital that the optical electronegativity of the ligand is for, in its units. */
  readonly below: number;
  /** Doubt of that distance, cm⁻¹. */
  readonly sigma_cm1: number;
  /** How many of the metal's places it is shown with, lowest first. */
  readonly places: 1 | 2;
  /** Of six donors into the lowest place, L mol⁻¹ cm⁻¹. */
  readonly molarAbsorptivity: number;
  readonly width_cm1: number;
  readonly reason: string | null;
}

const pi: DonorOrbital = {
  name: 'π',
  below: 0,
  sigma_cm1: 0,
  places: 2,
  molarAbsorptivity: 3500,
  width_cm1: 5000,
  reason: null,
};

const sigma = (below: number, reason: string): DonorOrbital => ({
  ...pi,
  name: 'σ',
  below,
  places: 1,
  molarAbsorptivity: 14_000,
  reason,
});

/** Halide π orbitals of a hexahalide come as t1u and t2u: 20 400 and 23 000 in [IrCl6]2- (from memory). */
const secondPiOfHalide: DonorOrbital = {
  ...pi,
  name: 'π (second)',
  below: 0.087,
  places: 1,
  reason: 'second π level as far below the first as in hexachloroiridate(IV) (2600 cm-1)',
};

/** Chromate: 26 900 and 36 500 (from memory). */
const secondPiOfOxo: DonorOrbital = {
  ...pi,
  name: 'π (second)',
  below: 0.32,
  sigma_cm1: 2500,
  places: 1,
  reason: 'second band as far above the first as in chromate (9600 cm-1)',
};

/**
 * Orbitals that a ligand gives electrons from. σ of the halides: F 4.4 and 3.9, Cl 3.4 and 3.0, Br 3.3 and 2.8 (C. K.
 * Jorgensen, from memory).
 */
export function donorOrbitals(
  ligand: LigandRecord,
  geometry: GeometryId,
  dElectrons: number,
): DonorOrbital[] {
  if (ligand.class === 'halide') {
    const own = sigma(0.45, 'σ orbitals of halides lie about 0.45 below their π orbitals');
    return geometry === 'octahedral' && dElectrons < 6 ? [pi, secondPiOfHalide, own] : [pi, own];
  }
  if (ligand.id === 'oxo' && dElectrons === 0) return [pi, secondPiOfOxo];
  if (ligand.id === 'cn') {
    const middle = sigma(0.4, 'between the two further bands of [Fe(CN)6]3- at 33 000 and 38 500 cm-1');
    return [pi, { ...middle, sigma_cm1: 3000, molarAbsorptivity: 3500 }];
  }
  return [pi];
}
