import type { Anchor, IonRecord, LigandRecord, ParameterLibrary, SourcedValue } from '../library';
import { classMean } from './donorClass';
import { defaultDoubts } from './defaultDoubts';
import { onTableScale } from './distance';
import type { EstimateRoute, Reason } from './types';

/** A dimensionless factor with its relative standard deviation and account. */
export interface Factor {
  readonly value: number;
  /** Relative standard deviation. */
  readonly sigma: number;
  readonly route: EstimateRoute;
  readonly reasons: readonly Reason[];
}

interface Evidence {
  readonly value: number;
  readonly sigma: number;
  readonly route: EstimateRoute;
  readonly text: string;
}

const confidenceSigma = (confidence: 'high' | 'medium' | 'low' | null): number =>
  defaultDoubts.anchor[confidence ?? 'low'];

const charge = (ion: string): number => Number(/(\d)\+$/.exec(ion)?.[1] ?? 0);

/**
 * Weighted mean of the logarithms. The result is never surer than its best member allows, and where the members scatter
 * more than their own standard deviations explain, it is less sure by the ratio of the two (R. T. Birge, Phys. Rev. 40,
 * 207, 1932).
 */
export function pool(evidence: readonly Evidence[]): { value: number; sigma: number } {
  let weight = 0;
  let sum = 0;
  for (const { value, sigma } of evidence) {
    weight += 1 / sigma ** 2;
    sum += Math.log(value) / sigma ** 2;
  }
  const mean = sum / weight;
  const scatter = evidence.reduce(
    (total, { value, sigma }) => total + ((Math.log(value) - mean) / sigma) ** 2,
    0,
  );
  const birge = evidence.length > 1 ? Math.sqrt(scatter / (evidence.length - 1)) : 1;
  const best = Math.min(...evidence.map(({ sigma }) => sigma));
  return {
    value: Math.exp(mean),
    sigma: Math.max(Math.sqrt(1 / weight), 0.7 * best) * Math.max(1, birge),
  };
}

function publishedF(f: SourcedValue, acceptor: boolean): Evidence | null {
  if (f.value === null) return null;
  if (f.sigma !== null) {
    const text = `f = ${f.value} (${f.source})`;
    return { value: f.value, sigma: f.sigma / f.value, route: 'published-factors', text };
  }
  const soft = f.confidence === 'low' ? 0.03 : f.confidence === 'medium' ? 0.01 : 0;
  const sigma = (acceptor ? defaultDoubts.acceptorF : defaultDoubts.publishedF) + soft;
  return { value: f.value, sigma, route: 'published-factors', text: `f = ${f.value} (${f.source})` };
}

/** f from 10Dq observed with the same ligand on other metals. */
function fromRelatives(
  ligand: LigandRecord,
  ion: IonRecord,
  library: ParameterLibrary,
  shape: Anchor['geometry'] = null,
): Evidence[] {
  return ligand.anchors.flatMap((anchor) => {
    const other = library.ions.get(anchor.metal);
    const g = shape === null ? other?.g.value : other?.gSquarePlanar.value;
    if (other === undefined || g == null || anchor.metal === ion.ion || anchor.geometry !== shape) return [];
    const otherCharge = Math.abs(charge(anchor.metal) - ion.oxidationState);
    const far = ligand.piCharacter === 'acceptor' ? 0.06 : 0.025;
    const sigma = Math.hypot(confidenceSigma(anchor.confidence), 0.025, far * otherCharge);
    const value = onTableScale(anchor, ligand, other) / g;
    const text = `f = ${value.toFixed(2)} from 10Dq ${anchor.tenDq} of ${anchor.complex} (${anchor.source})`;
    return [{ value, sigma, route: 'metal-specific' as const, text }];
  });
}

function fromAngularOverlap(ligand: LigandRecord, library: ParameterLibrary): Evidence[] {
  return ligand.angularOverlap.flatMap((set) => {
    const g = library.ions.get(set.metal)?.g.value;
    if (g == null) return [];
    const value = (3 * set.eSigma - 2 * set.piDirections * set.ePi) / g;
    const text = `f = ${value.toFixed(2)} from angular-overlap parameters on ${set.metal} (${set.source})`;
    return [{ value, sigma: 0.06, route: 'measured-relative' as const, text }];
  });
}

