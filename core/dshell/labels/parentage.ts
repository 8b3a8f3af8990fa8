import { inverseRotation, type CubicGroup, type Quaternion } from '../../symmetry';
import { freeIon } from '../freeIon/reducedElements';
import { type CheckedProblem } from '../problem';
import { carriedBy, type Amplitudes } from '../states/amplitudes';
import { type ConfigurationWeight } from '../types';
import { configurationWeights } from './configurations';
import { cubicFrame } from './cubicFrame';
import { cubicWeights, type CubicWeight } from './cubicParents';
import { freeIonReader, type FreeIonWeight } from './freeIonParents';
import { orbitalParts } from './orbitalPart';

/** What a level is made of, seen from the free ion, from the cubic field, and from the strong field. Weights add up to 1. */
export interface Parentage {
  readonly freeIon: readonly FreeIonWeight[];
  readonly cubic: readonly CubicWeight[];
  readonly configurations: readonly ConfigurationWeight[];
}

export interface ParentageReader {
  /** Octahedral or tetrahedral order of the orbitals about the cubic axes. */
  readonly cubicGroup: CubicGroup;
  /** Cubic part of the field, cm⁻¹, positive in both. */
  readonly tenDq: number;
  /** Share of that part in the square of the field: where it is small, cubic terms and configurations say little. */
  readonly share: number;
  /** Mean over the states of one level. */
  read(states: readonly Amplitudes[]): Parentage;
}

/** Reads the parentage of states given in the laboratory; `fieldRotation` is a frame of the field's symmetry. */
export function parentageReader(
  { electrons, V, B, C, zeta }: Pick<CheckedProblem, 'electrons' | 'V' | 'B' | 'C' | 'zeta'>,
  fieldRotation: Quaternion,
): ParentageReader {
  const cubic = cubicFrame(V, fieldRotation);
  const toCubic = carriedBy(inverseRotation(cubic.rotation));
  const cubicGroup: CubicGroup = cubic.tenDq < 0 ? 'Td' : 'Oh';
  const freeIonWeights = freeIonReader(freeIon(electrons), B, C);
  return {
    cubicGroup,
    tenDq: Math.abs(cubic.tenDq),
    share: cubic.share,
    read(states) {
      const parts = (zeta === 0 ? states : states.flatMap(orbitalParts)).map(toCubic);
      return {
        freeIon: freeIonWeights(parts, states.length),
        cubic: cubicWeights(parts, states.length, cubicGroup),
        configurations: configurationWeights(electrons, parts, states.length),
      };
    },
  };
}

/** A leading configuration with less than this leads nothing. */
const leading = 0.55;

/**
 * How many electrons change between t2 and e from one level to another, by their leading configurations: 1 for the usual
 * spin-allowed band, 2 for a two-electron jump (weak), 0 for a spin flip within a configuration (narrow). Null where one of
 * the levels has no configuration that clearly leads.
 */
export function electronJump(from: Parentage, to: Parentage): number | null {
  const [a, b] = [from.configurations[0]!, to.configurations[0]!];
  return a.weight < leading || b.weight < leading ? null : Math.abs(b.e - a.e);
}
