import { fieldComponents, speciesOf, type FieldGroup, type Species } from '../adaptation/species';
import { componentElement, type Complex } from '../adaptation/unitElements';
import { timeReversed, type AdaptedVector } from '../adaptation/vector';
import { type FieldComponent } from '../field/tensorComponents';
import { freeIon } from '../freeIon/reducedElements';
import { coupledMultiplets, spinFreeMultiplets, type Multiplet, type MultipletElements } from './multiplets';
import { remember } from '../remember';

/** A parameter of the Hamiltonian, by the name of its operator. */
export type OperatorName = 'B' | 'C' | 'alpha' | 'zeta' | 'Lz' | 'Sz' | `${'re' | 'im'}${2 | 4}${number}`;
export const operatorName = ({ k, q, part }: FieldComponent): OperatorName => `${part}${k}${q}`;

/**
 * An operator in one block: entries of the lower triangle, `places[e]` = row · size + column, with one value per component
 * of the block's algebra (1 real, 2 complex, 4 quaternion), `values[e · width + component]`.
 */
export interface BlockOperator {
  readonly places: Int32Array;
  readonly values: Float64Array;
}

export interface BasisState {
  readonly multiplet: Multiplet;
  readonly vector: AdaptedVector;
}

/** The part of the Hamiltonian that belongs to one row of one species (and one spin where the spin is left aside). */
export interface SymmetryBlock {
  readonly species: Species;
  /** Spin of the states, null with spin-orbit coupling. */
  readonly S: number | null;
  readonly size: number;
  /** Number of states of equal energy per eigenvalue, spin included. */
  readonly degeneracy: number;
  readonly basis: readonly BasisState[];
  readonly operators: ReadonlyMap<OperatorName, BlockOperator>;
}

/** Numbers per matrix element. */
export const algebraWidth = { real: 1, complex: 2, quaternion: 4 } as const;

/** The blocks of d^N for a field of the given symmetry in its own frame; worked out on first use and kept. */
export const symmetryBlocks = remember(workOut);

function workOut(electrons: number, group: FieldGroup, spinOrbit: boolean): readonly SymmetryBlock[] {
  const ion = freeIon(electrons);
  if (spinOrbit) return blocksOf(coupledMultiplets(ion), group, null);
  const spins = [...new Set(ion.terms.map((term) => term.S))];
  return spins.flatMap((S) => blocksOf(spinFreeMultiplets(ion, S), group, S));
}

function blocksOf(elements: MultipletElements, group: FieldGroup, S: number | null): SymmetryBlock[] {
  const largestJ = Math.max(...elements.multiplets.map(({ J }) => J));
  return speciesOf(group, largestJ).flatMap((species) => {
    const block = blockOf(elements, species, fieldComponents[group], S);
    return block.size === 0 ? [] : [block];
  });
}

/** The block of one row: every operator between the states of that row. */
export function blockOf(
  elements: MultipletElements,
  species: Species,
  components: readonly FieldComponent[],
  S: number | null,
): SymmetryBlock {
  const basis = elements.multiplets.flatMap((multiplet) =>
    species.states(multiplet.J).map((vector): BasisState => ({ multiplet, vector })),
  );
  const parts = ['B', 'C', 'alpha', ...(S === null ? (['zeta'] as const) : [])] as const;
  const scalars = parts.map((part) => [part, scalarOperator(elements, species, basis, part)] as const);
  const fields = components.map(
    (component) => [operatorName(component), fieldOperator(elements, species, basis, component)] as const,
  );
  return {
    species,
    S,
    size: basis.length,
    degeneracy: species.degeneracy * (S === null ? 1 : 2 * S + 1),
    basis,
    operators: new Map<OperatorName, BlockOperator>([...scalars, ...fields]),
  };
}

const negligible = 1e-13;

/** An operator from its elements ⟨a|O|b⟩ (as many numbers as the algebra has), null for zero. */
export function collect(
  basis: readonly BasisState[],
  width: 1 | 2 | 4,
  element: (a: BasisState, b: BasisState) => readonly number[] | null,
): BlockOperator {
  const places: number[] = [];
  const values: number[] = [];
  basis.forEach((a, i) => {
    for (let j = 0; j <= i; j++) {
      const entry = element(a, basis[j]!);
      if (entry === null || entry.every((value) => Math.abs(value) < negligible)) continue;
      places.push(i * basis.length + j);
      for (let component = 0; component < width; component++) values.push(entry[component]!);
    }
  });
  return { places: Int32Array.from(places), values: Float64Array.from(values) };
}

function scalarOperator(
  elements: MultipletElements,
  { algebra }: Species,
  basis: readonly BasisState[],
  part: 'B' | 'C' | 'alpha' | 'zeta',
): BlockOperator {
  return collect(basis, algebraWidth[algebra], (a, b) => {
    if (a.multiplet.J !== b.multiplet.J || overlap(a.vector, b.vector) < 0.5) return null;
    return [elements.scalar(part, a.multiplet, b.multiplet), 0, 0, 0];
  });
}

/** Real part of ⟨u|v⟩: one or zero, since the states of one J are chosen once for all multiplets. */
function overlap(u: AdaptedVector, v: AdaptedVector): number {
  let sum = 0;
  u.M.forEach((M, i) => {
    const j = v.M.indexOf(M);
    if (j >= 0) sum += u.re[i]! * v.re[j]! + u.im[i]! * v.im[j]!;
  });
  return sum;
}

function fieldOperator(
  elements: MultipletElements,
  { algebra }: Species,
  basis: readonly BasisState[],
  component: FieldComponent,
): BlockOperator {
  const between = (a: BasisState, ket: Multiplet, vector: AdaptedVector): Complex =>
    componentElement(a.multiplet.J, a.vector, component, ket.J, vector);
  return collect(basis, algebraWidth[algebra], (a, b) => {
    const ket = b.multiplet;
    if (Math.abs(a.multiplet.J - ket.J) > component.k || a.multiplet.J + ket.J < component.k) return null;
    const reduced = elements.field(component.k, a.multiplet, ket);
    if (reduced === 0) return null;
    const direct = between(a, ket, b.vector);
    if (algebra !== 'quaternion') return [reduced * direct.re, reduced * direct.im];
    const crossed = between(a, ket, timeReversed(ket.J, b.vector));
    return [reduced * direct.re, reduced * direct.im, reduced * crossed.re, reduced * crossed.im];
  });
}
