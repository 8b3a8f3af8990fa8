import { isomersOf } from '../../geometry';
import { siteOf } from '../../geometry/ligandSites';
import { geometries, type GeometryRecord, type IonRecord, type ParameterLibrary } from '../../library';
import type { GeometryId } from '../../record/composition';
import { admittedIons } from '../wish/contradictions';
import type { Wish } from '../wish/wish';
import { countByCharge } from './countMultisets';
import { admittedLigands, poolOf, type LigandPool } from './ligandPool';
import { patternsFilling, type Pattern } from './pattern';

/** A pattern that can really be built, and in how many positional isomers. */
export interface SpacePattern {
  readonly pattern: Pattern;
  readonly isomers: number;
}

export interface SpaceGeometry {
  readonly geometry: GeometryRecord;
  readonly patterns: readonly SpacePattern[];
}

/** Every candidate that a wish admits: ions x geometries x ligand multisets x isomers. */
export interface CandidateSpace {
  readonly ions: readonly IonRecord[];
  readonly pool: LigandPool;
  readonly geometries: readonly SpaceGeometry[];
  /** Charge of the complex ion, both ends included. */
  readonly charge: { readonly min: number; readonly max: number } | null;
}

/** Isomers depend on shapes and counts only, so one ligand of each shape stands for all; names do not matter here. */
function isomersOfPattern(geometry: GeometryRecord, pattern: Pattern, pool: LigandPool): number {
  const sites = pattern.map(({ shape, count }, i) => ({
    ...siteOf(pool.ligands[pool.byShape.get(shape.key)![0]!]!, count),
    kind: `kind${i}`,
  }));
  return isomersOf(geometry.id as GeometryId, sites).length;
}

/** The space of a checked wish. Patterns that no isomer realises (a chelate that cannot span) are left out. */
export function spaceOf(wish: Wish, library: ParameterLibrary): CandidateSpace {
  const pool = poolOf(admittedLigands(wish, library.ligands.values()));
  const wanted = geometries.filter(
    ({ id }) => wish.geometries === 'all' || (wish.geometries as readonly string[]).includes(id),
  );
  return {
    ions: admittedIons(wish, library),
    pool,
    charge: wish.charge ?? null,
    geometries: wanted.map((geometry) => ({
      geometry,
      patterns: patternsFilling(geometry.coordinationNumber, pool.shapes, wish.ligands.maxKinds)
        .map((pattern) => ({ pattern, isomers: isomersOfPattern(geometry, pattern, pool) }))
        .filter(({ isomers }) => isomers > 0),
    })),
  };
}

export const chargeAdmitted = (space: CandidateSpace, charge: number): boolean =>
  space.charge === null || (charge >= space.charge.min && charge <= space.charge.max);

/** Number of candidates, without visiting them. */
export function countCandidates(space: CandidateSpace): number {
  let count = 0;
  for (const { patterns } of space.geometries) {
    for (const { pattern, isomers } of patterns) {
      for (const [charge, ways] of countByCharge(pattern, space.pool)) {
        const ions = space.ions.filter((ion) => chargeAdmitted(space, ion.oxidationState + charge)).length;
        count += ions * ways * isomers;
      }
    }
  }
  return count;
}
