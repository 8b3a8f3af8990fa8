import { useEffect, useId, useMemo, useRef, useState, type KeyboardEvent, type ReactNode } from 'react';
import { matchOptions, type SelectOption } from './matchOptions';
import './SearchableSelect.css';

/** More than this is not read by anyone; the rest is found by typing. */
const shownAtMost = 100;

interface SearchableSelectProps {
  readonly label: string;
  readonly options: readonly SelectOption[];
  /** Id of the chosen option; null while nothing is chosen. */
  readonly value: string | null;
  readonly onChange: (id: string) => void;
  readonly placeholder?: string;
  readonly disabled?: boolean;
  /** Shown under the field and tied to it. */
  readonly error?: string | undefined;
  readonly hideLabel?: boolean;
  /** How an option is drawn; its text stays what is searched. */
  readonly renderOption?: (option: SelectOption) => ReactNode;
  /** Empties the field after a choice, for adding one after another. */
  readonly clearAfterChoice?: boolean;
}

/** A combobox with a filtered list: type to narrow, arrows to move, Enter to take, Escape to leave. */
export function SearchableSelect(props: SearchableSelectProps) {
  const { label, options, value, onChange, renderOption, error } = props;
  const id = useId();
  const [query, setQuery] = useState<string | null>(null);
  const [open, setOpen] = useState(false);
  const [active, setActive] = useState(0);
  const list = useRef<HTMLUListElement>(null);
  const chosen = options.find((option) => option.id === value);
  const matches = useMemo(() => matchOptions(options, query ?? ''), [options, query]);
  const shown = matches.slice(0, shownAtMost);
  const current = Math.min(active, shown.length - 1);
  const optionId = (index: number): string => `${id}-option-${index}`;

  useEffect(() => {
    if (open) list.current?.children[current]?.scrollIntoView?.({ block: 'nearest' });
  }, [open, current]);

  const show = (): void => {
    setOpen(true);
    setActive(
      query === null
        ? Math.max(
            0,
            matches.findIndex((option) => option.id === value),
          )
        : 0,
    );
  };
  const close = (): void => {
    setOpen(false);
    setQuery(null);
  };
  const take = (option: SelectOption | undefined): void => {
    if (!option || option.disabled) return;
    onChange(option.id);
    close();
  };
  const move = (to: number): void => {
    if (!open) show();
    else setActive(Math.max(0, Math.min(shown.length - 1, to)));
  };
  const onKeyDown = (event: KeyboardEvent): void => {
    const acts: Partial<Record<string, () => void>> = {
      ArrowDown: () => move(current + 1),
      ArrowUp: () => move(current - 1),
      PageDown: () => move(current + 8),
      PageUp: () => move(current - 8),
      ...(open && { Enter: () => take(shown[current]), Escape: close }),
    };
    const act = acts[event.key];
    if (!act) return;
    event.preventDefault();
    // An open list takes Escape for itself; the dialog around it stays.
    event.stopPropagation();
    act();
  };

  return (
    <div
      className="searchable-select"
      onBlur={(event) => !event.currentTarget.contains(event.relatedTarget) && close()}
    >
      <label htmlFor={id} className={props.hideLabel ? 'visually-hidden' : undefined}>
        {label}
      </label>
      <input
        id={id}
        role="combobox"
        autoComplete="off"
        spellCheck={false}
        aria-autocomplete="list"
        aria-expanded={open}
        aria-controls={`${id}-list`}
        aria-activedescendant={open && shown.length > 0 ? optionId(current) : undefined}
        aria-invalid={error !== undefined || undefined}
        aria-describedby={error === undefined ? undefined : `${id}-error`}
        disabled={props.disabled}
        placeholder={props.placeholder}
        value={query ?? (props.clearAfterChoice ? '' : (chosen?.label ?? ''))}
        onFocus={(event) => event.currentTarget.select()}
        onClick={show}
        onChange={(event) => {
          setQuery(event.currentTarget.value);
          setOpen(true);
          setActive(0);
        }}
        onKeyDown={onKeyDown}
      />
      <ul id={`${id}-list`} ref={list} role="listbox" aria-label={label} hidden={!open}>
        {open &&
          shown.map((option, index) => (
            <li
              key={option.id}
              id={optionId(index)}
              role="option"
              aria-selected={option.id === value}
              aria-disabled={option.disabled || undefined}
              data-active={index === current || undefined}
              onPointerDown={(event) => event.preventDefault()}
              onClick={() => take(option)}
            >
              {renderOption ? (
                renderOption(option)
              ) : (
                <>
                  <span>{option.label}</span>
                  {option.detail !== undefined && <span className="option-detail">{option.detail}</span>}
                </>
              )}
            </li>
          ))}
      </ul>
      <p className={open && matches.length === 0 ? 'option-none' : 'visually-hidden'} role="status">
        {open &&
          (matches.length === 0
            ? `Nothing matches “${query}”.`
            : matches.length > shownAtMost
              ? `${shownAtMost} of ${matches.length} shown; type to narrow.`
              : `${matches.length} choices`)}
      </p>
      {error !== undefined && (
        <p id={`${id}-error`} className="field-error">
          {error}
        </p>
      )}
    </div>
  );
}
