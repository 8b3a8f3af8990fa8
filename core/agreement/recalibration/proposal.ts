import { estimateField } from '../../estimation';
import { ligandCovalency, metalCovalency } from '../../estimation/nephelauxetic';
import { ligandStrength, type Factor } from '../../estimation/ligandStrength';
import { metalStrength } from '../../estimation/metalStrength';
import { findIon, type ParameterLibrary, type ParameterValues } from '../../library';
import { gaussianUpdate } from '../../numerics/leastSquaresUpdate';
import type { Evidence, Quantity } from './evidence';

/** One parameter before and after, for the user to look at. */
export interface ParameterChange {
  /** `ligand.nh3.f`, `ion.Ni2+.g` */
  readonly key: string;
  readonly before: { readonly value: number; readonly sigma: number };
  readonly after: { readonly value: number; readonly sigma: number };
  /** Shift in prior standard deviations; beyond 2 the literature and the record contradict each other. */
  readonly shift: number;
  /** Complexes that speak about it. */
  readonly from: readonly string[];
}

export interface Proposal {
  readonly changes: readonly ParameterChange[];
  /** Complexes far from all others: they count for less and are named, never dropped. */
  readonly outliers: readonly { readonly id: string; readonly misfit: number; readonly weight: number }[];
}

/** The stored parameter behind a cause of doubt; null for doubts about the model, which are nobody's parameter. */
function parameterOf(cause: string, evidence: Evidence): { key: string; factor: Factor } | null {
  const [kind, ...rest] = cause.split(':');
  const { library, composition } = evidence.observation;
  const ion = findIon(library, composition.metal, composition.oxidationState);
  if (ion === undefined) return null;
  const square = composition.geometry === 'square-planar';
  const ligand = library.ligands.get(kind === 'anchor' ? rest[1]! : rest[0]!);
  const named = (key: string, factor: Factor | null) => (factor === null ? null : { key, factor });
  switch (kind) {
    case 'f':
      return ligand === undefined || square
        ? null
        : named(`ligand.${ligand.id}.f`, ligandStrength(ligand, ion, library));
    case 'g':
      return rest[0] !== ion.ion || square ? null : named(`ion.${ion.ion}.g`, metalStrength(ion, library));
    case 'h':
      return ligand === undefined ? null : named(`ligand.${ligand.id}.h`, ligandCovalency(ligand, library));
    case 'k':
      return rest[0] !== ion.ion ? null : named(`ion.${ion.ion}.k`, metalCovalency(ion, library));
    case 'anchor': {
      const donor = estimateField(composition, library)?.donors.find((each) => each.ligand.id === rest[1]);
      const share = donor?.shares.find((each) => each.cause === cause);
      if (square || donor === undefined || share === undefined || rest[0] !== ion.ion) return null;
      const factor: Factor = {
        value: donor.tenDq,
        sigma: share.sigma / donor.tenDq,
        route: donor.route,
        reasons: [],
      };
      return named(`anchor.${ion.ion}.${rest[1]!}`, factor);
    }
    default:
      return null;
  }
}

const digits = (value: number): number => Number(value.toPrecision(4));

/**
 * Parameters that make the observations most probable given what the literature says: weighted least squares of ln 10Dq
 * (or ln B) over all causes of doubt, shrunk towards the values in use (C. K. Jorgensen's f, g, h, k with their standard
 * deviations). Doubts about the model itself soak up what no parameter should.
 */
export function proposeChanges(evidence: readonly Evidence[]): Proposal {
  const causes = [...new Set(evidence.flatMap((each) => [...each.sensitivity.keys()]))].sort();
  const design = evidence.map((each) => causes.map((cause) => each.sensitivity.get(cause) ?? 0));
  const update = gaussianUpdate(
    design,
    evidence.map((each) => each.misfit),
    evidence.map((each) => each.variance),
  );
  const changes: ParameterChange[] = [];
  for (const [j, cause] of causes.entries()) {
    const speaking = evidence.filter((each) => (each.sensitivity.get(cause) ?? 0) !== 0);
    const parameter = parameterOf(cause, speaking[0]!);
    if (parameter === null) continue;
    const { key, factor } = parameter;
    // A cause of B enters with a negative sign: more covalency, less B. The shift is that of the parameter itself.
    const value = factor.value * Math.exp(factor.sigma * update.shift[j]!);
    changes.push({
      key,
      before: { value: digits(factor.value), sigma: digits(factor.sigma * factor.value) },
      after: { value: digits(value), sigma: digits(factor.sigma * update.narrowed[j]! * value) },
      shift: update.shift[j]!,
      from: speaking.map((each) => each.observation.id),
    });
  }
  const outliers = evidence.flatMap((each, i) =>
    update.weights[i]! < 0.5
      ? [{ id: each.observation.id, misfit: each.misfit, weight: update.weights[i]! }]
      : [],
  );
  return { changes, outliers };
}

/** Changes as entries of a parameter set. */
export function asValues(changes: readonly ParameterChange[], why: string): ParameterValues['values'] {
  return Object.fromEntries(
    changes.map((change) => [
      change.key,
      {
        value: change.after.value,
        sigma: change.after.sigma,
        source: `${why}, from ${change.from.length} complexes`,
      },
    ]),
  );
}

export type { ParameterLibrary, Quantity };
