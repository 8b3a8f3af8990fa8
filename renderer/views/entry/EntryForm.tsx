import { useMemo, type FormEvent } from 'react';
import { findGeometry } from '../../../core/library/geometries';
import { complexKey } from '../../../core/library/parameterLibrary';
import type { Candidate } from '../../../core/record/project';
import { shownCombo, useCommands } from '../../app/commands';
import { linkTo } from '../../app/router/RouterContext';
import { useProject } from '../../app/session/ProjectSession';
import { useLibrary } from '../../app/session/useLibrary';
import { usePrediction } from '../../app/session/usePrediction';
import { DetailFields } from './DetailFields';
import { compositionOf, placesTaken, withCount, withGeometry, withMetal } from './draft';
import { LiveEstimate } from './estimate/LiveEstimate';
import { FormulaField } from './formula/FormulaField';
import { GeometryRow } from './GeometryRow';
import { isomerNames } from './isomerNames';
import { IsomerRow } from './IsomerRow';
import { LigandPicker } from './ligands/LigandPicker';
import { MetalGrid } from './metal/MetalGrid';
import { StateRow } from './metal/StateRow';
import { useDraft } from './useDraft';
import { useSave } from './useSave';
import './EntryForm.css';

export function EntryForm({ candidate }: { readonly candidate: Candidate | null }) {
  const { project, rows, conditions } = useProject();
  const library = useLibrary();
  const { draft, basedOn, set, drop } = useDraft(project.id, candidate);
  const composition = useMemo(() => compositionOf(draft), [draft]);
  const places = findGeometry(draft.geometry)?.coordinationNumber ?? 6;
  const filled = placesTaken(draft.ligands, library) === places;
  const isomers = useMemo(
    () => (composition === null || !filled ? [] : isomerNames(composition, library)),
    [composition, filled, library],
  );

  const input = useMemo(
    () =>
      composition === null
        ? null
        : {
            ...composition,
            id: 'draft',
            concentration_mM: draft.concentration_mM ?? conditions.concentration_mM,
            path_cm: draft.path_cm ?? conditions.path_cm,
          },
    [composition, draft.concentration_mM, draft.path_cm, conditions],
  );
  const options = useMemo(() => ({ counterIon: draft.counterIon || null }), [draft.counterIon]);
  const asked = usePrediction(input, options);
  const missing =
    draft.metal === null
      ? 'Choose a metal to begin with.'
      : Object.keys(draft.ligands).length === 0
        ? 'Now the ligands: the estimate appears as soon as there is one set that fits.'
        : null;

  const twin = useMemo(
    () =>
      composition === null
        ? undefined
        : rows
            .values()
            .find(
              (row) => row.id !== candidate?.id && complexKey(row.composition) === complexKey(composition),
            ),
    [composition, rows, candidate],
  );
  const acceptable = asked.current && asked.outcome?.ok === true;
  const save = useSave({
    candidate,
    draft,
    basedOn,
    composition: acceptable ? composition : null,
    onSaved: drop,
  });
  useCommands(
    useMemo(
      () => [
        {
          id: 'entry.save',
          label: candidate === null ? 'Add to the project' : 'Save the change',
          group: 'Candidates',
          keys: ['Mod+Enter'],
          whileTyping: true,
          disabled: !acceptable,
          run: () => save.andOpen(),
        },
      ],
      [candidate, acceptable, save],
    ),
  );

  const submit = (event: FormEvent): void => {
    event.preventDefault();
    save.andOpen();
  };
  return (
    <form className="entry-form" onSubmit={submit}>
      <div className="entry-choices">
        <FormulaField
          library={library}
          onRead={({ composition: read, counterIon, solvate }) =>
            set({
              ...draft,
              ...read,
              ligands: { ...read.ligands },
              isomer: read.isomer ?? null,
              counterIon: counterIon ?? draft.counterIon,
              solvate: solvate ?? draft.solvate,
            })
          }
        />
        <MetalGrid
          value={draft.metal}
          library={library}
          onChange={(metal) => set(withMetal(draft, metal, library))}
        />
        {draft.metal !== null && (
          <StateRow
            metal={draft.metal}
            value={draft.oxidationState}
            library={library}
            onChange={(oxidationState) => set({ ...draft, oxidationState })}
          />
        )}
        <GeometryRow
          value={draft.geometry}
          library={library}
          onChange={(geometry) => set(withGeometry(draft, geometry))}
        />
        <LigandPicker
          ligands={draft.ligands}
          places={places}
          library={library}
          onCount={(ligand, count) => set(withCount(draft, ligand, Math.min(count, 12)))}
        />
        <IsomerRow names={isomers} value={draft.isomer} onChange={(isomer) => set({ ...draft, isomer })} />
        <details className="entry-more" open={candidate !== null}>
          <summary>Name, counter-ion, conditions, notes</summary>
          <DetailFields draft={draft} onChange={(change) => set({ ...draft, ...change })} />
        </details>
      </div>
      <div className="entry-side">
        <div className="entry-actions">
          <button
            type="submit"
            className="button-main"
            disabled={!acceptable}
            title={shownCombo('Mod+Enter')}
          >
            {candidate === null ? 'Add to the project' : 'Save the change'}
          </button>
          {candidate === null && (
            <button type="button" disabled={!acceptable} onClick={() => save.andGoOn()}>
              Add and go on
            </button>
          )}
          {twin && (
            <p className="small">
              The project has this complex already:{' '}
              <a href={linkTo({ view: 'sheet', project: project.id, item: twin.id })}>look at it</a>.
            </p>
          )}
        </div>
        <LiveEstimate asked={asked} missing={missing} />
      </div>
    </form>
  );
}
