/** Direct products with T2, the dipole operator in T_d. */
const reachedByDipole: Readonly<Record<string, string>> = {
  A1: 'T2',
  A2: 'T1',
  E: 'T1 T2',
  T1: 'A2 E T1 T2',
  T2: 'A1 E T1 T2',
};

const irrepOf = (label: string): string => /(A1|A2|E|T1|T2)/.exec(label)?.[1] ?? '';

/**
 * Whether the electric dipole joins two levels of a tetrahedral complex: `4A2 -> 4T1` yes, `4A2 -> 4T2` no. Where a
 * label cannot be read nothing is forbidden.
 */
export function dipoleAllowedInTd(from: string, to: string): boolean {
  const reached = reachedByDipole[irrepOf(from)];
  return reached === undefined || irrepOf(to) === '' || reached.split(' ').includes(irrepOf(to));
}
