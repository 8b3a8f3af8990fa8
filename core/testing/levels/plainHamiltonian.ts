import { bohrMagneton_cm1_T } from '../../units';
import { checkProblem, type LevelProblem } from '../../dshell/problem';
import { determinantSpace, twoBody } from '../../dshell/freeIon/determinantSpace';
import { angularFactor } from '../../dshell/freeIon/slaterCondon';
import { realOrbitals } from '../../dshell/field/orbitals';
import { angularOperators, oneElectron, type DeterminantOperator } from '../../dshell/states/operators';

/**
 * The whole Hamiltonian over determinants of real orbitals, without any symmetry: the plain way that the engine is held
 * against. Row-major complex, real and imaginary part side by side.
 */
export function plainHamiltonian(problem: LevelProblem): { size: number; matrix: Float64Array } {
  const { electrons, V, zeta, B, C, zeeman } = checkProblem(problem);
  const space = determinantSpace(electrons);
  const size = space.states.length;
  const matrix = new Float64Array(2 * size * size);
  const add = (operator: DeterminantOperator, factor: number): void => {
    operator.rows.forEach((row, e) => {
      const at = 2 * (row * size + operator.columns[e]!);
      matrix[at]! += factor * operator.re[e]!;
      matrix[at + 1]! += factor * operator.im[e]!;
    });
  };
  add(
    oneElectron(electrons, (p, q) => (p < 5 === q < 5 ? [V[p % 5]![q % 5]!, 0] : [0, 0])),
    1,
  );
  const { L, S, spinOrbit } = angularOperators(electrons);
  add(spinOrbit, zeta);
  if (zeeman !== null) {
    zeeman.B_T.forEach((tesla, axis) => {
      add(L[axis]!, bohrMagneton_cm1_T * tesla * zeeman.k);
      add(S[axis]!, bohrMagneton_cm1_T * tesla * zeeman.ge);
    });
  }
  const integrals = realIntegrals(B, C);
  const repulsion = twoBody(space, (p, q, r, s) =>
    p < 5 === r < 5 && q < 5 === s < 5 ? integrals(p % 5, q % 5, r % 5, s % 5) : 0,
  );
  repulsion.columns.forEach(({ rows, values }, column) =>
    rows.forEach((row, e) => (matrix[2 * (row * size + column)]! += values[e]!)),
  );
  return { size, matrix };
}

/** ⟨a(1) b(2)|1/r₁₂|c(1) d(2)⟩ over real orbitals with A = 0, from Condon and Shortley's c^k. */
function realIntegrals(B: number, C: number): (a: number, b: number, c: number, d: number) => number {
  const slater = [(7 / 5) * C, 49 * B + 7 * C, (63 / 5) * C];
  const table = new Float64Array(625);
  const u = (m: number, a: number): [number, number] => [
    realOrbitals.re[2 - m]![a]!,
    realOrbitals.im[2 - m]![a]!,
  ];
  const indices = [0, 1, 2, 3, 4];
  const ms = [2, 1, 0, -1, -2];
  for (const m1 of ms)
    for (const m2 of ms)
      for (const m3 of ms) {
        const m4 = m1 + m2 - m3;
        if (Math.abs(m4) > 2) continue;
        const value = [0, 2, 4].reduce(
          (sum, k, i) => sum + slater[i]! * angularFactor(k, m1, m3) * angularFactor(k, m4, m2),
          0,
        );
        for (const a of indices)
          for (const b of indices)
            for (const c of indices)
              for (const d of indices) {
                let [re, im] = u(m1, a);
                im = -im;
                for (const [m, x, sign] of [
                  [m2, b, -1],
                  [m3, c, 1],
                  [m4, d, 1],
                ] as const) {
                  const [ur, ui] = u(m, x);
                  [re, im] = [re * ur - im * ui * sign, re * ui * sign + im * ur];
                }
                table[((a * 5 + b) * 5 + c) * 5 + d]! += value * re;
              }
      }
  return (a, b, c, d) => table[((a * 5 + b) * 5 + c) * 5 + d]!;
}
