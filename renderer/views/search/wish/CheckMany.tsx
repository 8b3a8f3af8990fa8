interface CheckManyProps<Id extends string | number> {
  readonly legend: string;
  readonly hint?: string;
  readonly options: readonly { readonly id: Id; readonly label: string }[];
  readonly chosen: readonly Id[];
  readonly onChange: (chosen: readonly Id[]) => void;
}

/** Several of a few, all in sight. */
export function CheckMany<Id extends string | number>(props: CheckManyProps<Id>) {
  const { legend, hint, options, chosen, onChange } = props;
  return (
    <fieldset className="wish-checks">
      <legend>
        {legend} {hint !== undefined && <span className="soft small">{hint}</span>}
      </legend>
      {options.map(({ id, label }) => (
        <label key={id}>
          <input
            type="checkbox"
            checked={chosen.includes(id)}
            onChange={(event) =>
              onChange(event.currentTarget.checked ? [...chosen, id] : chosen.filter((each) => each !== id))
            }
          />
          {label}
        </label>
      ))}
    </fieldset>
  );
}
