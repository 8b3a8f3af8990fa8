/** Distance to the charge-transfer edge that the typical absorptivities belong to, cm⁻¹. */
const usualGap_cm1 = 30_000;

/**
 * What a d-d band borrows from an allowed charge-transfer band above it: proportional to its own energy and to the
 * inverse square of the gap, so half the gap is four times the intensity. Relative to a band at 17 000 cm⁻¹ that is
 * 30 000 cm⁻¹ below the edge.
 */
export const borrowing = (band_cm1: number, edge_cm1: number): number =>
  (band_cm1 / 17_000) * (usualGap_cm1 / (edge_cm1 - band_cm1)) ** 2;

/** Where the edge is taken to be for ions and ligands of which nothing is known, cm⁻¹. */
const usualEdge_cm1 = 50_000;

/**
 * Share of the intensity that follows it. Most comes from elsewhere: second bands of Cr(III) and Co(III) are about as
 * strong as the first, though they lie nearer to the edge.
 */
const borrowedShare = 0.2;

/** Gain of a d-d band from charge transfer, between 0.7 and 2; 2 at or above the edge. */
export function chargeTransferGain(band_cm1: number, edge_cm1: number | null): number {
  const edge = edge_cm1 ?? usualEdge_cm1;
  if (edge - band_cm1 < 3000) return 2;
  return Math.max(0.7, Math.min(2, 1 - borrowedShare + borrowedShare * borrowing(band_cm1, edge)));
}