/** Middle of the bracket that the spectrochemical series sets, and a third of its width. */
function fromPlace(ligand: LigandRecord, library: ParameterLibrary): Evidence | null {
  const { place } = ligand;
  if (place === null) return null;
  const values = (ids: readonly string[]): number[] =>
    ids.flatMap((id) => library.ligands.get(id)?.f.value ?? []);
  const below = values(place.strongerThan);
  const above = values(place.weakerThan);
  if (below.length === 0 || above.length === 0) return null;
  const low = Math.max(...below);
  const high = Math.min(...above);
  const value = (low + high) / 2;
  const sigma = Math.max(0.05, Math.abs(high - low) / 3 / value);
  const text = `f between ${low} and ${high}: stronger than ${place.strongerThan.join(', ')}, weaker than ${place.weakerThan.join(', ')} (${place.source})`;
  return { value, sigma, route: 'series-place', text };
}

/** f of a ligand from its table value or its own complexes, without any appeal to its class. */
function ownStrength(ligand: LigandRecord, ion: IonRecord, library: ParameterLibrary): number | null {
  const acceptor = ligand.piCharacter === 'acceptor';
  const table = publishedF(ligand.f, acceptor);
  const relatives = table === null || acceptor ? fromRelatives(ligand, ion, library) : [];
  const evidence = [...(table === null ? [] : [table]), ...relatives];
  return evidence.length === 0 ? null : pool(evidence).value;
}

function fromClass(
  ligand: LigandRecord,
  ion: IonRecord,
  library: ParameterLibrary,
  fewest: number,
): Evidence | null {
  const found = classMean(ligand, library, (other) => ownStrength(other, ion, library), fewest);
  if (found === null) return null;
  const spread = found.spread === null ? 0.12 : found.spread / found.mean;
  const sigma = Math.max(defaultDoubts.donorClassF, spread);
  const text = `f = ${found.mean.toFixed(2)}, mean of ${found.members.join(', ')}`;
  return { value: found.mean, sigma, route: 'donor-class', text };
}

const factorOf = (evidence: readonly Evidence[], route: EstimateRoute, settle?: string): Factor => ({
  ...pool(evidence),
  route,
  reasons: [
    ...evidence.map(({ text }): Reason => ({ kind: 'source', text })),
    ...(settle === undefined ? [] : [{ kind: 'settle' as const, text: settle }]),
  ],
});

/**
 * Spectrochemical factor f of a ligand towards an ion, by the most trusted route there is: the published value; for π
 * acceptors, whose f is not one number, that value together with what complexes of metals of like charge show; complexes
 * of other metals; place in the series and donor class. Null where nothing at all is known.
 */
export function ligandStrength(
  ligand: LigandRecord,
  ion: IonRecord,
  library: ParameterLibrary,
  shape: Anchor['geometry'] = null,
): Factor | null {
  const planar = shape === null ? [] : fromRelatives(ligand, ion, library, shape);
  if (planar.length > 0) return factorOf(planar, 'measured-relative');
  const acceptor = ligand.piCharacter === 'acceptor';
  const table = publishedF(ligand.f, acceptor);
  const relatives = fromRelatives(ligand, ion, library);
  if (table !== null && !acceptor) return factorOf([table], table.route);
  if (table !== null) {
    return factorOf([table, ...relatives], relatives.length > 0 ? 'metal-specific' : table.route);
  }
  if (relatives.length > 0) return factorOf(relatives, 'measured-relative');
  const settle = `the spectrum of [Ni(${ligand.abbreviation})n]2+, whose first band is 10Dq, would give f`;
  const weak = [fromPlace(ligand, library), fromClass(ligand, ion, library, 2)].filter(
    (each) => each !== null,
  );
  const overlap = fromAngularOverlap(ligand, library);
  if (overlap.length > 0) return factorOf(overlap, 'measured-relative', settle);
  if (weak.length > 0) return factorOf(weak, weak[0]!.route, settle);
  const one = fromClass(ligand, ion, library, 1);
  return one === null ? null : factorOf([{ ...one, sigma: 0.15 }], 'donor-class', settle);
}
