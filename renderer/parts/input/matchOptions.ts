/** One entry of a searchable list. */
export interface SelectOption {
  readonly id: string;
  readonly label: string;
  /** A second line or column, `pyridine, N donor`. */
  readonly detail?: string;
  /** Other words it should be found by. */
  readonly keywords?: string;
  readonly disabled?: boolean;
}

const folded = (text: string): string => text.normalize('NFKD').replace(/\p{M}/gu, '').toLowerCase();

/**
 * Options that contain every word of `query`, in this order: label is the query, label starts with it, a word of the
 * label starts with it, anything else.
 */
export function matchOptions(options: readonly SelectOption[], query: string): readonly SelectOption[] {
  const wanted = folded(query).trim();
  if (wanted === '') return options;
  const words = wanted.split(/\s+/);
  const graded: { option: SelectOption; grade: number }[] = [];
  for (const option of options) {
    const label = folded(option.label);
    const all = `${label} ${folded(option.detail ?? '')} ${folded(option.keywords ?? '')} ${folded(option.id)}`;
    if (!words.every((word) => all.includes(word))) continue;
    const grade =
      label === wanted || folded(option.id) === wanted
        ? 0
        : label.startsWith(wanted)
          ? 1
          : label.split(/[\s,()-]+/).some((word) => word.startsWith(words[0]!))
            ? 2
            : 3;
    graded.push({ option, grade });
  }
  return graded.sort((one, other) => one.grade - other.grade).map(({ option }) => option);
}
