import { useMemo } from 'react';
import type { ParameterLibrary } from '../../../core/library/parameterLibrary';
import { NumberField } from '../../app/form';
import { SegmentedChoice } from '../../parts';
import { PickMany } from './PickMany';
import { freshDraft, type DraftWindow, type WishDraft } from './wishDraft';
import { WholeNumberField } from './WholeNumberField';

interface WishFormProps {
  readonly draft: WishDraft;
  readonly onChange: (draft: WishDraft) => void;
  readonly library: ParameterLibrary;
  readonly hasTarget: boolean;
}

const geometryChoices = [
  ['octahedral', 'octahedral'],
  ['tetrahedral', 'tetrahedral'],
  ['square-planar', 'square planar'],
] as const;

/** What is wanted, and among what to look. */
export function WishForm({ draft, onChange, library, hasTarget }: WishFormProps) {
  const set = (part: Partial<WishDraft>): void => onChange({ ...draft, ...part });
  const ions = useMemo(
    () =>
      [...library.ions.values()]
        .filter(({ dElectrons }) => dElectrons > 0 && dElectrons < 10)
        .map(({ ion, dElectrons, period }) => ({ id: ion, label: ion, detail: `d${dElectrons}, ${period}` })),
    [library],
  );
  const ligands = useMemo(
    () =>
      [...library.ligands.values()].map(({ id, abbreviation, commonName }) => ({
        id,
        label: abbreviation,
        detail: commonName,
      })),
    [library],
  );
  const published = useMemo(
    () => [...library.ligands.values()].filter(({ f }) => f.value !== null).map(({ id }) => id),
    [library],
  );
  const threeD = [...library.ions.values()].filter((ion) => ion.period === '3d' && ion.g.value !== null);
  return (
    <div className="wish-form stack">
      <section className="panel stack" aria-labelledby="wish-wanted">
        <h2 id="wish-wanted">Wanted</h2>
        <WindowFields
          legend="Absorbs between"
          value={draft.absorb}
          strength="at least this strong, if it matters"
          onChange={(absorb) => set({ absorb })}
        />
        <WindowFields
          legend="Lets through between"
          value={draft.pass}
          strength="at most this strong; 5 if empty"
          onChange={(pass) => set({ pass })}
        />
        <SegmentedChoice
          legend="Spin state"
          legendShown
          options={[
            { id: 'any', label: 'any' },
            { id: 'high', label: 'high spin' },
            { id: 'low', label: 'low spin' },
          ]}
          value={draft.spin}
          onChange={(spin) => set({ spin })}
        />
        <fieldset className="wish-pair">
          <legend>10Dq</legend>
          <NumberField
            label="from"
            unit="cm⁻¹"
            value={draft.tenDq.min}
            empty="any"
            onChange={(min) => set({ tenDq: { ...draft.tenDq, min } })}
          />
          <NumberField
            label="to"
            unit="cm⁻¹"
            value={draft.tenDq.max}
            empty="any"
            onChange={(max) => set({ tenDq: { ...draft.tenDq, max } })}
          />
        </fieldset>
        <NumberField
          label="Seen colour within ΔE00 of the project’s target"
          unit=""
          value={draft.colourTolerance}
          empty={hasTarget ? 'empty: colour does not count' : 'the project has no target colour yet'}
          most={200}
          onChange={(colourTolerance) => set({ colourTolerance })}
        />
      </section>
      <section className="panel stack" aria-labelledby="wish-among">
        <h2 id="wish-among">Among</h2>
        <PickMany
          legend="Metal ions"
          one="metal ion"
          options={ions}
          chosen={draft.ions}
          onChange={(chosen) => set({ ions: chosen })}
          presets={[
            { label: 'usual eight', ids: freshDraft.ions },
            { label: 'all 3d ions with a known strength', ids: threeD.map(({ ion }) => ion) },
            { label: 'none', ids: [] },
          ]}
        />
        <PickMany
          legend="Ligands"
          one="ligand"
          options={ligands}
          chosen={draft.ligands}
          onChange={(chosen) => set({ ligands: chosen })}
          presets={[
            { label: 'usual nine', ids: freshDraft.ligands },
            { label: `all ${published.length} with a published strength`, ids: published },
            { label: 'none', ids: [] },
          ]}
        />
        <SegmentedChoice
          legend="Kinds of ligand in one complex, at most"
          legendShown
          options={[
            { id: '1', label: '1' },
            { id: '2', label: '2' },
            { id: '3', label: '3' },
          ]}
          value={String(draft.maxKinds)}
          onChange={(kinds) => set({ maxKinds: Number(kinds) })}
        />
        <fieldset className="wish-geometries">
          <legend>Geometry</legend>
          {geometryChoices.map(([id, label]) => (
            <label key={id}>
              <input
                type="checkbox"
                checked={draft.geometries.includes(id)}
                onChange={(event) =>
                  set({
                    geometries: event.currentTarget.checked
                      ? [...draft.geometries, id]
                      : draft.geometries.filter((each) => each !== id),
                  })
                }
              />
              {label}
            </label>
          ))}
        </fieldset>
        <fieldset className="wish-pair">
          <legend>Charge of the complex</legend>
          <WholeNumberField
            label="from"
            value={draft.charge.min}
            onChange={(min) => set({ charge: { ...draft.charge, min } })}
          />
          <WholeNumberField
            label="to"
            value={draft.charge.max}
            onChange={(max) => set({ charge: { ...draft.charge, max } })}
          />
        </fieldset>
      </section>
    </div>
  );
}

interface WindowFieldsProps {
  readonly legend: string;
  readonly value: DraftWindow;
  /** What the molar absorptivity beside the window means. */
  readonly strength: string;
  readonly onChange: (value: DraftWindow) => void;
}

function WindowFields({ legend, value, strength, onChange }: WindowFieldsProps) {
  return (
    <fieldset className="wish-pair">
      <legend>{legend}</legend>
      <NumberField
        label="from"
        unit="nm"
        value={value.from}
        empty="any"
        most={10_000}
        onChange={(from) => onChange({ ...value, from })}
      />
      <NumberField
        label="to"
        unit="nm"
        value={value.to}
        empty="any"
        most={10_000}
        onChange={(to) => onChange({ ...value, to })}
      />
      <NumberField
        label="ε"
        unit="L mol⁻¹ cm⁻¹"
        value={value.absorptivity}
        empty={strength}
        onChange={(absorptivity) => onChange({ ...value, absorptivity })}
      />
    </fieldset>
  );
}
