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

/** The same held within what is seen (0.6 to 2 times); twice for a band at or above the edge. */
export function chargeTransferGain(band_cm1: number, edge_cm1: number | null): number {
  const edge = edge_cm1 ?? usualEdge_cm1;
  return edge - band_cm1 < 3000 ? 2 : Math.max(0.6, Math.min(2, borrowing(band_cm1, edge)));
}
