/** Where a solvent itself lets light through, 1 cm path. */
export interface SolventWindow {
  readonly id: string;
  readonly name: string;
  /** Below this wavelength the pure solvent absorbs more than 1 against air. */
  readonly cutOff_nm: number;
  /** Beyond this wavelength overtones of O-H and C-H stretching absorb; null where not on file. */
  readonly nearInfraredFrom_nm: number | null;
}

const solvent = (
  id: string,
  name: string,
  cutOff_nm: number,
  nearInfraredFrom_nm: number | null = null,
): SolventWindow => ({ id, name, cutOff_nm, nearInfraredFrom_nm });

/**
 * Cut-off wavelengths as suppliers of spectroscopic solvents list them (absorbance 1 in 1 cm against air); from
 * memory, and they move with purity by 5 to 10 nm. The near-infrared end of water is the edge of its 1450 nm overtone
 * (common practice).
 */
export const solventWindows: readonly SolventWindow[] = [
  solvent('water', 'water', 190, 1350),
  solvent('acetonitrile', 'acetonitrile', 190),
  solvent('methanol', 'methanol', 205, 1380),
  solvent('ethanol', 'ethanol', 210, 1380),
  solvent('dichloromethane', 'dichloromethane', 233),
  solvent('chloroform', 'chloroform', 245),
  solvent('tetrahydrofuran', 'tetrahydrofuran', 212),
  solvent('ethyl-acetate', 'ethyl acetate', 256),
  solvent('dimethylformamide', 'N,N-dimethylformamide', 268),
  solvent('dimethyl-sulfoxide', 'dimethyl sulfoxide', 268),
  solvent('toluene', 'toluene', 284),
  solvent('pyridine', 'pyridine', 330),
  solvent('acetone', 'acetone', 330),
  solvent('nitromethane', 'nitromethane', 380),
];

export const findSolvent = (id: string): SolventWindow | undefined =>
  solventWindows.find((entry) => entry.id === id);

/** Why a band at `nm` may not be seen in this solvent; null where nothing speaks against it. */
export function hiddenBySolvent(nm: number, window: SolventWindow): string | null {
  if (nm < window.cutOff_nm) return `${window.name} absorbs below ${window.cutOff_nm} nm`;
  const end = window.nearInfraredFrom_nm;
  if (end !== null && nm > end) return `${window.name} absorbs beyond ${end} nm (overtones)`;
  return null;
}
