import type { IlluminantId, ObserverId } from '../../core/library/colourTables';
import type { PredictionOutcome } from '../../core/prediction/types';
import type { CandidateInput } from '../../core/record/composition';
import type { ParameterSet } from '../../core/record/project';
import type { CubicGeometry } from '../../core/dshell/types';
import type { LevelLine } from '../plots/levelDiagram/levelLine';
import type { CandidateSummary } from './estimateSummary';

/** Values laid over the library; null for the library as it is. */
export type Overlay = Pick<ParameterSet, 'name' | 'values'> | null;

/** What a sheet asks for beyond the row of a table. */
export interface OneOptions {
  /** Draws for the colour cloud; 0 for none. */
  readonly draws?: number;
  /** Decides on some of the cautions. */
  readonly counterIon?: string | null;
  readonly temperature_K?: number;
  /** How its colour is looked at; daylight and the 2 degree observer unless said. */
  readonly illuminant?: IlluminantId;
  readonly observer?: ObserverId;
}

export type ToWorker =
  | {
      readonly kind: 'one';
      readonly job: number;
      readonly input: CandidateInput;
      readonly overlay: Overlay;
      readonly options: OneOptions;
    }
  | {
      readonly kind: 'many';
      readonly job: number;
      readonly inputs: readonly CandidateInput[];
      readonly overlay: Overlay;
    }
  | { readonly kind: 'diagram'; readonly job: number; readonly request: DiagramRequest }
  | { readonly kind: 'cancel'; readonly job: number };

/** Levels of one ion over a range of fields. Energies in cm⁻¹. */
export interface DiagramRequest {
  readonly dElectrons: number;
  readonly geometry: CubicGeometry;
  readonly B: number;
  readonly C: number;
  /** The field runs from 0 to this 10Dq. */
  readonly upTo: number;
  /** `over-B`: both axes in units of B. */
  readonly axes: 'absolute' | 'over-B';
}

export type FromWorker =
  | { readonly kind: 'lines'; readonly job: number; readonly lines: readonly LevelLine[] }
  | { readonly kind: 'outcome'; readonly job: number; readonly outcome: PredictionOutcome }
  | {
      readonly kind: 'summaries';
      readonly job: number;
      readonly summaries: readonly (readonly [id: string, summary: CandidateSummary])[];
    }
  | { readonly kind: 'finished'; readonly job: number }
  | { readonly kind: 'failed'; readonly job: number; readonly message: string };
