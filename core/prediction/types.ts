import type { Problem } from '../errors';
import type { Estimate, Flag } from '../estimation/types';
import type { CubicLevel } from '../dshell/types';
import type { FieldLevel } from '../estimation/fieldLevels';
import type { SpinPrediction } from '../spin/types';
import type { Band } from '../transitions/types';
import type { ColourCloud, SeenColour } from '../colour/types';
import type { Composition } from '../record/composition';
import type { Caution } from '../library/cautions';

export type { Caution };

/** Everything said about one complex before it is made. */
export interface Prediction {
  readonly id: string;
  readonly composition: Composition;
  /** Bracket formula after the IUPAC Red Book, e.g. `[Cr(NH3)5Cl]2+`. */
  readonly formula: string;
  readonly dElectrons: number;
  readonly tenDq: Estimate;
  /** Where the two spin states have bonds of different length: 10Dq of each. `tenDq` is that of the likelier one. */
  readonly tenDqBySpin?: { readonly high: Estimate; readonly low: Estimate };
  readonly racahB: Estimate;
  readonly racahC: Estimate;
  readonly zeta: Estimate;
  readonly spin: SpinPrediction;
  /** `4A2g`; `1A1` for d0 and d10. */
  readonly groundTerm: string;
  /** All levels at the central estimate; empty where the field is not cubic or not estimated. */
  readonly levels: readonly CubicLevel[];
  /** Levels by angular overlap, where the field is not cubic; they are named after the symmetry that the donors have. */
  readonly overlapLevels?: readonly FieldLevel[];
  /** Ascending energy. */
  readonly bands: readonly Band[];
  readonly conditions: {
    readonly concentration_mM: number;
    readonly path_cm: number;
    readonly temperature_K: number;
  };
  /** At the stated conditions; null where no spectrum could be estimated. */
  readonly colour: SeenColour | null;
  /** Seen colour at a third, once and three times the stated concentration × path. */
  readonly colourAtThreeStrengths: readonly { readonly factor: number; readonly colour: SeenColour }[];
  /** Present where draws were asked for. */
  readonly cloud: ColourCloud | null;
  readonly flags: readonly Flag[];
  /** What the estimate leaves out (charge transfer, Jahn-Teller, ...), one sentence each. */
  readonly leftOut: readonly string[];
  readonly cautions: readonly Caution[];
  /** The library and model it was made with. */
  readonly madeWith: {
    readonly parameterSet: string;
    readonly parameterHash: string;
    readonly modelVersion: string;
  };
}

export type PredictionOutcome =
  | { readonly ok: true; readonly prediction: Prediction }
  | { readonly ok: false; readonly id: string; readonly problems: readonly Problem[] };
