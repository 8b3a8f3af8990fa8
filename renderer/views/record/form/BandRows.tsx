import { bandFeatures } from '../../../../core/record/measurement';
import { SegmentedChoice } from '../../../parts';
import { pastedCells } from '../draft/pastedCells';
import { blankBand, type BandDraft, type Feature, type MeasurementDraft } from '../draft/measurementDraft';

interface BandRowsProps {
  readonly draft: MeasurementDraft;
  readonly onChange: (change: Partial<MeasurementDraft>) => void;
  /** Absorption has a molar absorptivity, emission has none. */
  readonly withStrength: boolean;
}

/** A typed list of bands, one line each. */
export function BandRows({ draft, onChange, withStrength }: BandRowsProps) {
  const { bands, reportedIn } = draft;
  const unit = reportedIn === 'nm' ? 'nm' : 'cm⁻¹';
  const set = (index: number, change: Partial<BandDraft>): void =>
    onChange({ bands: bands.map((each, place) => (place === index ? { ...each, ...change } : each)) });
  /** Several lines pasted into a position fill the lines from there on: position, ε, and `sh` for a shoulder. */
  const paste = (index: number, text: string): boolean => {
    const cells = pastedCells(text);
    if (cells.length === 0 || (cells.length === 1 && cells[0]!.length === 1)) return false;
    const pasted = cells.map(([position = '', ...rest]): BandDraft => {
      const shoulder = /sh/i.test([position, ...rest].join(' '));
      const number = (cell = ''): string => cell.replace(/[^\d.,eE+-]/g, '');
      return {
        position: number(position),
        uncertainty: '',
        absorptivity: number(rest.find((cell) => /\d/.test(cell))),
        feature: shoulder ? 'shoulder' : 'maximum',
      };
    });
    onChange({ bands: [...bands.slice(0, index), ...pasted, ...bands.slice(index + pasted.length)] });
    return true;
  };
  return (
    <div className="stack">
      <SegmentedChoice
        legend="Positions in"
        legendShown
        options={[
          { id: 'nm', label: 'nm' },
          { id: 'cm-1', label: 'cm⁻¹' },
        ]}
        value={reportedIn}
        onChange={(chosen) => onChange({ reportedIn: chosen })}
      />
      <table className="plain-table record-bands">
        <thead>
          <tr>
            <th scope="col">Position / {unit}</th>
            <th scope="col">± / {unit}</th>
            {withStrength && <th scope="col">ε / L mol⁻¹ cm⁻¹</th>}
            <th scope="col">Read as</th>
            <th scope="col">
              <span className="visually-hidden">Remove</span>
            </th>
          </tr>
        </thead>
        <tbody>
          {bands.map((band, index) => (
            <tr key={index}>
              <td>
                <NumberCell
                  label={`Position of band ${index + 1} in ${unit}`}
                  value={band.position}
                  onChange={(position) => set(index, { position })}
                  onPaste={(text) => paste(index, text)}
                />
              </td>
              <td>
                <NumberCell
                  label={`Uncertainty of band ${index + 1}`}
                  value={band.uncertainty}
                  onChange={(uncertainty) => set(index, { uncertainty })}
                />
              </td>
              {withStrength && (
                <td>
                  <NumberCell
                    label={`Molar absorptivity of band ${index + 1}`}
                    value={band.absorptivity}
                    onChange={(absorptivity) => set(index, { absorptivity })}
                  />
                </td>
              )}
              <td>
                <select
                  aria-label={`Kind of band ${index + 1}`}
                  value={band.feature}
                  onChange={(event) => set(index, { feature: event.currentTarget.value as Feature })}
                >
                  {bandFeatures.map((feature) => (
                    <option key={feature}>{feature}</option>
                  ))}
                </select>
              </td>
              <td>
                <button
                  type="button"
                  className="button-quiet"
                  disabled={bands.length === 1}
                  aria-label={`Remove band ${index + 1}`}
                  onClick={() => onChange({ bands: bands.filter((_, place) => place !== index) })}
                >
                  ✕
                </button>
              </td>
            </tr>
          ))}
        </tbody>
      </table>
      <div>
        <button type="button" onClick={() => onChange({ bands: [...bands, blankBand] })}>
          Another band
        </button>{' '}
        <span className="soft small">
          or paste lines of position{withStrength && ' and ε'} into a position
        </span>
      </div>
    </div>
  );
}

interface NumberCellProps {
  readonly label: string;
  readonly value: string;
  readonly onChange: (value: string) => void;
  /** Whether the pasted text was taken. */
  readonly onPaste?: (text: string) => boolean;
}

const NumberCell = ({ label, value, onChange, onPaste }: NumberCellProps) => (
  <input
    className="record-number"
    aria-label={label}
    inputMode="decimal"
    autoComplete="off"
    value={value}
    onChange={(event) => onChange(event.currentTarget.value)}
    onPaste={(event) => {
      if (onPaste?.(event.clipboardData.getData('text'))) event.preventDefault();
    }}
  />
);
