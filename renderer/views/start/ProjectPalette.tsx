import { useCallback } from 'react';
import type { SeenColour } from '../../../core/colour/types';
import type { Project } from '../../../core/record/project';
import { estimateKey, inputOf, type Conditions } from '../../app/session/candidateInput';
import { useSettings, useStored } from '../../app/services';
import type { Store } from '../../store';
import type { CandidateSummary } from '../../workers/estimateSummary';
import { madeWithName } from '../../workers/madeWith';
import './ProjectPalette.css';

const most = 30;

/** Colours of the first candidates, as far as they were estimated before; nothing is computed for it. */
async function coloursOf(
  store: Store,
  project: Project,
  conditions: Conditions,
): Promise<readonly SeenColour[]> {
  const set = project.parameterSetId === null ? null : await store.parameterSets.get(project.parameterSetId);
  const madeWith = madeWithName(set ?? null);
  for await (const rows of store.candidates.inPortions(project.id, 2 * most)) {
    const shown = rows.filter(({ deletedAt, archived }) => deletedAt === null && !archived).slice(0, most);
    const keys = shown.map((candidate) => estimateKey(inputOf(candidate, conditions), madeWith));
    const summaries = (await store.estimates.read(keys)) as (CandidateSummary | undefined)[];
    return summaries.flatMap((summary) => (summary?.ok && summary.colour ? [summary.colour] : []));
  }
  return [];
}

/** What the project looks like, literally. */
export function ProjectPalette({ project }: { readonly project: Project }) {
  const { settings } = useSettings();
  const { concentration_mM, path_cm } = settings;
  const ask = useCallback(
    (store: Store) => coloursOf(store, project, { concentration_mM, path_cm }),
    [project, concentration_mM, path_cm],
  );
  const { value: colours } = useStored(ask, ['candidates']);
  if (colours === undefined || colours.length === 0) return null;
  return (
    <div className="project-palette" aria-hidden="true">
      {colours.map(({ srgb, words }, index) => (
        <span key={index} title={words} style={{ backgroundColor: srgb }} />
      ))}
    </div>
  );
}
