import { useState } from 'react';
import { missingOfSample } from '../../../../core/record/missing';
import type { Candidate } from '../../../../core/record/project';
import type { Sample } from '../../../../core/record/sample';
import { dayOf, useAction, useStore } from '../../../app/services';
import { Formula, formatFigures, useToast } from '../../../parts';
import type { SampleFields } from '../../../store';
import { SampleDialog } from './SampleDialog';

interface SamplePanelProps {
  readonly candidate: Candidate;
  readonly samples: readonly Sample[];
}

/** Batches of one candidate: what was weighed and what stood in the beam. */
export function SamplePanel({ candidate, samples }: SamplePanelProps) {
  const store = useStore();
  const act = useAction();
  const toast = useToast();
  const [open, setOpen] = useState<'new' | Sample | null>(null);
  const save = (fields: SampleFields): Promise<boolean> =>
    act(async () => {
      if (open === 'new') await store.samples.add(store.journal, candidate, fields);
      else if (open !== null) await store.samples.change(store.journal, open, fields);
      const undo = (): void => void act(() => store.journal.undo(candidate.projectId));
      toast({ message: 'Batch saved', undo });
    });
  return (
    <section className="panel stack" aria-labelledby="record-samples">
      <div className="record-head">
        <h2 id="record-samples">Batches</h2>
        <span className="record-actions">
          <button type="button" onClick={() => setOpen('new')}>
            Add a batch…
          </button>
        </span>
      </div>
      {samples.length === 0 ? (
        <p className="soft">
          No batch yet. Molar absorptivity and moment rest on the molar mass of what was weighed, with
          counter-ion and solvate.
        </p>
      ) : (
        <ul className="record-list">
          {samples.map((sample) => (
            <li key={sample.id}>
              <div>
                <strong>{sample.batch}</strong>
                {sample.formula !== null && (
                  <>
                    {' '}
                    <Formula formula={sample.formula} />
                  </>
                )}
                <p>{factsOf(sample)}</p>
                <Missing sample={sample} />
              </div>
              <div className="record-actions">
                <button type="button" onClick={() => setOpen(sample)}>
                  Edit…<span className="visually-hidden"> batch {sample.batch}</span>
                </button>
              </div>
            </li>
          ))}
        </ul>
      )}
      {open !== null && (
        <SampleDialog
          candidate={candidate}
          sample={open === 'new' ? null : open}
          onSave={save}
          onClose={() => setOpen(null)}
        />
      )}
    </section>
  );
}

function factsOf({
  molarMass_g_mol,
  molarMassBasis,
  purity_percent,
  purityBasis,
  phase,
  mass_mg,
  madeOn,
  operator,
}: Sample): string {
  return [
    molarMass_g_mol !== null && `${formatFigures(molarMass_g_mol, 5)} g/mol (${molarMassBasis ?? 'typed'})`,
    purity_percent !== null && `${purity_percent} %${purityBasis === null ? '' : ` by ${purityBasis}`}`,
    phase,
    mass_mg !== null && `${mass_mg} mg`,
    madeOn !== null && `made ${dayOf(madeOn)}`,
    operator,
  ]
    .filter(Boolean)
    .join(', ');
}

function Missing({ sample }: { readonly sample: Sample }) {
  const missing = missingOfSample(sample);
  return missing.length === 0 ? null : (
    <p className="soft small">Not written down: {missing.map(({ label }) => label).join(', ')}</p>
  );
}
