import type { Anchor, IonRecord, LigandRecord, ParameterLibrary } from '../library';
import { defaultDoubts } from './defaultDoubts';
import { onTableScale } from './distance';
import { ligandStrength } from './ligandStrength';
import { metalStrength } from './metalStrength';
import { planarStrength } from './planarStrength';
import type { DonorShare } from './racah';
import { estimate, notEstimated, weakestRoute } from './uncertain';
import type { DoubtShare, Estimate, EstimateRoute, Reason } from './types';

/** 10Dq of an octahedral complex with six like donors: f g (C. K. Jorgensen 1962). */
export const publishedProduct = (f: number, g: number): number => f * g;

/** Rule of average environment (Jorgensen): the mean of the homoleptic values over the donors. */
export const averageEnvironment = (parts: readonly { tenDq: number; places: number }[]): number => {
  const places = parts.reduce((sum, part) => sum + part.places, 0);
  return parts.reduce((sum, part) => sum + part.tenDq * part.places, 0) / places;
};

/** What one kind of donor would give if all places were like it. */
export interface DonorField {
  readonly ligand: LigandRecord;
  readonly places: number;
  readonly tenDq: number;
  readonly shares: readonly DoubtShare[];
  readonly route: EstimateRoute;
  readonly reasons: readonly Reason[];
}

function anchored(
  ligand: LigandRecord,
  places: number,
  ion: IonRecord,
  anchors: readonly Anchor[],
): DonorField {
  const parts = anchors.map((anchor) => ({
    value: onTableScale(anchor, ligand, ion),
    sigma: defaultDoubts.anchor[anchor.confidence ?? 'low'],
  }));
  const value = parts.reduce((sum, part) => sum + part.value, 0) / parts.length;
  const spread = Math.max(...parts.map((part) => Math.abs(part.value - value))) / value;
  const sigma = Math.max(Math.hypot(...parts.map((part) => part.sigma)) / parts.length, spread);
  return {
    ligand,
    places,
    tenDq: value,
    shares: [{ cause: `anchor:${ion.ion}:${ligand.id}`, sigma: sigma * value }],
    route: 'measured-relative',
    reasons: anchors.map(({ complex, tenDq, source }) => ({
      kind: 'source',
      text: `10Dq ${tenDq} measured on ${complex} (${source})`,
    })),
  };
}

/** 10Dq that donors like this one in all places would give; a reason why not where it cannot be told. */
export function donorField(
  { ligand, places }: DonorShare,
  ion: IonRecord,
  geometry: string,
  library: ParameterLibrary,
): DonorField | string {
  const planar = geometry === 'square-planar';
  const shape = planar ? 'square-planar' : null;
  const anchors = ligand.anchors.filter((anchor) => anchor.metal === ion.ion && anchor.geometry === shape);
  if (anchors.length > 0) return anchored(ligand, places, ion, anchors);
  const g = planar ? planarStrength(ion, library) : metalStrength(ion, library);
  if (g === null) return `nothing is known of the field strength of ${ion.ion}`;
  const f = ligandStrength(ligand, ion, library, shape);
  if (f === null) return `nothing is known of the field strength of ${ligand.commonName}`;
  const tenDq = publishedProduct(f.value, g.value);
  return {
    ligand,
    places,
    tenDq,
    shares: [
      { cause: `f:${ligand.id}`, sigma: tenDq * f.sigma },
      { cause: `g:${ion.ion}`, sigma: tenDq * g.sigma },
      { cause: `factorisation:${ion.ion}:${ligand.id}`, sigma: tenDq * defaultDoubts.factorisation },
    ],
    route: weakestRoute([f.route, g.route]),
    reasons: [...f.reasons, ...g.reasons],
  };
}

export interface CubicStrength {
  readonly tenDq: Estimate;
  readonly donors: readonly DonorField[];
}

/**
 * 10Dq of the average environment (cm⁻¹): of six donors on the distance scale that the tables are for, or of four in a
 * square plane.
 */
export function averageStrength(
  parts: readonly DonorShare[],
  ion: IonRecord,
  geometry: string,
  library: ParameterLibrary,
): CubicStrength {
  const fields = parts.map((part) => donorField(part, ion, geometry, library));
  const why = fields.find((field) => typeof field === 'string');
  if (why !== undefined) {
    return { tenDq: notEstimated(why, 'the spectrum of one complex of this kind'), donors: [] };
  }
  const donors = fields as DonorField[];
  const total = donors.reduce((sum, { places }) => sum + places, 0);
  const value = averageEnvironment(donors);
  const shares: DoubtShare[] = donors.flatMap(({ shares: own, places }) =>
    own.map(({ cause, sigma }) => ({ cause, sigma: (sigma * places) / total })),
  );
  const reasons: Reason[] = donors.flatMap((donor) => donor.reasons);
  const share = Math.max(...donors.map(({ places }) => places)) / total;
  if (donors.length > 1) {
    const sigma = value * defaultDoubts.additivity * 2 * Math.sqrt(share * (1 - share));
    const names = donors.map(({ ligand, places }) => `${places} ${ligand.abbreviation}`).join(', ');
    shares.push({ cause: `additivity:${ion.ion}:${names}`, sigma });
    reasons.push({
      kind: 'assumption',
      text: `rule of average environment over ${names} (C. K. Jorgensen)`,
      sigma,
    });
  }
  return {
    tenDq: estimate(value, shares, weakestRoute(donors.map(({ route }) => route)), unique(reasons)),
    donors,
  };
}

function unique(reasons: readonly Reason[]): Reason[] {
  const seen = new Set<string>();
  return reasons.filter(({ text }) => !seen.has(text) && seen.add(text));
}
