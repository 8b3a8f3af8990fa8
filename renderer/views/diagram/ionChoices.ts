import { defaultLibrary, findMetal } from '../../../core/library';
import { type SelectOption } from '../../parts';

/** Oxidation states after the element's name, as the IUPAC Red Book has them. */
const romanNumerals = ['0', 'I', 'II', 'III', 'IV', 'V', 'VI', 'VII'];

/** Free-ion parameters to start from, of the ions that have them on file. */
export interface IonChoice {
  readonly dElectrons: number;
  readonly B: number;
  /** Null where C of the free ion is not on file. */
  readonly cOverB: number | null;
}

export const ionChoices: ReadonlyMap<string, IonChoice> = new Map(
  [...defaultLibrary.ions.values()].flatMap(({ ion, dElectrons, B0, C0 }) =>
    B0.value === null || dElectrons < 1 || dElectrons > 9
      ? []
      : [[ion, { dElectrons, B: B0.value, cOverB: C0.value === null ? null : C0.value / B0.value }] as const],
  ),
);

export const ionOptions: readonly SelectOption[] = [...defaultLibrary.ions.values()]
  .filter(({ ion }) => ionChoices.has(ion))
  .map(({ ion, symbol, oxidationState, dElectrons }) => ({
    id: ion,
    label: `${findMetal(symbol)?.name ?? symbol}(${romanNumerals[oxidationState] ?? oxidationState})`,
    detail: `d${dElectrons}`,
    keywords: ion,
  }));
