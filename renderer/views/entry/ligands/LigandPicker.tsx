import { useMemo } from 'react';
import type { LigandRecord } from '../../../../core/library/ligands';
import type { ParameterLibrary } from '../../../../core/library/parameterLibrary';
import { Formula, SearchableSelect } from '../../../parts';
import { type Draft, placesTaken } from '../draft';
import { ligandLabel } from './ligandLabel';
import { LigandCounts } from './LigandCounts';
import { PlaceMeter } from './PlaceMeter';
import './LigandPicker.css';

interface LigandPickerProps {
  readonly ligands: Draft['ligands'];
  readonly places: number;
  readonly library: ParameterLibrary;
  readonly onCount: (ligand: string, count: number) => void;
}

/** At hand without typing: the ligands of the first chapters. */
const atHand = ['h2o', 'nh3', 'en', 'cl', 'f', 'cn', 'py', 'bipy', 'phen', 'ox', 'acac', 'ncs_n'];

const optionOf = (ligand: LigandRecord) => ({
  id: ligand.id,
  label: ligandLabel(ligand),
  detail: `${ligand.commonName}, ${ligand.donorAtoms.join('')}${ligand.denticity > 1 ? `, ${ligand.denticity} places` : ''}`,
  keywords: `${ligand.abbreviation} ${ligand.iupacName} ${ligand.formula} ${ligand.class}`,
});

/** Which ligands, and how many of each. */
export function LigandPicker({ ligands, places, library, onCount }: LigandPickerProps) {
  const options = useMemo(() => [...library.ligands.values()].map(optionOf), [library]);
  const free = places - placesTaken(ligands, library);
  const add = (id: string): void => onCount(id, (ligands[id] ?? 0) + 1);
  return (
    <fieldset className="ligand-picker">
      <legend>Ligands</legend>
      <PlaceMeter ligands={ligands} places={places} library={library} />
      <LigandCounts ligands={ligands} free={free} library={library} onCount={onCount} />
      <div className="ligand-add">
        <SearchableSelect
          label="Add a ligand"
          placeholder="name, abbreviation or formula"
          options={options}
          value={null}
          onChange={add}
          clearAfterChoice
        />
        <div className="ligand-at-hand" role="group" aria-label="Common ligands">
          {atHand.map((id) => {
            const ligand = library.ligands.get(id);
            return (
              ligand && (
                <button
                  key={id}
                  type="button"
                  title={`Add ${ligand.commonName}`}
                  aria-label={`Add ${ligand.commonName}`}
                  onClick={() => add(id)}
                >
                  <Formula formula={ligandLabel(ligand)} />
                </button>
              )
            );
          })}
        </div>
      </div>
    </fieldset>
  );
}
