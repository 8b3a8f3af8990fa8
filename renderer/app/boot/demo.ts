import { demoProject } from '../../../core/library/demo';
import { blankCandidate, type Store } from '../../store';

/** Puts the demo project in at the very first start; once it was deleted it stays away. */
export async function loadDemoOnce(store: Store): Promise<void> {
  const { demoLoaded } = await store.settings.read();
  if (demoLoaded) return;
  await addDemo(store);
  await store.settings.set('demoLoaded', true);
}

export async function addDemo(store: Store): Promise<string> {
  const { name, notes, targetLab, candidates } = demoProject;
  const project = await store.projects.createWhole(
    { name, notes, targetLab: [...targetLab], parameterSetId: null, demo: true },
    candidates.map(({ id: _, composition, tags, ...candidate }) => ({
      ...blankCandidate,
      ...candidate,
      composition: { ...composition, ligands: { ...composition.ligands } },
      tags: [...tags],
    })),
  );
  return project.id;
}
