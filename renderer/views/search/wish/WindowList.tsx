import { emptyWindow, type DraftWindow } from './wishDraft';
import { WindowFields, type WindowUnit } from './WindowFields';

interface WindowListProps {
  readonly legend: string;
  readonly more: string;
  readonly unit: WindowUnit;
  readonly strength: string;
  readonly windows: readonly DraftWindow[];
  readonly onChange: (windows: readonly DraftWindow[]) => void;
}

/** As many as the format of a wish takes. */
const most = 10;

/** Windows that all have to be met. */
export function WindowList({ legend, more, unit, strength, windows, onChange }: WindowListProps) {
  return (
    <>
      {windows.map((window, place) => (
        <WindowFields
          key={place}
          legend={place === 0 ? legend : `and between (${place + 1})`}
          unit={unit}
          value={window}
          strength={strength}
          onChange={(changed) => onChange(windows.map((each, i) => (i === place ? changed : each)))}
          onRemove={windows.length > 1 ? () => onChange(windows.filter((_, i) => i !== place)) : undefined}
        />
      ))}
      {windows.length < most && (
        <button
          type="button"
          className="button-quiet wish-more"
          onClick={() => onChange([...windows, emptyWindow])}
        >
          {more}
        </button>
      )}
    </>
  );
}
