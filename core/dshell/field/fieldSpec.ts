import { type FieldMatrix } from './tensorComponents';

/** A ligand of the angular overlap model. Angles in degrees, energies in cm⁻¹. */
export interface AngularOverlapLigand {
  /** Polar angles of the direction from metal to ligand. */
  readonly theta: number;
  readonly phi: number;
  /** Turn of the ligand's own x and y axes about that direction; 0 where left out. */
  readonly psi?: number;
  readonly e_sigma: number;
  readonly e_pi_x?: number;
  readonly e_pi_y?: number;
  /** s-d mixing, ≥ 0; matters where the ligands do not cancel (square planar, linear). */
  readonly e_ds?: number;
}

/** A one-electron ligand field. Energies in cm⁻¹; `tenDq` is the positive size of the cubic splitting. */
export type FieldSpec =
  /** Octahedron on x, y, z: e above t2. */
  | { readonly type: 'oct'; readonly tenDq: number }
  /** Tetrahedron or cube about x, y, z: e below t2. */
  | { readonly type: 'tet' | 'cube'; readonly tenDq: number }
  /** Fourfold axis z: 10Dq, Ds, Dt (C. J. Ballhausen, Introduction to Ligand Field Theory, 1962). */
  | { readonly type: 'tetragonal'; readonly tenDq: number; readonly Ds: number; readonly Dt: number }
  /** Threefold axis z: octahedral 10Dq with Dσ, Dτ (E. König and S. Kremer, Ligand Field Energy Diagrams, 1977). */
  | { readonly type: 'trigonal'; readonly tenDq: number; readonly Dsigma: number; readonly Dtau: number }
  /** Angular overlap model. */
  | { readonly type: 'aom'; readonly ligands: readonly AngularOverlapLigand[] }
  /** Four equal ligands on ±x, ±y; π perpendicular to the plane and in it. */
  | {
      readonly type: 'sqp';
      readonly e_sigma: number;
      readonly e_pi_perp: number;
      readonly e_pi_par: number;
      readonly e_ds?: number;
    }
  /** The symmetric 5×5 itself over [z2, x2-y2, xy, xz, yz]. */
  | { readonly type: 'matrix'; readonly matrix: FieldMatrix };
