import { parity } from '../angularMomentum/factorials';
import { smallRotation } from '../angularMomentum/rotation';
import { type BasisState } from '../blocks/symmetryBlocks';
import { type Multiplet } from '../blocks/multiplets';
import { type Quaternion } from '../../symmetry';

/** A state as Σ c |multiplet M⟩: for each multiplet the 2J + 1 coefficients, M = −J … J. */
export interface Amplitudes {
  readonly multiplets: readonly Multiplet[];
  readonly re: readonly Float64Array[];
  readonly im: readonly Float64Array[];
}

/** Reads an eigenvector of a block (one, two or four numbers per basis state, as its algebra has it). */
export function amplitudesOf(
  basis: readonly BasisState[],
  vector: Float64Array,
  width: 1 | 2 | 4,
): Amplitudes {
  const place = new Map<Multiplet, number>();
  const multiplets: Multiplet[] = [];
  for (const { multiplet } of basis) {
    if (place.has(multiplet)) continue;
    place.set(multiplet, multiplets.length);
    multiplets.push(multiplet);
  }
  const re = multiplets.map(({ J }) => new Float64Array(2 * J + 1));
  const im = multiplets.map(({ J }) => new Float64Array(2 * J + 1));
  basis.forEach(({ multiplet, vector: adapted }, i) => {
    const { J } = multiplet;
    const [cr, ci] = [vector[width * i]!, width > 1 ? vector[width * i + 1]! : 0];
    const [toRe, toIm] = [re[place.get(multiplet)!]!, im[place.get(multiplet)!]!];
    adapted.M.forEach((M, j) => {
      const [ur, ui] = [adapted.re[j]!, adapted.im[j]!];
      toRe[M + J]! += cr * ur - ci * ui;
      toIm[M + J]! += cr * ui + ci * ur;
      if (width < 4) return;
      // α |j⟩ − β* Θ|j⟩ with x = α + β j.
      const [br, bi] = [-vector[width * i + 2]!, vector[width * i + 3]!];
      const sign = parity(J - M);
      toRe[J - M]! += sign * (br * ur + bi * ui);
      toIm[J - M]! += sign * (bi * ur - br * ui);
    });
  });
  return { multiplets, re, im };
}

/** The time reverse: |J M⟩ to (−1)^{J−M} |J −M⟩, coefficients to their conjugates. */
export function reversed({ multiplets, re, im }: Amplitudes): Amplitudes {
  const turn = (parts: readonly Float64Array[], sign: 1 | -1): Float64Array[] =>
    parts.map((part, which) => {
      const { J } = multiplets[which]!;
      return part.map((_, at) => {
        const M = J - at;
        return sign * parity(J - M) * part[M + J]!;
      });
    });
  return { multiplets, re: turn(re, 1), im: turn(im, -1) };
}

/** Carries states given in a frame into the laboratory; the frame is the laboratory turned by `rotation`. */
export function carriedBy(rotation: Quaternion): (state: Amplitudes) => Amplitudes {
  const [w, x, y, z] = rotation;
  if (x === 0 && y === 0 && z === 0) return (state) => state;
  const beta = 2 * Math.atan2(Math.hypot(x, y), Math.hypot(w, z));
  const sum = 2 * Math.atan2(z, w);
  const difference = 2 * Math.atan2(-x, y);
  const [alpha, gamma] = [(sum + difference) / 2, (sum - difference) / 2];
  const matrices = new Map<number, { re: Float64Array; im: Float64Array }>();
  const matrixFor = (J: number): { re: Float64Array; im: Float64Array } => {
    let matrix = matrices.get(J);
    if (matrix === undefined) {
      const n = 2 * J + 1;
      matrix = { re: new Float64Array(n * n), im: new Float64Array(n * n) };
      for (let M = -J; M <= J; M++) {
        for (let K = -J; K <= J; K++) {
          const d = smallRotation(J, M, K, beta);
          const phase = -(M * alpha + K * gamma);
          matrix.re[(M + J) * n + K + J] = d * Math.cos(phase);
          matrix.im[(M + J) * n + K + J] = d * Math.sin(phase);
        }
      }
      matrices.set(J, matrix);
    }
    return matrix;
  };
  return ({ multiplets, re, im }) => {
    const pairs = multiplets.map(({ J }, which) => turned(matrixFor(J), re[which]!, im[which]!));
    return { multiplets, re: pairs.map((pair) => pair.re), im: pairs.map((pair) => pair.im) };
  };
}

function turned(
  matrix: { re: Float64Array; im: Float64Array },
  re: Float64Array,
  im: Float64Array,
): { re: Float64Array; im: Float64Array } {
  const n = re.length;
  const out = { re: new Float64Array(n), im: new Float64Array(n) };
  for (let i = 0; i < n; i++) {
    for (let j = 0; j < n; j++) {
      const [dr, di] = [matrix.re[i * n + j]!, matrix.im[i * n + j]!];
      out.re[i]! += dr * re[j]! - di * im[j]!;
      out.im[i]! += dr * im[j]! + di * re[j]!;
    }
  }
  return out;
}
