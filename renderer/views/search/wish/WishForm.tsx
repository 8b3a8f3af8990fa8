import { useMemo, useState, type ReactNode } from 'react';
import type { ParameterLibrary } from '../../../../core/library/parameterLibrary';
import { SegmentedChoice } from '../../../parts';
import { CheckMany } from './CheckMany';
import { ColourFields } from './ColourFields';
import { PickMany } from './PickMany';
import { RangeFields } from './RangeFields';
import { WholeRangeFields } from './WholeRangeFields';
import { WindowFields, type WindowUnit } from './WindowFields';
import { WindowList } from './WindowList';
import { wishChoices } from './wishChoices';
import { allGeometries, freshDraft, type WishDraft } from './wishDraft';

interface WishFormProps {
  readonly draft: WishDraft;
  readonly onChange: (draft: WishDraft) => void;
  readonly library: ParameterLibrary;
  readonly target: readonly [number, number, number] | null;
  readonly usual: { readonly concentration_mM: number; readonly path_cm: number };
  readonly shelf: readonly string[];
  readonly onShelf: (shelf: readonly string[]) => void;
}

const geometryOptions = allGeometries.map((id) => ({ id, label: id.replaceAll('-', ' ') }));

/** What is wanted, and among what to look. */
export function WishForm(props: WishFormProps) {
  const { draft, onChange, library, target, usual, shelf, onShelf } = props;
  const set = (part: Partial<WishDraft>): void => onChange({ ...draft, ...part });
  const [unit, setUnit] = useState<WindowUnit>('nm');
  const choices = useMemo(() => wishChoices(library), [library]);
  const rare = [draft.unpaired, draft.moment, draft.emission].some(
    ({ min, max }) => min !== null || max !== null,
  );
  return (
    <div className="wish-form stack">
      <section className="panel stack" aria-labelledby="wish-wanted">
        <div className="wish-head">
          <h2 id="wish-wanted">Wanted</h2>
          <SegmentedChoice
            legend="Unit of the windows"
            options={[
              { id: 'nm', label: 'nm' },
              { id: 'cm-1', label: 'cm⁻¹' },
            ]}
            value={unit}
            onChange={setUnit}
          />
        </div>
        <WindowList
          legend="Absorbs between"
          more="Another band"
          unit={unit}
          windows={draft.absorb}
          strength="at least this strong, if it matters"
          onChange={(absorb) => set({ absorb })}
        />
        <WindowList
          legend="Lets through between"
          more="Another clear window"
          unit={unit}
          windows={draft.pass}
          strength="at most this strong; 5 if empty"
          onChange={(pass) => set({ pass })}
        />
        <ColourFields
          value={draft.colour}
          target={target}
          usual={usual}
          onChange={(colour) => set({ colour })}
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
        <RangeFields
          legend="10Dq"
          unit="cm⁻¹"
          value={draft.tenDq}
          most={200_000}
          onChange={(tenDq) => set({ tenDq })}
        />
        <More label="Unpaired electrons, moment, emission" open={rare}>
          <WholeRangeFields
            legend="Unpaired electrons"
            what="number of electrons"
            value={draft.unpaired}
            onChange={(unpaired) => set({ unpaired })}
          />
          <RangeFields
            legend="Magnetic moment at room temperature"
            unit="μB"
            value={draft.moment}
            most={20}
            onChange={(moment) => set({ moment })}
          />
          <WindowFields
            legend="Spin-flip emission between"
            unit={unit}
            value={{ from: draft.emission.min, to: draft.emission.max, absorptivity: null }}
            onChange={({ from, to }) => set({ emission: { min: from, max: to } })}
          />
          <p className="soft small">Its place only: how bright it is cannot be said.</p>
        </More>
      </section>
      <section className="panel stack" aria-labelledby="wish-among">
        <h2 id="wish-among">Among</h2>
        <PickMany
          legend="Metal ions"
          one="metal ion"
          options={choices.ions}
          chosen={draft.ions}
          onChange={(ions) => set({ ions })}
          onAll={() => set({ ions: 'all' })}
          presets={[
            { label: 'usual eight', ids: freshDraft.ions as readonly string[] },
            { label: '3d with a known strength', ids: choices.knownIons },
            { label: 'none', ids: [] },
          ]}
        />
        <PickMany
          legend="Ligands"
          one="ligand"
          options={choices.ligands}
          chosen={draft.ligands}
          onChange={(ligands) => set({ ligands })}
          onAll={() => set({ ligands: 'all' })}
          presets={[
            { label: 'usual nine', ids: freshDraft.ligands as readonly string[] },
            { label: `${choices.knownLigands.length} with a published strength`, ids: choices.knownLigands },
            { label: 'none', ids: [] },
          ]}
        />
        <SegmentedChoice
          legend="Kinds of ligand in one complex, at most"
          legendShown
          options={['1', '2', '3', '4', '5', '6'].map((id) => ({ id, label: id }))}
          value={String(draft.maxKinds)}
          onChange={(kinds) => set({ maxKinds: Number(kinds) })}
        />
        <CheckMany
          legend="Geometry"
          options={geometryOptions.slice(0, 4)}
          chosen={draft.geometries === 'all' ? allGeometries : draft.geometries}
          onChange={(geometries) => set({ geometries })}
        />
        <WholeRangeFields
          legend="Charge of the complex"
          what="charge"
          value={draft.charge}
          onChange={(charge) => set({ charge })}
        />
        <More
          label="On my shelf"
          open={draft.onlyShelf}
          note={shelf.length > 0 ? `${shelf.length} ligands` : undefined}
        >
          <PickMany
            legend="Ligands at hand"
            one="ligand at hand"
            options={choices.ligands}
            chosen={shelf}
            onChange={onShelf}
          />
          <label className="check">
            <input
              type="checkbox"
              checked={draft.onlyShelf}
              onChange={(event) => set({ onlyShelf: event.currentTarget.checked })}
            />
            Use these only
          </label>
          <p className="soft small">Kept on this machine for all projects; others count as new.</p>
        </More>
        <More
          label="Rule out"
          open={draft.withoutElements.length + draft.withoutHazards.length + draft.withoutLigands.length > 0}
        >
          <PickMany
            legend="No ligand with the hazard"
            one="hazard statement"
            options={choices.hazards}
            chosen={draft.withoutHazards}
            onChange={(withoutHazards) => set({ withoutHazards })}
          />
          <p className="soft small">
            Statements on file only. A ligand without one is not assessed, not safe; hazards of metal salts
            stand in the cautions.
          </p>
          <PickMany
            legend="None of the elements"
            one="element"
            options={choices.elements}
            chosen={draft.withoutElements}
            onChange={(withoutElements) => set({ withoutElements })}
          />
          <PickMany
            legend="None of the ligands"
            one="ligand to leave out"
            options={choices.ligands}
            chosen={draft.withoutLigands}
            onChange={(withoutLigands) => set({ withoutLigands })}
          />
        </More>
        <More
          label="Donor atoms, denticity, rare geometries"
          open={draft.donorAtoms.length + draft.denticities.length > 0}
        >
          <CheckMany
            legend="Donor atoms"
            hint="none ticked: any"
            options={choices.donors.map((id) => ({ id, label: id }))}
            chosen={draft.donorAtoms}
            onChange={(donorAtoms) => set({ donorAtoms })}
          />
          <CheckMany
            legend="Denticity"
            hint="none ticked: any"
            options={choices.denticities.map((id) => ({ id, label: String(id) }))}
            chosen={draft.denticities}
            onChange={(denticities) => set({ denticities })}
          />
          <CheckMany
            legend="Rare geometries"
            options={geometryOptions.slice(4)}
            chosen={draft.geometries === 'all' ? allGeometries : draft.geometries}
            onChange={(geometries) => set({ geometries })}
          />
        </More>
      </section>
    </div>
  );
}

interface MoreProps {
  readonly label: string;
  /** Something in it is in force: it must be seen. */
  readonly open: boolean;
  readonly note?: string | undefined;
  readonly children: ReactNode;
}

/** Parts of a wish that few need; what is in force is never folded away at first. */
function More({ label, open, note, children }: MoreProps) {
  const [first] = useState(open);
  return (
    <details className="wish-more-parts" open={first}>
      <summary>
        {label} {open && <span className="soft small">in force</span>}
        {note !== undefined && <span className="soft small">{note}</span>}
      </summary>
      <div className="stack">{children}</div>
    </details>
  );
}
