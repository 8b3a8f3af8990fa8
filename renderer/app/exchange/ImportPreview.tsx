import { Dialog, ErrorPanel } from '../../parts';
import { counted, type TablePlan } from '../../store';
import type { ImportOffer } from './readImport';
import './ImportPreview.css';

interface ImportPreviewProps {
  readonly offer: ImportOffer | null;
  readonly onTake: (how: 'in-place' | 'copy') => void;
  readonly onClose: () => void;
}

const nouns: Record<TablePlan['table'], string> = {
  projects: 'project',
  candidates: 'candidate',
  parameterSets: 'parameter set',
  frozenPredictions: 'frozen prediction',
  samples: 'sample',
  measurements: 'measurement',
  analyses: 'analysis record',
  wishes: 'saved wish',
};

/** What an import would change, before it changes anything. */
export function ImportPreview({ offer, onTake, onClose }: ImportPreviewProps) {
  const plan = offer?.plan ?? null;
  return (
    <Dialog
      open={offer !== null}
      title={plan ? `Import “${plan.projectName}”?` : 'This file cannot be imported'}
      onClose={onClose}
      wide
      actions={
        <>
          <button type="button" onClick={onClose}>
            {plan ? 'Cancel' : 'Close'}
          </button>
          {plan?.known && (
            <button type="button" onClick={() => onTake('copy')}>
              Add as a second project
            </button>
          )}
          {plan && (
            <button type="button" className="button-main" onClick={() => onTake('in-place')}>
              {plan.known ? 'Bring the project here up to this' : 'Import'}
            </button>
          )}
        </>
      }
    >
      {offer !== null && <Preview offer={offer} />}
    </Dialog>
  );
}

function Preview({ offer }: { readonly offer: ImportOffer }) {
  const { plan, problems, fileName } = offer;
  return (
    <div className="import-preview">
      <p>
        From <strong>{fileName}</strong>. Nothing has been changed yet; the import can be undone in one step.
      </p>
      {problems.length > 0 && (
        <ErrorPanel
          title={plan ? 'Parts of the file are damaged and would be left out' : 'The file was not accepted'}
          problems={problems.slice(0, 12)}
        >
          {problems.length > 12 && <p>… and {problems.length - 12} more.</p>}
        </ErrorPanel>
      )}
      {plan && (
        <>
          <p>
            {plan.known
              ? 'This project is here already. Records that differ would be replaced by those of the file; records that only exist here stay.'
              : 'This project is not here yet.'}
          </p>
          <PlanTable tables={plan.tables} />
          <p className="soft small">
            Also new here: {counted(plan.others.curves, 'spectrum curve')},{' '}
            {counted(plan.others.files, 'raw file')}, {counted(plan.others.log, 'line')} of the log.
          </p>
        </>
      )}
    </div>
  );
}

function PlanTable({ tables }: { readonly tables: readonly TablePlan[] }) {
  const shown = tables.filter(
    ({ added, changed, same, onlyHere }) => added.length + changed.length + same + onlyHere > 0,
  );
  return (
    <table>
      <thead>
        <tr>
          <th scope="col">Records</th>
          <th scope="col">new</th>
          <th scope="col">replaced</th>
          <th scope="col">the same</th>
          <th scope="col">only here, kept</th>
        </tr>
      </thead>
      <tbody>
        {shown.map(({ table, added, changed, same, onlyHere }) => (
          <tr key={table}>
            <th scope="row">{nouns[table]}s</th>
            <td>{added.length}</td>
            <td>{changed.length}</td>
            <td>{same}</td>
            <td>{onlyHere}</td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}
