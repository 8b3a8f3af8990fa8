import { fieldComponents, magneticSpecies } from '../adaptation/species';
import { unitElement } from '../adaptation/unitElements';
import { freeIon } from '../freeIon/reducedElements';
import { coupledMultiplets, momentElement } from './multiplets';
import {
  algebraWidth,
  blockOf,
  collect,
  type BasisState,
  type BlockOperator,
  type SymmetryBlock,
} from './symmetryBlocks';
import { remember } from '../remember';

/**
 * All states |(LS)J M⟩ of d^N in a magnetic field along z, in rows M ≡ r (mod `order`), order 0 meaning full symmetry about z;
 * `real` where a turn by π about y with time reversal leaves everything as it is. With the operators L_z and S_z. Worked
 * out on first use and kept.
 */
export const magneticBlocks = remember(workOut);

function workOut(electrons: number, order: number, algebra: 'real' | 'complex'): readonly SymmetryBlock[] {
  const elements = coupledMultiplets(freeIon(electrons));
  const largestJ = Math.max(...elements.multiplets.map(({ J }) => J));
  const components = fieldComponents.C1.filter(({ q, part }) => {
    const within = order === 0 ? q === 0 : q % order === 0;
    return within && (algebra === 'complex' || part === 're');
  });
  return magneticSpecies(order, algebra, largestJ).map((species) => {
    const bare = blockOf(elements, species, components, null);
    const moments = (['L', 'S'] as const).map(
      (which) => [`${which}z` as const, momentOperator(bare.basis, which, algebraWidth[algebra])] as const,
    );
    return { ...bare, operators: new Map([...bare.operators, ...moments]) };
  });
}

function momentOperator(basis: readonly BasisState[], which: 'L' | 'S', width: 1 | 2 | 4): BlockOperator {
  return collect(basis, width, (a, b) => {
    const [bra, ket] = [a.multiplet, b.multiplet];
    if (bra.term !== ket.term || Math.abs(bra.J - ket.J) > 1) return null;
    const { re, im } = unitElement(bra.J, a.vector, 1, 0, ket.J, b.vector);
    const reduced = momentElement(which, bra, ket);
    return [reduced * re, reduced * im];
  });
}
