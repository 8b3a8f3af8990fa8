import { useMemo, useState, type FormEvent } from 'react';
import { defaultLibrary } from '../../../../core/library/parameterLibrary';
import { withParameterSet } from '../../../../core/library/parameterOverlay';
import { Field } from '../../../app/form';
import { useSettings } from '../../../app/services';
import type { Approval, Proposal } from './adoptedSet';
import { ChangeTable } from './ChangeTable';
import { OwnTable } from './OwnTable';
import { ownRows } from './proposalRows';

interface ProposalFormProps {
  readonly proposal: Proposal;
  readonly onApprove: (approval: Approval) => void;
  readonly onClose: () => void;
}

const sentence = (text: string): string => `${text[0]!.toUpperCase()}${text.slice(1)}.`;

/** What would change, line by line, and who says so why. */
export function ProposalForm({ proposal, onApprove, onClose }: ProposalFormProps) {
  const { value, observations, basis } = proposal;
  const { settings } = useSettings();
  const [without, setWithout] = useState<ReadonlySet<string>>(new Set());
  const [name, setName] = useState('');
  const [author, setAuthor] = useState(settings.initials);
  const [reason, setReason] = useState('');
  const [missing, setMissing] = useState(false);
  const library = useMemo(
    () => (basis === null ? defaultLibrary : withParameterSet(defaultLibrary, basis).library),
    [basis],
  );
  const changes = value.parts.filter(({ adopt }) => adopt).flatMap((part) => part.changes);
  const own = useMemo(() => ownRows(value, observations, library), [value, observations, library]);
  const taken = [...changes, ...own].filter(({ key }) => !without.has(key)).length;
  const submit = (event: FormEvent<HTMLFormElement>): void => {
    event.preventDefault();
    const incomplete = name.trim() === '' || author.trim() === '' || reason.trim() === '';
    setMissing(incomplete);
    const form = event.currentTarget;
    if (incomplete) requestAnimationFrame(() => form.querySelector<HTMLElement>('[aria-invalid]')?.focus());
    if (incomplete || taken === 0) return;
    onApprove({
      name: name.trim(),
      author: author.trim(),
      reason: reason.trim(),
      without,
    });
  };
  const toggle = (key: string): void =>
    setWithout((before) => {
      const after = new Set(before);
      if (!after.delete(key)) after.add(key);
      return after;
    });
  const field = (label: string, text: string, set: (value: string) => void, most: number) => (
    <Field label={label} error={missing && text.trim() === '' ? 'Needed: it is kept with the set.' : null}>
      {(attributes) => (
        <input
          {...attributes}
          maxLength={most}
          value={text}
          onChange={(event) => set(event.currentTarget.value)}
        />
      )}
    </Field>
  );
  return (
    <form className="stack" onSubmit={submit} noValidate aria-label="Proposed parameters">
      <div role="status">
        {value.parts.map(({ quantity, statement, outliers }) => (
          <p key={quantity}>
            {sentence(statement)}
            {outliers.length > 0 &&
              ` ${outliers.length} ${outliers.length === 1 ? 'fit lies far from the others and counts' : 'fits lie far from the others and count'} for less.`}
          </p>
        ))}
      </div>
      <div className="recalibration-choices" tabIndex={0} role="group" aria-label="Changes">
        {changes.length > 0 && (
          <ChangeTable
            changes={changes}
            library={library}
            from={basis === null ? 'literature' : `“${basis.name}”`}
            without={without}
            onToggle={toggle}
          />
        )}
        {own.length > 0 && <OwnTable rows={own} without={without} onToggle={toggle} />}
      </div>
      <div className="agreement-fields">
        {field('Name of the parameter set', name, setName, 200)}
        {field('Approved by', author, setAuthor, 100)}
        {field('Reason', reason, setReason, 1000)}
      </div>
      <div className="agreement-actions">
        <button type="submit" className="button-main" disabled={taken === 0}>
          Approve and use
        </button>
        <button type="button" onClick={onClose}>
          Decline
        </button>
        <span className="soft">
          {taken === 0
            ? 'No line is taken, so there is nothing to approve.'
            : `${taken} of ${changes.length + own.length} values taken; frozen predictions stay as they are.`}
        </span>
      </div>
    </form>
  );
}
