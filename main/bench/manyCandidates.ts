import { defaultLibrary } from '../../core/library';
import { isomersOfComposition } from '../../core/geometry/ligandSites';
import type { Candidate, Project } from '../../core/record/project';
import { seededFractions } from './seededFractions';

const at = '2026-03-01T09:00:00.000Z';
const row = (id: string) => ({ id, revision: 0, createdAt: at, updatedAt: at, deletedAt: null });

export const benchProject: Project = {
  ...row('bench-project'),
  name: 'Many candidates',
  notes: '',
  demo: false,
  targetLab: [60, 20, -30],
  parameterSetId: null,
};

/** As many candidates as asked for, each another complex as far as there are that many; the same ones every time. */
export function manyCandidates(count: number): Candidate[] {
  const monodentate = [...defaultLibrary.ligands.values()].filter(({ denticity }) => denticity === 1);
  const ions = [...defaultLibrary.ions.values()].filter(
    ({ dElectrons }) => dElectrons >= 1 && dElectrons <= 9,
  );
  const next = seededFractions(11);
  const pick = <T>(list: readonly T[]): T => list[Math.floor(next() * list.length)]!;
  return Array.from({ length: count }, (_, index): Candidate => {
    const ion = pick(ions);
    const [one, other] = [pick(monodentate).id, pick(monodentate).id];
    const first = 1 + Math.floor(next() * 5);
    const ligands = one === other ? { [one]: 6 } : { [one]: first, [other]: 6 - first };
    const composition = {
      metal: ion.symbol,
      oxidationState: ion.oxidationState,
      geometry: 'octahedral' as const,
      ligands,
      isomer: null,
    };
    const [isomer] = isomersOfComposition(composition, defaultLibrary);
    return {
      ...row(`bench-${String(index).padStart(6, '0')}`),
      projectId: benchProject.id,
      name: `candidate ${index}`,
      composition: { ...composition, isomer: isomer?.name ?? null },
      counterIon: null,
      solvate: null,
      concentration_mM: null,
      path_cm: null,
      tags: index % 7 === 0 ? ['seventh'] : [],
      starred: index % 13 === 0,
      archived: false,
      notes: '',
    };
  });
}
