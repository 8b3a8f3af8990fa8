import { useId, type ReactNode } from 'react';
import './SegmentedChoice.css';

interface SegmentedChoiceProps<Id extends string> {
  /** Names the group; not drawn unless `legendShown`. */
  readonly legend: string;
  readonly legendShown?: boolean;
  readonly options: readonly { readonly id: Id; readonly label: ReactNode; readonly title?: string }[];
  readonly value: Id;
  readonly onChange: (id: Id) => void;
}

/** One of a few, all in sight: radio buttons drawn as one strip. */
export function SegmentedChoice<Id extends string>(props: SegmentedChoiceProps<Id>) {
  const { legend, legendShown = false, options, value, onChange } = props;
  const name = useId();
  return (
    <fieldset className="segmented-choice">
      <legend className={legendShown ? undefined : 'visually-hidden'}>{legend}</legend>
      <div className="segmented-choice-strip">
        {options.map(({ id, label, title }) => (
          <label key={id} title={title}>
            <input type="radio" name={name} value={id} checked={id === value} onChange={() => onChange(id)} />
            <span>{label}</span>
          </label>
        ))}
      </div>
    </fieldset>
  );
}
