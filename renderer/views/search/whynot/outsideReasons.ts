import type { ParameterLibrary } from '../../../../core/library/parameterLibrary';
import type { Composition } from '../../../../core/record/composition';
import type { WishInput } from '../../../../core/search';
import { admittedLigands } from '../../../../core/search/space/ligandPool';
import { admittedIons } from '../../../../core/search/wish/contradictions';
import { wishSchema } from '../../../../core/search/wish/wish';

/** Why a search for a wish never looks at a complex: what the choice of ions, ligands, charge and so on keeps out. */
export function outsideReasons(given: WishInput, complex: Composition, library: ParameterLibrary): string[] {
  const parsed = wishSchema.safeParse(given);
  if (!parsed.success) return [];
  const wish = parsed.data;
  const { metal, oxidationState, geometry, ligands } = complex;
  const reasons: string[] = [];
  const ions = admittedIons(wish, library);
  if (!ions.some((ion) => ion.symbol === metal && ion.oxidationState === oxidationState)) {
    reasons.push(`${metal}${oxidationState}+ is not among the metal ions`);
  }
  if (wish.geometries !== 'all' && !(wish.geometries as readonly string[]).includes(geometry)) {
    reasons.push(`${geometry.replaceAll('-', ' ')} is not among the geometries`);
  }
  const admitted = new Set(admittedLigands(wish, library.ligands.values()).map(({ id }) => id));
  const kept = Object.keys(ligands).filter((id) => !admitted.has(id));
  if (kept.length > 0) {
    const names = kept.map((id) => library.ligands.get(id)?.abbreviation ?? id);
    reasons.push(`${names.join(', ')}: not among the ligands, or ruled out`);
  }
  const kinds = Object.keys(ligands).length;
  if (kinds > wish.ligands.maxKinds) {
    reasons.push(`${kinds} kinds of ligand where at most ${wish.ligands.maxKinds} are allowed`);
  }
  const charge = Object.entries(ligands).reduce(
    (sum, [id, count]) => sum + count * (library.ligands.get(id)?.charge ?? 0),
    oxidationState,
  );
  if (wish.charge !== undefined && (charge < wish.charge.min || charge > wish.charge.max)) {
    reasons.push(`charge ${charge} where ${wish.charge.min} to ${wish.charge.max} is wanted`);
  }
  return reasons;
}
