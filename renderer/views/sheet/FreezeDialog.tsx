import { useId, useState, type FormEvent } from 'react';
import type { Prediction } from '../../../core/prediction/types';
import type { Candidate } from '../../../core/record/project';
import { Field, focusFirst } from '../../app/form';
import { useAction, useStore } from '../../app/services';
import { Dialog, Formula, useToast } from '../../parts';

interface FreezeDialogProps {
  readonly open: boolean;
  readonly candidate: Candidate;
  readonly prediction: Prediction | null;
  readonly formula: string;
  readonly onClose: () => void;
}

/** Keeps the prediction as it stands, so that a measurement can be held against it later. */
export function FreezeDialog({ open, candidate, prediction, formula, onClose }: FreezeDialogProps) {
  const form = useId();
  const store = useStore();
  const act = useAction();
  const toast = useToast();
  const [reason, setReason] = useState('before the synthesis');
  const submit = (event: FormEvent): void => {
    event.preventDefault();
    if (prediction === null) return;
    void act(async () => {
      const label = `freeze the prediction for ${formula}`;
      await store.frozenPredictions.freeze(candidate, prediction, reason.trim().slice(0, 1000), label);
      toast({ message: 'Prediction frozen' });
    }).then((done) => done && onClose());
  };
  return (
    <Dialog
      open={open}
      title="Freeze this prediction"
      onClose={onClose}
      actions={
        <>
          <button type="button" onClick={onClose}>
            Cancel
          </button>
          <button type="submit" form={form} className="button-main">
            Freeze
          </button>
        </>
      }
    >
      <form id={form} className="stack" onSubmit={submit}>
        <p>
          What is expected of <Formula formula={formula} /> now is kept with time, parameters and model
          version. It can never be edited: only so is a later comparison worth something.
        </p>
        <Field label="Why now">
          {(attributes) => (
            <input
              {...attributes}
              ref={focusFirst}
              maxLength={1000}
              value={reason}
              onChange={(event) => setReason(event.currentTarget.value)}
            />
          )}
        </Field>
      </form>
    </Dialog>
  );
}
