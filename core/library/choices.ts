import type { IonRecord } from './ions';
import type { SourcedValue } from './sourced';

/**
 * Where the sources disagree too far for their mean to mean anything, one value is chosen here, with the reason. What
 * was passed over stays visible among the alternatives.
 */
interface Choice {
  readonly ion: string;
  readonly quantity: 'g' | 'B0' | 'C0';
  readonly value: number;
  readonly reason: string;
}

const choices: readonly Choice[] = [
  {
    ion: 'Fe2+',
    quantity: 'g',
    value: 9400,
    reason:
      'centre of the Jahn-Teller pair of [Fe(H2O)6]2+ near 8300 and 10400 cm-1 (from memory of T. M. Dunn in Lewis ' +
      'and Wilkins, Modern Coordination Chemistry, 1960); the tabulated 8500 stands out of order at the foot of its ' +
      'table and the recalled lists give about 10000',
  },
];

const chosen = (before: SourcedValue, value: number, reason: string): SourcedValue => ({
  ...before,
  value,
  source: reason,
  status: 'own',
  note: before.note,
  alternatives:
    before.value === null
      ? before.alternatives
      : [
          { value: before.value, source: before.source ?? 'no source', status: before.status },
          ...before.alternatives,
        ],
});

export const withChoices = (ion: IonRecord): IonRecord =>
  choices
    .filter((choice) => choice.ion === ion.ion)
    .reduce(
      (record, { quantity, value, reason }) => ({
        ...record,
        [quantity]: chosen(record[quantity], value, reason),
      }),
      ion,
    );
