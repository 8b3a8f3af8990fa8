import { type Polyhedron } from './polyhedra/polyhedra';
import { anglesOf } from './polyhedra/direction';
import { distort, type Distortion } from './distortion/distort';

/** A donor in the angles of the angular overlap model, degrees. */
export interface LigandPosition {
  readonly theta: number;
  readonly phi: number;
  /**
   * Turn of the ligand about its bond: at 0 the local x lies along increasing θ, y along increasing φ. Matters only for a
   * ligand whose two π interactions differ.
   */
  readonly psi: number;
  /** Relative to the undistorted bond. */
  readonly distance: number;
}

/** Positions of the donors of a polyhedron, distorted or ideal. `rings` are the chelate rings as pairs of vertices. */
export const ligandPositions = (
  shape: Polyhedron,
  distortion: Distortion = {},
  rings: readonly (readonly [number, number])[] = [],
): LigandPosition[] =>
  distort(shape, distortion, rings).map(({ direction, distance }) => ({
    ...anglesOf(direction),
    psi: 0,
    distance,
  }));
