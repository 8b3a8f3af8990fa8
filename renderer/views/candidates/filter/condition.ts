/** One thing that a candidate must be or have. Energies in cm⁻¹. */
export type Condition =
  | { readonly kind: 'ion'; readonly metal: string; readonly oxidationState: number | null }
  | { readonly kind: 'band'; readonly from: number; readonly to: number }
  | { readonly kind: 'quantity'; readonly name: QuantityName; readonly from: number; readonly to: number }
  | { readonly kind: 'spin'; readonly state: 'high' | 'low' | 'near' }
  | { readonly kind: 'tag'; readonly tag: string }
  | { readonly kind: 'mark'; readonly mark: 'starred' | 'archived' | 'flagged' | 'refused' }
  | { readonly kind: 'geometry'; readonly id: string }
  | { readonly kind: 'electrons'; readonly count: number }
  | { readonly kind: 'ligand'; readonly id: string; readonly name: string }
  | { readonly kind: 'words'; readonly words: string };

export type QuantityName = '10Dq' | 'B' | 'distance' | 'unpaired';

/** Alternatives of which one must hold, or, negated, none. */
export interface FilterTerm {
  readonly negated: boolean;
  readonly anyOf: readonly Condition[];
}

const oxidationText = (state: number | null): string =>
  state === null ? '' : ` ${state < 0 ? `${-state}−` : `${state}+`}`;

const spanText = (from: number, to: number, unit: string): string => {
  const end = (value: number): string => String(Math.round(value));
  if (from === -Infinity) return `below ${end(to)}${unit}`;
  if (to === Infinity) return `above ${end(from)}${unit}`;
  return `${end(from)} to ${end(to)}${unit}`;
};

function conditionWords(condition: Condition): string {
  switch (condition.kind) {
    case 'ion':
      return `metal ${condition.metal}${oxidationText(condition.oxidationState)}`;
    case 'band':
      return `a spin-allowed band at ${spanText(1e7 / condition.to, 1e7 / condition.from, ' nm')}`;
    case 'quantity':
      return `${quantityNames[condition.name]} ${spanText(condition.from, condition.to, quantityUnits[condition.name])}`;
    case 'spin':
      return condition.state === 'near' ? 'near spin crossover' : `${condition.state} spin`;
    case 'tag':
      return `tag “${condition.tag}”`;
    case 'mark':
      return condition.mark;
    case 'geometry':
      return condition.id.replaceAll('-', ' ');
    case 'electrons':
      return `d${condition.count}`;
    case 'ligand':
      return `with ligand ${condition.name}`;
    case 'words':
      return `“${condition.words}” in formula, name, colour, tags or notes`;
  }
}

const quantityNames: Record<QuantityName, string> = {
  '10Dq': '10Dq',
  B: 'B',
  distance: 'colour distance',
  unpaired: 'unpaired electrons',
};
const quantityUnits: Record<QuantityName, string> = {
  '10Dq': ' cm⁻¹',
  B: ' cm⁻¹',
  distance: '',
  unpaired: '',
};

/** How a term was understood, so that a misunderstanding is seen. */
export const termWords = ({ negated, anyOf }: FilterTerm): string =>
  `${negated ? 'not ' : ''}${anyOf.map(conditionWords).join(' or ')}`;
