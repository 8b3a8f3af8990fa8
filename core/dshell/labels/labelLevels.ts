import { type CubicGroup } from '../../symmetry';
import { fieldFrame } from '../field/fieldFrame';
import { checkProblem, type LevelProblem } from '../problem';
import { irrepFinder, type IrrepFinder } from './irreps';
import { levelSets, type LevelSet } from './levelSets';
import { ligandGroup } from './ligandGroup';
import { fieldNamingGroup, isSymmetric, namingGroup, type NamingGroup } from './namingGroup';
import { parentageReader, type Parentage } from './parentage';

/** A level with the names that its eigenvectors show. */
export interface LabelledLevel {
  /** Relative to the ground level, cm⁻¹. */
  readonly energy: number;
  readonly degeneracy: number;
  /** 2S + 1; null with spin-orbit coupling. */
  readonly multiplicity: number | null;
  /** Mulliken symbol without spin-orbit coupling, Bethe's G number with it; null where the states are no whole representation. */
  readonly irrep: string | null;
  /** Mulliken symbol also with spin-orbit coupling (`E1/2g`, `F3/2g`). */
  readonly mulliken: string | null;
}

export interface LabelledLevels {
  readonly levels: readonly LabelledLevel[];
  /** Schoenflies symbol of the group whose representations name the levels. */
  readonly group: string;
  /** Names of the cubic parents and order of their orbitals. */
  readonly cubicGroup: CubicGroup;
  /** Size of the cubic part of the field, cm⁻¹. */
  readonly cubicTenDq: number;
  /** Its share in the square of the field, 0 to 1: where it is small, cubic parents and t2, e configurations say little. */
  readonly cubicShare: number;
  /** Parent terms and configurations of one of the levels; worked out when asked for. */
  parentage(level: number): Parentage;
}

export interface LabelOptions {
  /**
   * A group by name (`C3v`, `Oh`), in standard orientation in the laboratory; or standing as wanted; or `ligands`, that of the
   * ligands of an angular overlap field. Left out: the largest group of the field. A group that is none of the field's is
   * passed over in favour of that one.
   */
  readonly group?: string | NamingGroup;
  /** Energies this close count as one level, cm⁻¹; default a rounding of the span. */
  readonly near?: number;
}

/**
 * All levels of d^N in zero magnetic field with their representations, worked out from the eigenvectors by characters, and
 * their parentage on demand. Representations that share an energy are listed apart, with the parentage of their common set.
 * Throws what `levels` throws, and `out-of-range` for a magnetic field.
 */
export function labelLevels(problem: LevelProblem, options: LabelOptions = {}): LabelledLevels {
  const checked = { ...checkProblem(problem), zeeman: null };
  const frame = fieldFrame(checked.V);
  const wanted = wantedGroup(problem, options.group);
  const fits = wanted !== null && isSymmetric(checked.V, wanted);
  const naming = fits ? wanted : fieldNamingGroup(checked.V, frame);
  const spinOrbit = checked.zeta !== 0;
  const find = irrepFinder(naming, spinOrbit);
  const reader = parentageReader(checked, frame.rotation);
  const sets = levelSets(checked, frame, options.near ?? roundingOf(problem, checked.V));
  const rows = sets.flatMap((set) => namedLevels(set, find).map((level) => ({ set, level })));
  const ground = sets[0]!.energy;
  const known = new Map<LevelSet, Parentage>();
  return {
    levels: rows.map(({ level }) => ({ ...level, energy: level.energy - ground })),
    group: naming.name,
    cubicGroup: reader.cubicGroup,
    cubicTenDq: reader.tenDq,
    cubicShare: reader.share,
    parentage(index) {
      const { set } = rows[index]!;
      let found = known.get(set);
      if (found === undefined) known.set(set, (found = reader.read(set.states)));
      return found;
    },
  };
}

function namedLevels({ energy, S, states }: LevelSet, find: IrrepFinder): LabelledLevel[] {
  const multiplicity = S === null ? null : 2 * S + 1;
  const spins = multiplicity ?? 1;
  const found = find(states);
  if (found === null) {
    return [{ energy, multiplicity, degeneracy: spins * states.length, irrep: null, mulliken: null }];
  }
  return found.flatMap(({ label, mulliken, dimension, times }) =>
    Array.from({ length: times }, () => ({
      ...{ energy, multiplicity, degeneracy: spins * dimension },
      irrep: label,
      mulliken,
    })),
  );
}

function wantedGroup({ field }: LevelProblem, wanted: LabelOptions['group']): NamingGroup | null {
  if (typeof wanted !== 'string') return wanted ?? null;
  if (wanted !== 'ligands') return namingGroup(wanted);
  return field.type === 'aom' ? ligandGroup(field.ligands) : null;
}

/** Eigenvalues of one level may differ by this much through rounding. */
function roundingOf({ B, C, zeta = 0 }: LevelProblem, V: readonly (readonly number[])[]): number {
  const scale = Math.max(B * 50, C * 10, zeta * 5, ...V.flat().map(Math.abs));
  return Math.max(1e-6, 4e-11 * scale);
}
