/**
 * Ligand electrochemical parameters E_L (V, per donor) of A. B. P. Lever, Inorg. Chem. 29, 1271 (1990), table of
 * values from Ru(III)/Ru(II) couples: from memory, two decimals.
 */
export const ligandElectrochemical: Readonly<Record<string, number>> = {
  bipy: 0.26,
  phen: 0.26,
  terpy: 0.25,
  py: 0.25,
  mecn: 0.34,
  nh3: 0.07,
  en: 0.06,
  cn: 0.02,
  co: 0.99,
  f: -0.42,
  cl: -0.24,
  br: -0.22,
  i: -0.24,
  n3: -0.3,
  oh: -0.59,
  h2o: 0.04,
  ox: -0.17,
  acac: -0.08,
  ncs_n: -0.06,
  no2_n: 0.02,
  im: 0.12,
  pph3: 0.39,
  pme3: 0.33,
  dppe: 0.36,
  dtc: -0.08,
};

export interface MetalCouple {
  /** E(M) = slope * sum of E_L + intercept, V against the normal hydrogen electrode. */
  readonly slope: number;
  readonly intercept: number;
}

/** Couples M(III)/M(II) in water and organic solvents, same source, from memory. */
export const metalCouples: Readonly<Record<string, MetalCouple>> = {
  'Ru2+': { slope: 0.97, intercept: 0.04 },
  'Os2+': { slope: 1.01, intercept: -0.4 },
  'Fe2+': { slope: 1.1, intercept: -0.43 },
};

/**
 * First reduction of a bound acceptor, V against the normal hydrogen electrode, where all donors are of its kind: [ML3]2+
 * or [ML2]2+ of ruthenium and iron (-1.33, -1.35 and -1.27 V against the calomel electrode); that of pyridine back from
 * the 407 nm band of [Ru(NH3)5(py)]2+. From memory.
 */
export const ligandReduction_V: Readonly<Record<string, number>> = {
  bipy: -1.09,
  phen: -1.11,
  terpy: -1.05,
  py: -1.85,
};

/**
 * A metal made electron-rich by its other ligands gives back to the acceptor, which is then harder to reduce: by this
 * much per volt that its couple lies below that with six donors of the acceptor's kind. From the 525 nm band of
 * [Ru(NH3)4(bpy)]2+ beside the 452 nm of [Ru(bpy)3]2+ (from memory).
 */
export const backDonation = 0.65;
