import { SpinhueError } from '../../errors';
import { type Polyhedron } from '../polyhedra/polyhedra';

/** How a ligand of denticity 3 or more may lie: any way its rings allow, in one plane with the metal, or all donors cis. */
export type Arrangement = 'any' | 'meridional' | 'facial';

/** Ligands of one kind in a complex. */
export interface Site {
  /** Ligand id, once in a list of sites. */
  readonly kind: string;
  readonly denticity: number;
  readonly count: number;
  /** Largest donor-metal-donor angle a chelate ring can span, degrees. Default: the edges of the polyhedron. */
  readonly reach?: number;
  /** Donor symbols of an unsymmetrical chelate in ring order (`['N', 'O']`); like donors when absent. */
  readonly donors?: readonly string[];
  /** Donors joined by a chelate ring; default a chain 0-1, 1-2, ... A macrocycle adds the closing pair, a tripod is a star. */
  readonly rings?: readonly (readonly [number, number])[];
  readonly arrangement?: Arrangement;
}

/** A site without its name: what decides the isomers. */
export interface Pattern {
  readonly denticity: number;
  readonly count: number;
  readonly reach: number;
  /** Donor number to class of like donors. */
  readonly donorClass: readonly number[];
  readonly rings: readonly (readonly [number, number])[];
  readonly arrangement: Arrangement;
}

const chain = (denticity: number): [number, number][] =>
  Array.from({ length: denticity - 1 }, (_, i) => [i, i + 1]);

export function patternOf(site: Site, defaultReach: number): Pattern {
  const { denticity, count, donors, rings, arrangement = 'any', reach = defaultReach } = site;
  const symbols = donors ?? Array.from({ length: denticity }, () => '');
  return {
    denticity,
    count,
    reach,
    donorClass: symbols.map((symbol) => symbols.indexOf(symbol)),
    rings: rings ?? chain(denticity),
    arrangement,
  };
}

const refuse = (
  code: 'out-of-range' | 'bad-ligand-count' | 'coordination-number',
  field: string,
  message: string,
  remedy: string,
): never => {
  throw new SpinhueError({ code, field, message, remedy });
};

/** Refuses counts and denticities that are no whole numbers or do not add up to the coordination number. */
export function checkSites({ id, coordinationNumber }: Polyhedron, sites: readonly Site[]): void {
  let places = 0;
  for (const { kind, denticity, count, donors, rings, reach } of sites) {
    const field = `sites.${kind}`;
    if (sites.filter((site) => site.kind === kind).length > 1)
      refuse('bad-ligand-count', field, `${kind} is listed twice`, 'give each ligand once, with its count');
    if (!Number.isInteger(count) || count < 1)
      refuse(
        'bad-ligand-count',
        field,
        `${count} of ${kind}: a whole number from 1 is needed`,
        'correct the count',
      );
    if (
      !Number.isInteger(denticity) ||
      denticity < 1 ||
      (donors !== undefined && donors.length !== denticity)
    )
      refuse(
        'out-of-range',
        field,
        `denticity ${denticity} of ${kind} does not fit its donors`,
        'correct the ligand',
      );
    if (rings?.some((ring) => ring.some((d) => !Number.isInteger(d) || d < 0 || d >= denticity)))
      refuse(
        'out-of-range',
        field,
        `a chelate ring of ${kind} names a donor it does not have`,
        'correct the ligand',
      );
    if (reach !== undefined && !(reach > 0 && reach <= 180))
      refuse('out-of-range', field, `reach ${reach} of ${kind}: degrees from 0 to 180`, 'correct the ligand');
    places += count * denticity;
  }
  if (places !== coordinationNumber)
    refuse(
      'coordination-number',
      'sites',
      `the ligands have ${places} donors; ${id} has ${coordinationNumber} places`,
      'change the number of ligands or the geometry',
    );
}
