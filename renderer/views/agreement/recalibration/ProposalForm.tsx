import { useId, useState, type FormEvent } from 'react';
import type { Recalibration } from '../../../../core/agreement/recalibration';
import { Field } from '../../../app/form';
import { useSettings } from '../../../app/services';
import { formatFigures } from '../../../parts';
import type { Approval } from './adoptedSet';

interface ProposalFormProps {
  readonly proposal: Recalibration;
  readonly onApprove: (approval: Approval) => void;
  readonly onClose: () => void;
}

const kindWords: Record<string, string> = {
  f: 'field factor f',
  g: 'field factor g',
  h: 'nephelauxetic factor h',
  k: 'nephelauxetic factor k',
};

/** `ligand.nh3.f` as people say it. */
function keyWords(key: string): string {
  const [kind, subject, quantity] = key.split('.');
  if (kind === 'anchor') return `10Dq measured on ${subject} with ${quantity}`;
  return `${kindWords[quantity ?? ''] ?? quantity} of ${subject}`;
}

/** What would change, line by line, and who says so why. */
export function ProposalForm({ proposal, onApprove, onClose }: ProposalFormProps) {
  const form = useId();
  const { settings } = useSettings();
  const [without, setWithout] = useState<ReadonlySet<string>>(new Set());
  const [own, setOwn] = useState(true);
  const [name, setName] = useState('');
  const [author, setAuthor] = useState(settings.initials);
  const [reason, setReason] = useState('');
  const [missing, setMissing] = useState(false);
  const changes = proposal.parts.filter(({ adopt }) => adopt).flatMap((part) => part.changes);
  const complexes = new Set(
    Object.keys(proposal.measuredComplexes).map((key) => key.split('.').slice(0, -1).join('.')),
  );
  const nothing = changes.length === 0 && !own;
  const submit = (event: FormEvent): void => {
    event.preventDefault();
    const incomplete = name.trim() === '' || author.trim() === '' || reason.trim() === '';
    setMissing(incomplete);
    if (incomplete || nothing) return;
    onApprove({
      name: name.trim(),
      author: author.trim(),
      reason: reason.trim(),
      without,
      keepMeasuredComplexes: own,
    });
  };
  const toggle = (key: string): void =>
    setWithout((before) => {
      const after = new Set(before);
      if (!after.delete(key)) after.add(key);
      return after;
    });
  const field = (label: string, value: string, set: (value: string) => void, most: number) => (
    <Field label={label} error={missing && value.trim() === '' ? 'Needed: it is kept with the set.' : null}>
      {(attributes) => (
        <input
          {...attributes}
          maxLength={most}
          value={value}
          onChange={(event) => set(event.currentTarget.value)}
        />
      )}
    </Field>
  );
  return (
    <form id={form} className="stack" onSubmit={submit} noValidate aria-label="Proposed parameters">
      {proposal.parts.map(({ quantity, statement, outliers }) => (
        <p key={quantity}>
          {statement}.
          {outliers.length > 0 &&
            ` ${outliers.length} ${outliers.length === 1 ? 'complex lies' : 'complexes lie'} far from the others and counts for less.`}
        </p>
      ))}
      {changes.length > 0 && (
        <div className="recalibration-choices" tabIndex={0} role="group" aria-label="Changes">
          <table className="plain-table">
            <thead>
              <tr>
                <th scope="col">Take</th>
                <th scope="col">Parameter</th>
                <th scope="col">In use ± σ</th>
                <th scope="col">Proposed ± σ</th>
                <th scope="col">
                  <abbr title="change in standard deviations of the value in use; beyond 2 literature and record contradict each other">
                    Shift/σ
                  </abbr>
                </th>
                <th scope="col">From</th>
              </tr>
            </thead>
            <tbody>
              {changes.map(({ key, before, after, shift, from }) => (
                <tr key={key}>
                  <td>
                    <input
                      type="checkbox"
                      aria-label={`Take ${keyWords(key)}`}
                      checked={!without.has(key)}
                      onChange={() => toggle(key)}
                    />
                  </td>
                  <th scope="row">{keyWords(key)}</th>
                  <td className="figures">
                    {formatFigures(before.value, 4)} ± {formatFigures(before.sigma, 2)}
                  </td>
                  <td className="figures">
                    {formatFigures(after.value, 4)} ± {formatFigures(after.sigma, 2)}
                  </td>
                  <td className="figures">{shift.toFixed(1)}</td>
                  <td>
                    {from.length} {from.length === 1 ? 'fit' : 'fits'}
                  </td>
                </tr>
              ))}
            </tbody>
          </table>
        </div>
      )}
      {complexes.size > 0 && (
        <label className="check">
          <input type="checkbox" checked={own} onChange={(event) => setOwn(event.currentTarget.checked)} />
          <span>
            Also use what was measured on{' '}
            {complexes.size === 1 ? 'this complex' : `these ${complexes.size} complexes`} for the complexes
            themselves
          </span>
        </label>
      )}
      <div className="analysis-fields">
        {field('Name of the parameter set', name, setName, 200)}
        {field('Approved by', author, setAuthor, 100)}
        {field('Reason', reason, setReason, 1000)}
      </div>
      {nothing && <p className="soft">Nothing is proposed, so there is nothing to approve.</p>}
      <div className="analysis-actions">
        <button type="submit" className="button-main" disabled={nothing}>
          Approve and use
        </button>
        <button type="button" onClick={onClose}>
          Decline
        </button>
      </div>
    </form>
  );
}
