import { ligandCovalency } from '../estimation/nephelauxetic';
import { defaultLibrary } from '../library';
import type { BandInput } from './bandInput';
import type { CommonDoubts } from './bandSigma';
import type { CoordinationSymmetry } from './coordinationSymmetry';
import type { GroundState } from './groundState';
import type { LaporteInput } from './intensity/laporte';

/** What is common to all d-d bands of one complex. */
export interface DdContext {
  readonly input: BandInput;
  readonly ground: GroundState;
  readonly symmetry: CoordinationSymmetry;
  readonly doubts: CommonDoubts;
  /** Lowest charge-transfer band from which d-d bands borrow, cm⁻¹; null where none is estimated. */
  readonly edge_cm1: number | null;
}

/** Mean h of the donors that have or resemble one, for the strength of bands only; 1.5, a middling ligand, if none. */
function meanCovalency({ ligands, library = defaultLibrary }: BandInput): number {
  let [sum, places] = [0, 0];
  for (const { ligand, count } of ligands) {
    const h = ligandCovalency(ligand, library);
    if (h === null) continue;
    sum += h.value * count * ligand.denticity;
    places += count * ligand.denticity;
  }
  return places === 0 ? 1.5 : sum / places;
}

/** What the parity rule asks of a complex. */
export const laporteInput = ({ input, ground, symmetry }: DdContext): LaporteInput => ({
  geometry: input.geometry,
  centrosymmetric: symmetry.centrosymmetric,
  mixed: symmetry.mixed,
  dElectrons: input.dElectrons,
  oxidationState: input.ion.oxidationState,
  period: input.ion.period,
  covalency: meanCovalency(input),
  lowSpin: ground.lowSpin,
});
