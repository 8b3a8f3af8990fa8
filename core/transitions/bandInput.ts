import type { ConfigurationWeight } from '../dshell/types';
import type { Estimate, Flag } from '../estimation/types';
import type { IonRecord, LigandRecord, ParameterLibrary } from '../library';
import type { GeometryId } from '../record/composition';
import type { Band } from './types';

/** A level as bands need it: cubic ones have everything, those of lower symmetry may lack the strong-field weights. */
export interface BandLevel {
  /** Relative to the ground level, cm⁻¹. */
  readonly energy: number;
  readonly multiplicity: number;
  readonly label: string;
  readonly degeneracy: number;
  readonly configurations: readonly ConfigurationWeight[];
  readonly slope: { readonly tenDq: number; readonly B: number; readonly C: number };
}

/** What one kind of donor would give if it stood in all places, cm⁻¹. */
export interface DonorStrength {
  readonly ligand: { readonly id: string };
  readonly tenDq: number;
}

export interface BandInput {
  readonly dElectrons: number;
  readonly ion: IonRecord;
  readonly ligands: readonly { readonly ligand: LigandRecord; readonly count: number }[];
  readonly geometry: GeometryId;
  readonly isomer?: string | null;
  /** Ascending, the ground level first; empty where nothing could be computed. */
  readonly levels: readonly BandLevel[];
  /**
   * 2S + 1 of the spin state the complex is taken in, where that is not the lowest level (distortion or entropy decide
   * near crossover); bands then start from the lowest level of this multiplicity.
   */
  readonly groundMultiplicity?: number;
  readonly tenDq: Estimate;
  readonly racahB: Estimate;
  readonly racahC: Estimate;
  readonly zeta: Estimate;
  readonly temperature_K: number;
  /** Where known, a mixed set splits its first band instead of only being told to. */
  readonly donorStrengths?: readonly DonorStrength[];
  /** For analogies where a ligand has no value of its own; the default library unless given. */
  readonly library?: ParameterLibrary;
}

export interface BandPrediction {
  /** Ascending energy. */
  readonly bands: readonly Band[];
  readonly flags: readonly Flag[];
  /**
   * False where bands that could colour the complex are missing altogether: then no colour can be told. True without any
   * bands means colourless.
   */
  readonly complete: boolean;
  /** What is left out, one sentence each. */
  readonly leftOut: readonly string[];
}
