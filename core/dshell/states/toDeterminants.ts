import { sharedSpace, strings, stringTransforms } from './determinantBasis';
import { termStates, type SparseVector } from './coupledStates';
import { type Amplitudes } from './amplitudes';
import { remember } from '../remember';

/** Writes states over determinants of real orbitals into row-major arrays. */
export interface DeterminantWriter {
  /** `mS` is the spin component where the amplitudes leave the spin aside (J = L), null where J holds it. */
  write(state: Amplitudes, mS: number | null, re: Float64Array, im: Float64Array, at: number): void;
}

/** The writer of N electrons; made on first use and kept. */
export const determinantWriter = remember(makeWriter);

function makeWriter(electrons: number): DeterminantWriter {
  const { states, indexOf } = sharedSpace(electrons);
  const known = termStates(electrons);
  const spinBlocks = blocksBySpin(electrons, indexOf);
  const re = new Float64Array(states.length);
  const im = new Float64Array(states.length);
  return {
    write({ multiplets, re: ar, im: ai }, mS, outRe, outIm, at) {
      re.fill(0);
      im.fill(0);
      multiplets.forEach(({ term, J }, which) => {
        const [partRe, partIm] = [ar[which]!, ai[which]!];
        for (let M = -J; M <= J; M++) {
          const [cr, ci] = [partRe[M + J]!, partIm[M + J]!];
          if (cr === 0 && ci === 0) continue;
          addState(mS === null ? known.coupled(term, J, M) : known.state(term, M, mS), cr, ci, re, im);
        }
      });
      for (const block of spinBlocks) transformBlock(block, re, im, outRe, outIm, at);
    },
  };
}

function addState(
  { places, values }: SparseVector,
  cr: number,
  ci: number,
  re: Float64Array,
  im: Float64Array,
): void {
  for (let e = 0; e < places.length; e++) {
    re[places[e]!]! += cr * values[e]!;
    im[places[e]!]! += ci * values[e]!;
  }
}

/** Determinants with the same number of spin-up electrons: a rectangle of up strings by down strings. */
interface SpinBlock {
  readonly up: number;
  readonly down: number;
  /** Index of (up string, down string), row-major. */
  readonly places: Int32Array;
}

function blocksBySpin(electrons: number, indexOf: ReadonlyMap<number, number>): SpinBlock[] {
  const blocks: SpinBlock[] = [];
  for (let up = Math.max(0, electrons - 5); up <= Math.min(5, electrons); up++) {
    const down = electrons - up;
    const places = strings[up]!.flatMap((u) => strings[down]!.map((d) => indexOf.get(u | (d << 5))!));
    blocks.push({ up, down, places: Int32Array.from(places) });
  }
  return blocks;
}

// One rectangle after the up strings are transformed; none is larger than 10 × 10.
const halfRe = new Float64Array(100);
const halfIm = new Float64Array(100);

/** out = (U_up ⊗ U_down) in over one block. */
function transformBlock(
  { up, down, places }: SpinBlock,
  re: Float64Array,
  im: Float64Array,
  outRe: Float64Array,
  outIm: Float64Array,
  at: number,
): void {
  const [ups, downs] = [strings[up]!.length, strings[down]!.length];
  if (isEmpty(places, re, im)) return;
  halfRe.fill(0);
  halfIm.fill(0);
  const U = stringTransforms[up]!;
  for (let e = 0; e < U.rows.length; e++) {
    const ur = U.re[e]!;
    const ui = U.im[e]!;
    const to = U.rows[e]! * downs;
    const from = U.columns[e]! * downs;
    for (let d = 0; d < downs; d++) {
      const place = places[from + d]!;
      halfRe[to + d]! += ur * re[place]! - ui * im[place]!;
      halfIm[to + d]! += ur * im[place]! + ui * re[place]!;
    }
  }
  const D = stringTransforms[down]!;
  for (let e = 0; e < D.rows.length; e++) {
    const dr = D.re[e]!;
    const di = D.im[e]!;
    const to = D.rows[e]!;
    const from = D.columns[e]!;
    for (let u = 0, row = 0; u < ups; u++, row += downs) {
      const place = at + places[row + to]!;
      outRe[place]! += dr * halfRe[row + from]! - di * halfIm[row + from]!;
      outIm[place]! += dr * halfIm[row + from]! + di * halfRe[row + from]!;
    }
  }
}

function isEmpty(places: Int32Array, re: Float64Array, im: Float64Array): boolean {
  for (let i = 0; i < places.length; i++) if (re[places[i]!] !== 0 || im[places[i]!] !== 0) return false;
  return true;
}
