/**
 * Effective moment of t2g^n with spin-orbit coupling alone (10Dq without limit, no reduction, g = 2), against kT/ζ:
 * M. Kotani, J. Phys. Soc. Japan 4, 293 (1949). Holes are electrons with the sign of ζ turned over; t2g^3 and t2g^6 have no
 * first-order orbital moment. Bohr magnetons. Real complexes lie off these curves through covalency and low symmetry.
 */
export function kotaniMoment(t2gElectrons: 1 | 2 | 3 | 4 | 5, kTOverZeta: number): number {
  if (t2gElectrons === 3) return Math.sqrt(15);
  const x = 1 / kTOverZeta;
  const square =
    t2gElectrons === 1 || t2gElectrons === 5
      ? oneElectron(t2gElectrons === 1 ? x : -x)
      : twoElectrons(t2gElectrons === 2 ? x : -x);
  return Math.sqrt(square);
}

/** Where spin-orbit coupling is this small beside kT the quotients below lose their figures. */
const smallest = 1e-6;

/** 2T2: a quartet at −ζ/2 whose moments cancel, a doublet at +ζ. x = ζ/kT. */
function oneElectron(x: number): number {
  if (Math.abs(x) < smallest) return 5;
  // Populations relative to the lower of the two levels, so that nothing overflows.
  const [quartet, doublet] = x > 0 ? [1, Math.exp(-1.5 * x)] : [Math.exp(1.5 * x), 1];
  return (8 * quartet + (3 * x - 8) * doublet) / (x * (2 * quartet + doublet));
}

/** 3T1: J = 2, 1, 0 of an effective L = 1 at −ζ/2, +ζ/2, +ζ. */
function twoElectrons(x: number): number {
  if (Math.abs(x) < smallest) return 10;
  const [p2, p1, p0] =
    x > 0 ? [1, Math.exp(-x), Math.exp(-1.5 * x)] : [Math.exp(1.5 * x), Math.exp(0.5 * x), 1];
  const above = (2.5 * x + 15) * p2 + (0.5 * x + 9) * p1 - 24 * p0;
  return (3 * above) / (x * (5 * p2 + 3 * p1 + p0));
}
