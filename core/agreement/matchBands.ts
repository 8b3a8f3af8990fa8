import type { Band } from '../prediction';
import type { MeasuredBand } from './measuredSet';

export interface BandPair {
  readonly measured: MeasuredBand;
  readonly predicted: Band;
}

/** Terms named after the arrow of an assignment: `4A2g -> 4T1g(P)` gives `4T1g` with `P`. */
function namedTerms(assignment: string | null): { term: string; parent: string | null }[] {
  if (assignment === null) return [];
  const [, upper] = assignment.split('->');
  if (upper === undefined) return [];
  return [...upper.matchAll(/(\d[ABET]\d?[gu]?)(?:\(([A-Z])\))?/g)].map(([, term, parent]) => ({
    term: term!,
    parent: parent ?? null,
  }));
}

const isDd = (kind: string): boolean => kind === 'spin-allowed' || kind === 'spin-forbidden';

/**
 * For each term named in the assignment the lowest predicted band of that name, or the one above it where the parent term
 * is P. An envelope over several terms has several.
 */
function byName(measured: MeasuredBand, bands: readonly Band[]): Band[] {
  return namedTerms(measured.assignment).flatMap(({ term, parent }) => {
    const bare = term.replace(/[gu]$/, '');
    const named = bands.filter(
      ({ label, kind }) => kind === measured.kind && label.replace(/[gu]$/, '') === bare,
    );
    const [lowest, upper] = named;
    if (lowest === undefined) return [];
    return [parent === 'P' && upper !== undefined ? upper : lowest];
  });
}

const nearest = (energy: number, bands: readonly Band[]): Band | undefined =>
  bands.reduce<Band | undefined>(
    (best, band) =>
      best === undefined || Math.abs(band.energy_cm1 - energy) < Math.abs(best.energy_cm1 - energy)
        ? band
        : best,
    undefined,
  );

/**
 * Pairs measured d-d bands with predicted ones: by the name of the upper term where the assignment gives one, the lowest
 * of that name that is not yet taken; else the nearest of the same kind. Bands without partner are left out.
 */
export function matchBands(measured: readonly MeasuredBand[], predicted: readonly Band[]): BandPair[] {
  const taken = new Set<Band>();
  const sorted = measured.filter(({ kind }) => isDd(kind)).toSorted((a, b) => a.energy_cm1 - b.energy_cm1);
  return sorted.flatMap((band): BandPair[] => {
    const free = predicted.filter((each) => !taken.has(each));
    // Components of one split level share the band that stands for it.
    const first = byName(band, free);
    const named = first.length > 0 ? first : byName(band, predicted);
    const alike = free.filter(({ kind }) => kind === band.kind);
    const partner = nearest(band.energy_cm1, named.length > 0 ? named : alike);
    if (partner === undefined) return [];
    taken.add(partner);
    return [{ measured: band, predicted: partner }];
  });
}

/** The lowest spin-allowed band of a spectrum: a maximum where there is one, else a shoulder. */
export function firstAllowed(measured: readonly MeasuredBand[]): MeasuredBand | null {
  const allowed = measured
    .filter(({ kind }) => kind === 'spin-allowed')
    .toSorted((a, b) => a.energy_cm1 - b.energy_cm1);
  return allowed.find(({ feature }) => feature === 'max') ?? allowed[0] ?? null;
}

/** The predicted charge-transfer band nearest to each measured one; null where none is predicted. */
export function matchChargeTransfer(
  measured: readonly MeasuredBand[],
  predicted: readonly Band[],
): { readonly measured: MeasuredBand; readonly predicted: Band | null }[] {
  const transfer = predicted.filter(({ kind }) => !isDd(kind));
  return measured
    .filter(({ kind, feature }) => (kind === 'LMCT' || kind === 'MLCT') && feature === 'max')
    .map((band) => ({ measured: band, predicted: nearest(band.energy_cm1, transfer) ?? null }));
}
