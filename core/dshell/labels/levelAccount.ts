import {
  configurationLabel,
  termOrigins,
  termsOfConfiguration,
  type Term,
  type TermOrigin,
} from '../../symmetry';
import { type CubicWeight } from './cubicParents';
import { type FreeIonWeight } from './freeIonParents';
import { type LabelledLevel, type LabelledLevels } from './labelLevels';
import { electronJump } from './parentage';

/** A strong-field configuration with its share in a level and the terms it gives rise to. */
export interface ConfigurationShare {
  /** `t2g^2 eg^1`. */
  readonly label: string;
  readonly t2: number;
  readonly e: number;
  readonly weight: number;
  /** All terms of the configuration; their microstates add up to `microstates`. */
  readonly terms: readonly Term[];
  readonly microstates: number;
}

/** Where a level comes from: free ion, cubic field, strong field, and what the jump from the ground level takes. */
export interface LevelAccount {
  readonly level: LabelledLevel;
  /** `4T2g`, `4Eg` in D_4h, `G8` with spin-orbit coupling. */
  readonly name: string;
  readonly freeIon: readonly FreeIonWeight[];
  readonly cubic: readonly CubicWeight[];
  readonly configurations: readonly ConfigurationShare[];
  /** The leading cubic term at both ends of the correlation diagram. */
  readonly origin: TermOrigin | null;
  /** Electrons that change between t2 and e from the ground level; null where no configuration leads. */
  readonly electronJump: number | null;
  /** Spin of the leading cubic term as in the ground level's. */
  readonly spinAllowed: boolean;
}

const multiplicityOf = (cubic: readonly CubicWeight[]): number => Number.parseInt(cubic[0]!.label, 10);

/** The account of one level of `labelLevels`; for a band, of the level it ends on. */
export function levelAccount(labelled: LabelledLevels, index: number, dElectrons: number): LevelAccount {
  const level = labelled.levels[index]!;
  const { freeIon, cubic, configurations } = labelled.parentage(index);
  const ground = labelled.parentage(0);
  const group = labelled.cubicGroup;
  return {
    level,
    name: `${level.multiplicity ?? ''}${level.irrep ?? ''}`,
    freeIon,
    cubic,
    configurations: configurations.map(({ t2, e, weight }) => {
      const { terms, microstates } = termsOfConfiguration({ t2g: t2, eg: e }, group);
      return { label: configurationLabel({ t2g: t2, eg: e }, group), t2, e, weight, terms, microstates };
    }),
    origin: termOrigins(dElectrons, group).find(({ term }) => term === cubic[0]!.label) ?? null,
    electronJump: electronJump(ground, { freeIon, cubic, configurations }),
    spinAllowed: multiplicityOf(cubic) === multiplicityOf(ground.cubic),
  };
}
