import { requireElectronCount, requireFinite, requireNotNegative } from '../checkProblem';
import { type CubicGeometry, type CubicIrrep } from '../types';
import { blockEnergies } from './blockEnergies';
import { cubicBlocks, type CubicBlock } from './cubicBlocks';

export interface GroundLevelName {
  readonly multiplicity: number;
  readonly irrep: CubicIrrep;
}

export interface GroundCrossover {
  /** 10Dq/B at which the ground level changes. */
  readonly tenDqOverB: number;
  /** Ground level on the weak-field and on the strong-field side. */
  readonly weak: GroundLevelName;
  readonly strong: GroundLevelName;
}

const coarseStep = 0.5;
/** Just above zero field, where the levels of one free-ion term are already told apart. */
const weakestField = 1e-4;

/**
 * Where the ground level of d^N changes along 10Dq/B in a cubic field, ascending, each to 1e-9. `cOverB` is C/B.
 * Searched up to 10Dq/B = `upTo`.
 */
export function groundCrossovers(
  dElectrons: number,
  cOverB: number,
  geometry: CubicGeometry = 'octahedral',
  upTo = 80,
): GroundCrossover[] {
  requireElectronCount(dElectrons);
  requireNotNegative(cOverB, 'cOverB');
  requireFinite(upTo, 'upTo');
  const sign = geometry === 'tetrahedral' ? -1 : 1;
  const blocks = cubicBlocks(dElectrons);
  const lowest = (block: CubicBlock, x: number): number =>
    blockEnergies(block, dElectrons, sign * x, 1, cOverB)[0]!;
  const groundAt = (x: number): CubicBlock => {
    let best = blocks[0]!;
    let energy = Infinity;
    for (const block of blocks) {
      const candidate = lowest(block, x);
      if (candidate < energy) {
        best = block;
        energy = candidate;
      }
    }
    return best;
  };
  const found: GroundCrossover[] = [];
  const search = (from: number, fromBlock: CubicBlock, to: number, toBlock: CubicBlock): void => {
    if (fromBlock === toBlock) return;
    const x = crossing((at) => lowest(fromBlock, at) - lowest(toBlock, at), from, to);
    const between = groundAt(x);
    const higher = Math.min(lowest(fromBlock, x), lowest(toBlock, x)) - lowest(between, x);
    if (between === fromBlock || between === toBlock || higher < 1e-9) {
      found.push({ tenDqOverB: x, weak: nameOf(fromBlock), strong: nameOf(toBlock) });
      return;
    }
    search(from, fromBlock, x, between);
    search(x, between, to, toBlock);
  };
  let from = weakestField;
  let fromBlock = groundAt(from);
  while (from < upTo) {
    const to = Math.min(from + coarseStep, upTo);
    const toBlock = groundAt(to);
    search(from, fromBlock, to, toBlock);
    from = to;
    fromBlock = toBlock;
  }
  return found;
}

const nameOf = (block: CubicBlock): GroundLevelName => ({
  multiplicity: 2 * block.S + 1,
  irrep: block.irrep,
});

/** Bisection; `difference` is negative at `from` and positive at `to`. */
function crossing(difference: (x: number) => number, from: number, to: number): number {
  let low = from;
  let high = to;
  while (high - low > 1e-10 * Math.max(1, high)) {
    const middle = 0.5 * (low + high);
    if (difference(middle) < 0) low = middle;
    else high = middle;
  }
  return 0.5 * (low + high);
}
