import { spinPairingChange } from './spinPairing';

/** A place for the electron that charge transfer brings. */
export interface Acceptor {
  readonly shell: 't2' | 'e';
  /** Above the shell that the optical electronegativity refers to, cm⁻¹. */
  readonly fieldTerm_cm1: number;
  /** Spin-pairing term in units of D. */
  readonly pairing: number;
}

export interface Shells {
  readonly dElectrons: number;
  readonly t2: number;
  readonly e: number;
  readonly multiplicity: number;
  /** cm⁻¹; null where it is not estimated. */
  readonly tenDq: number | null;
  /** e lies below t2. */
  readonly tetrahedral: boolean;
}

/**
 * Where the electron may go, lower shell first. Tabulated optical electronegativities refer to the lower shell (t2g in
 * an octahedron, e in a tetrahedron) where it has room, and in d6 ions also where it has none: 10Dq is added for the upper
 * one. Those of d7 to d9 ions with a full lower shell come from the band into the upper one and need nothing added.
 */
export function acceptors({ dElectrons, t2, e, multiplicity, tenDq, tetrahedral }: Shells): Acceptor[] {
  const spin = (multiplicity - 1) / 2;
  const both = [
    { shell: 't2' as const, held: t2, orbitals: 3 },
    { shell: 'e' as const, held: e, orbitals: 2 },
  ];
  const [lower, upper] = tetrahedral ? [both[1]!, both[0]!] : [both[0]!, both[1]!];
  const lowerIsFull = lower.held >= 2 * lower.orbitals;
  const into = ({ shell, held, orbitals }: typeof lower, fieldTerm_cm1: number): Acceptor => ({
    shell,
    fieldTerm_cm1,
    pairing: spinPairingChange(dElectrons, spin, held < orbitals ? spin + 0.5 : Math.abs(spin - 0.5)),
  });
  const list: Acceptor[] = [];
  if (!lowerIsFull) list.push(into(lower, 0));
  if (upper.held >= 2 * upper.orbitals) return list;
  if (lowerIsFull && dElectrons > 6) list.push(into(upper, 0));
  else if (tenDq !== null) list.push(into(upper, tenDq));
  return list;
}
