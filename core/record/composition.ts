import { z } from 'zod';

/**
 * Geometries that a candidate may name. `tetragonal` is an octahedron drawn out along one axis (or, with one oxo
 * ligand, pressed together along it): six places, bands resolved into their components. Square-pyramidal and the like are estimated by angular overlap. */
export const geometryIds = [
  'octahedral',
  'tetragonal',
  'tetrahedral',
  'square-planar',
  'square-pyramidal',
  'trigonal-bipyramidal',
  'trigonal-planar',
  'linear',
  'trigonal-prismatic',
  'pentagonal-bipyramidal',
  'cubic',
  'square-antiprismatic',
  'dodecahedral',
] as const;
export type GeometryId = (typeof geometryIds)[number];

/** What a chemist chooses: metal, oxidation state, geometry, how many of each ligand, and which isomer. */
export const compositionSchema = z.strictObject({
  /** Element symbol. */
  metal: z.string(),
  oxidationState: z.int(),
  geometry: z.enum(geometryIds),
  /** Ligand id to count; a chelate counts once and occupies as many places as its denticity. */
  ligands: z.record(z.string(), z.int().positive()),
  /** `cis`, `trans`, `fac`, `mer`, or the canonical name of a positional isomer; null or absent where there is only one. */
  isomer: z.string().nullish(),
});
export type Composition = z.infer<typeof compositionSchema>;

/** A composition with the conditions under which its colour is asked for. */
export interface CandidateInput extends Composition {
  id: string;
  concentration_mM?: number;
  path_cm?: number;
}
