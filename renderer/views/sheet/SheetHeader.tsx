import { useMemo, useState } from 'react';
import { complexFormula } from '../../../core/library/complexFormula';
import { defaultLibrary } from '../../../core/library/parameterLibrary';
import type { Prediction } from '../../../core/prediction/types';
import type { Candidate } from '../../../core/record/project';
import { type Command, menuCommand, useCommands } from '../../app/commands';
import { linkTo, useRouter } from '../../app/router/RouterContext';
import { useAction, useStore } from '../../app/services';
import { neighboursOf } from '../../app/session/shownOrder';
import { ViewHeader } from '../../app/shell/ViewHeader';
import { Formula, useToast } from '../../parts';
import { reportItem } from '../reports/reportItem';
import { FreezeDialog } from './FreezeDialog';
import './SheetHeader.css';

interface SheetHeaderProps {
  readonly candidate: Candidate;
  /** Null while there is none that could be frozen. */
  readonly prediction: Prediction | null;
}

export function SheetHeader({ candidate, prediction }: SheetHeaderProps) {
  const { id, projectId, composition, name } = candidate;
  const formula = complexFormula(composition, defaultLibrary);
  const [freezing, setFreezing] = useState(false);
  const neighbours = neighboursOf(projectId, id);
  const actions = useSheetActions(candidate);
  const { go } = useRouter();
  const canFreeze = prediction !== null;
  useCommands(
    useMemo((): readonly Command[] => {
      const open = (item: string | null) => () =>
        item !== null && go({ view: 'sheet', project: projectId, item });
      const command = (
        key: string,
        label: string,
        keys: string,
        run: () => void,
        disabled = false,
      ): Command => ({
        id: `sheet.${key}`,
        label,
        group: 'Complex',
        keys: [keys],
        run,
        disabled,
      });
      return [
        command('next', 'Next candidate', 'j', open(neighbours.after), neighbours.after === null),
        command('previous', 'Previous candidate', 'k', open(neighbours.before), neighbours.before === null),
        command('edit', 'Change the candidate', 'e', () =>
          go({ view: 'entry', project: projectId, item: id }),
        ),
        command('freeze', 'Freeze the prediction', 'z', () => setFreezing(true), !canFreeze),
        menuCommand('add-measurement', () => go({ view: 'record', project: projectId, item: id }), {
          keys: ['m'],
        }),
        command('star', 'Star or unstar', 's', actions.star),
        command('delete', 'Delete', 'Delete', actions.remove),
        command('back', 'Back to the table', 'u', () => go({ view: 'candidates', project: projectId })),
      ];
    }, [go, projectId, id, neighbours.before, neighbours.after, canFreeze, actions]),
  );
  return (
    <>
      <nav className="sheet-way" aria-label="Way through the candidates">
        <a href={linkTo({ view: 'candidates', project: projectId })}>All candidates</a>
        {neighbours.place !== null && (
          <span className="soft">
            {neighbours.place} of {neighbours.count}
          </span>
        )}
        <Neighbour project={projectId} item={neighbours.before} word="previous" />
        <Neighbour project={projectId} item={neighbours.after} word="next" />
      </nav>
      <ViewHeader
        title={<Formula formula={formula} />}
        summary={[
          composition.isomer,
          composition.geometry.replaceAll('-', ' '),
          name,
          ...candidate.tags.map((tag) => `#${tag}`),
          candidate.archived ? 'archived' : null,
        ]
          .filter(Boolean)
          .join(', ')}
        actions={
          <>
            <button type="button" aria-pressed={candidate.starred} onClick={actions.star}>
              {candidate.starred ? '★ Starred' : '☆ Star'}
            </button>
            <a className="button" href={linkTo({ view: 'entry', project: projectId, item: id })}>
              Change…
            </a>
            <a className="button" href={linkTo({ view: 'record', project: projectId, item: id })}>
              Record…
            </a>
            <a
              className="button"
              href={linkTo({
                view: 'reports',
                project: projectId,
                item: reportItem({ kind: 'card', names: [id] }),
              })}
            >
              Card…
            </a>
            <button type="button" onClick={actions.remove}>
              Delete
            </button>
            <button
              type="button"
              className="button-main"
              disabled={!canFreeze}
              onClick={() => setFreezing(true)}
            >
              Freeze prediction…
            </button>
          </>
        }
      />
      <FreezeDialog
        open={freezing}
        candidate={candidate}
        prediction={prediction}
        formula={formula}
        onClose={() => setFreezing(false)}
      />
    </>
  );
}

interface NeighbourProps {
  readonly project: string;
  readonly item: string | null;
  readonly word: string;
}

const Neighbour = ({ project, item, word }: NeighbourProps) =>
  item !== null && <a href={linkTo({ view: 'sheet', project, item })}>{word}</a>;

function useSheetActions(candidate: Candidate) {
  const store = useStore();
  const act = useAction();
  const toast = useToast();
  const { go } = useRouter();
  return useMemo(
    () => ({
      star: () => {
        const starred = !candidate.starred;
        void act(() =>
          store.candidates.update(candidate, `${starred ? 'star' : 'unstar'} 1 candidate`, { starred }),
        );
      },
      remove: () =>
        void act(async () => {
          await store.candidates.remove(candidate.projectId, [candidate.id]);
          go({ view: 'candidates', project: candidate.projectId });
          toast({
            message: '1 candidate moved to the bin',
            undo: () => void act(() => store.journal.undo(candidate.projectId)),
          });
        }),
    }),
    [store, act, toast, go, candidate],
  );
}
