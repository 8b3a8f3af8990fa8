import { sharedSpace, strings, stringTransforms } from './determinantBasis';
import { termStates, type SparseVector } from './coupledStates';
import { type Amplitudes } from './amplitudes';

/** Writes states over determinants of real orbitals into row-major arrays. */
export interface DeterminantWriter {
  /** `mS` is the spin component where the amplitudes leave the spin aside (J = L), null where J holds it. */
  write(state: Amplitudes, mS: number | null, re: Float64Array, im: Float64Array, at: number): void;
}

export function determinantWriter(electrons: number): DeterminantWriter {
  const { states, indexOf } = sharedSpace(electrons);
  const known = termStates(electrons);
  const size = states.length;
  const spinBlocks = blocksBySpin(electrons, indexOf);
  const re = new Float64Array(size);
  const im = new Float64Array(size);
  const add = ({ places, values }: SparseVector, cr: number, ci: number): void => {
    for (let e = 0; e < places.length; e++) {
      re[places[e]!]! += cr * values[e]!;
      im[places[e]!]! += ci * values[e]!;
    }
  };
  return {
    write({ multiplets, re: ar, im: ai }, mS, outRe, outIm, at) {
      re.fill(0);
      im.fill(0);
      multiplets.forEach(({ term, J }, which) => {
        for (let M = -J; M <= J; M++) {
          const [cr, ci] = [ar[which]![M + J]!, ai[which]![M + J]!];
          if (cr === 0 && ci === 0) continue;
          add(mS === null ? known.coupled(term, J, M) : known.state(term, M, mS), cr, ci);
        }
      });
      for (const block of spinBlocks) transformBlock(block, re, im, outRe, outIm, at);
    },
  };
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
  if (places.every((place) => re[place] === 0 && im[place] === 0)) return;
  const half = { re: new Float64Array(ups * downs), im: new Float64Array(ups * downs) };
  const [U, D] = [stringTransforms[up]!, stringTransforms[down]!];
  for (let i = 0; i < ups; i++) {
    for (let j = 0; j < ups; j++) {
      const [ur, ui] = [U.re[i * ups + j]!, U.im[i * ups + j]!];
      if (ur === 0 && ui === 0) continue;
      for (let d = 0; d < downs; d++) {
        const place = places[j * downs + d]!;
        half.re[i * downs + d]! += ur * re[place]! - ui * im[place]!;
        half.im[i * downs + d]! += ur * im[place]! + ui * re[place]!;
      }
    }
  }
  for (let i = 0; i < downs; i++) {
    for (let j = 0; j < downs; j++) {
      const [dr, di] = [D.re[i * downs + j]!, D.im[i * downs + j]!];
      if (dr === 0 && di === 0) continue;
      for (let u = 0; u < ups; u++) {
        const place = at + places[u * downs + i]!;
        const [hr, hi] = [half.re[u * downs + j]!, half.im[u * downs + j]!];
        outRe[place]! += dr * hr - di * hi;
        outIm[place]! += dr * hi + di * hr;
      }
    }
  }
}
