import { parity } from '../angularMomentum/factorials';
import { threeJ } from '../angularMomentum/threeJ';
import { oneBody, type DeterminantSpace } from './determinantSpace';
import { magneticNumber, shellL, spinOf } from './microstates';
import { repulsion } from './slaterCondon';
import { apply, dot } from './sparseOperator';
import { termsOf, type Term } from './terms';
import { remember } from '../remember';

/**
 * Everything about d^N that does not depend on the surroundings: its terms and, between them, the reduced matrix elements
 * of repulsion, of the unit tensors of rank 2 and 4 (any ligand field) and of Σ l s (spin-orbit coupling).
 * Matrices are row-major over `terms`.
 */
export interface FreeIon {
  readonly electrons: number;
  readonly space: DeterminantSpace;
  readonly terms: readonly Term[];
  /** ⟨vSL|H/B|v′SL⟩ and the same per unit of C. */
  readonly repulsionB: Float64Array;
  readonly repulsionC: Float64Array;
  /** ⟨vSL‖U^(2)‖v′SL′⟩, ⟨vSL‖U^(4)‖v′SL′⟩ with ⟨d‖u^(k)‖d⟩ = 1. */
  readonly unit2: Float64Array;
  readonly unit4: Float64Array;
  /** ⟨vSL‖Σ l s‖v′S′L′⟩, reduced in both spaces. */
  readonly spinOrbit: Float64Array;
}

/** The free ion of N = 1…9 d electrons; worked out on first use and kept. */
export const freeIon = remember(workOut);

function workOut(electrons: number): FreeIon {
  const { space, terms } = termsOf(electrons);
  const scalar = (parameter: 'B' | 'C'): Float64Array => {
    const operator = repulsion(space, parameter);
    const images = terms.map((term) => apply(operator, term.highest));
    return between(terms, (bra, _, j) =>
      bra.S === terms[j]!.S && bra.L === terms[j]!.L ? dot(bra.highest, images[j]!) : 0,
    );
  };
  return {
    electrons,
    space,
    terms,
    repulsionB: scalar('B'),
    repulsionC: scalar('C'),
    unit2: unitTensor(space, terms, 2),
    unit4: unitTensor(space, terms, 4),
    spinOrbit: spinOrbitTensor(space, terms),
  };
}

function between(terms: readonly Term[], element: (bra: Term, ket: Term, j: number) => number): Float64Array {
  const n = terms.length;
  const matrix = new Float64Array(n * n);
  terms.forEach((bra, i) => terms.forEach((ket, j) => (matrix[i * n + j] = element(bra, ket, j))));
  return matrix;
}

/** Operators of each component, applied to each highest state at most once. */
function images(terms: readonly Term[], operator: (component: string) => Parameters<typeof apply>[0]) {
  const operators = new Map<string, Parameters<typeof apply>[0]>();
  const done = new Map<string, Float64Array>();
  return (j: number, component: string): Float64Array => {
    const key = `${j}:${component}`;
    let image = done.get(key);
    if (image === undefined) {
      if (!operators.has(component)) operators.set(component, operator(component));
      image = apply(operators.get(component)!, terms[j]!.highest);
      done.set(key, image);
    }
    return image;
  };
}

/** The Wigner-Eckart theorem read backwards at M = L, M′ = L′, where the 3j symbol never vanishes. */
function unitTensor(space: DeterminantSpace, terms: readonly Term[], k: number): Float64Array {
  const image = images(terms, (component) =>
    oneBody(space, (p, r) => {
      const m = magneticNumber(p);
      const mPrime = magneticNumber(r);
      if (spinOf(p) !== spinOf(r) || m !== mPrime + Number(component)) return 0;
      return parity(shellL - m) * threeJ(shellL, k, shellL, -m, Number(component), mPrime);
    }),
  );
  return between(terms, (bra, ket, j) => {
    const q = bra.L - ket.L;
    if (bra.S !== ket.S || Math.abs(q) > k || bra.L + ket.L < k) return 0;
    const geometry = threeJ(bra.L, k, ket.L, -bra.L, q, ket.L);
    return dot(bra.highest, image(j, String(q))) / geometry;
  });
}

/** Spherical components of l or s, ⟨j m′|j_q|j m⟩. */
function spherical(j: number, m: number, q: number): number {
  if (q === 0) return m;
  return (-q * Math.sqrt(j * (j + 1) - m * (m + q))) / Math.SQRT2;
}

function spinOrbitTensor(space: DeterminantSpace, terms: readonly Term[]): Float64Array {
  const image = images(terms, (component) => {
    const [q, kappa] = component.split(',').map(Number) as [number, number];
    return oneBody(space, (p, r) => {
      if (magneticNumber(p) !== magneticNumber(r) + q || spinOf(p) !== spinOf(r) + kappa) return 0;
      return spherical(shellL, magneticNumber(r), q) * spherical(0.5, spinOf(r), kappa);
    });
  });
  return between(terms, (bra, ket, j) => {
    const q = bra.L - ket.L;
    const kappa = bra.S - ket.S;
    if (Math.abs(q) > 1 || Math.abs(kappa) > 1) return 0;
    const geometry =
      threeJ(bra.L, 1, ket.L, -bra.L, q, ket.L) * threeJ(bra.S, 1, ket.S, -bra.S, kappa, ket.S);
    return geometry === 0 ? 0 : dot(bra.highest, image(j, `${q},${kappa}`)) / geometry;
  });
}
