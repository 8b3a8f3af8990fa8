import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { rotationAbout } from '../../symmetry';
import { turnedField } from '../field/symmetryAxes';
import { fieldTensors, fieldTrace } from '../field/tensorComponents';
import { checkProblem, hamiltonianParameters, type CheckedProblem, type LevelProblem } from '../problem';
import { hermitianEigenvalues } from '../../numerics/eigen/hermitian';
import { assemble } from '../blocks/assemble';
import { magneticBlocks } from '../blocks/magneticBlocks';
import { magneticProblem } from '../magneticProblem';
import { levels } from './levels';
import { solveBlocks } from './solveBlocks';

const states = [1, 10, 45, 120, 210, 252, 210, 120, 45, 10];

/** Every eigenvalue as often as it occurs, ascending, without the trace of the field. */
function spectrum(problem: CheckedProblem): number[] {
  return solveBlocks(problem)
    .flatMap(({ block, values }) =>
      Array.from(values).flatMap((value) => new Array<number>(block.degeneracy).fill(value)),
    )
    .sort((a, b) => a - b);
}

const largestDifference = (a: readonly number[], b: readonly number[]): number =>
  Math.max(...a.map((value, i) => Math.abs(value - b[i]!)));

const energy = (limit: number) => fc.double({ min: -limit, max: limit, noNaN: true });
const field = fc.array(energy(8000), { minLength: 15, maxLength: 15 }).map((entries): number[][] => {
  const V = Array.from({ length: 5 }, () => [0, 0, 0, 0, 0]);
  let next = 0;
  for (let a = 0; a < 5; a++) for (let b = 0; b <= a; b++) V[a]![b] = V[b]![a] = entries[next++]!;
  return V;
});
const problem = fc
  .record({
    dElectrons: fc.integer({ min: 1, max: 9 }),
    B: fc.double({ min: 0, max: 1200, noNaN: true }),
    C: fc.double({ min: 0, max: 5000, noNaN: true }),
    alpha: energy(100),
    zeta: fc.oneof(fc.constant(0), fc.double({ min: 1, max: 4000, noNaN: true })),
    matrix: field,
  })
  .map(({ matrix, ...rest }): LevelProblem => ({ ...rest, field: { type: 'matrix', matrix } }));

const check = (property: fc.IProperty<[LevelProblem]>, numRuns = 25): void =>
  fc.assert(property, { numRuns, seed: 17 });

describe('for any field, repulsion and coupling', () => {
  it('there are C(10, N) states, and an odd number of electrons has only even degeneracies (Kramers 1930)', () => {
    check(
      fc.property(problem, (each) => {
        const { levels: found } = levels(each, { labelGroup: null });
        expect(found.reduce((sum, { degeneracy }) => sum + degeneracy, 0)).toBe(states[each.dElectrons]);
        expect(found[0]!.energy).toBe(0);
        if (each.dElectrons % 2 === 1) for (const { degeneracy } of found) expect(degeneracy % 2).toBe(0);
      }),
    );
  });

  it('the mean energy is that of N electrons and N(N − 1)/2 pairs: (7C − 14B)/9 a pair, α times the mean of L(L + 1)', () => {
    check(
      fc.property(problem, (each) => {
        const { electrons: n, B, C, alpha } = checkProblem(each);
        const energies = spectrum(checkProblem(each));
        const mean = energies.reduce((sum, value) => sum + value, 0) / energies.length;
        // ⟨L²⟩ over all states: 6 for each electron, less what pairs exclude: N·6 − N(N − 1)·6/9.
        const meanL2 = 6 * n - (6 * n * (n - 1)) / 9;
        const expected = ((n * (n - 1)) / 2) * ((7 * C - 14 * B) / 9) + alpha * meanL2;
        expect(Math.abs(mean - expected)).toBeLessThan(1e-7);
      }),
    );
  });

  it('turning the ligands about any axis changes nothing', () => {
    const turn = fc.tuple(energy(1), energy(1), fc.double({ min: 0.1, max: 1, noNaN: true }), energy(3));
    fc.assert(
      fc.property(problem, turn, (each, [x, y, z, angle]) => {
        const checked = checkProblem(each);
        const turned = { ...checked, V: turnedField(checked.V, rotationAbout([x, y, z], angle)) };
        expect(largestDifference(spectrum(checked), spectrum(turned))).toBeLessThan(1e-6);
      }),
      { numRuns: 20, seed: 4 },
    );
  });

  it('N electrons are 10 − N holes with field and coupling reversed, up to a common shift', () => {
    check(
      fc.property(problem, (each) => {
        const checked = checkProblem({ ...each, alpha: 0 });
        const holes: CheckedProblem = {
          ...checked,
          electrons: 10 - checked.electrons,
          V: checked.V.map((row) => row.map((value) => -value)),
          zeta: -checked.zeta,
        };
        const [mine, theirs] = [spectrum(checked), spectrum(holes)];
        const shift = theirs[0]! - mine[0]!;
        expect(
          largestDifference(
            mine,
            theirs.map((value) => value - shift),
          ),
        ).toBeLessThan(1e-6);
      }),
    );
  });

  it('half the matrix by time reversal gives what the complete complex matrix gives', () => {
    check(
      fc.property(problem, (each) => {
        const checked = checkProblem({ ...each, zeta: each.zeta || 500 });
        const [block] = magneticBlocks(checked.electrons, 1, 'complex');
        const parameters = hamiltonianParameters(checked, fieldTensors(checked.V));
        const complete = hermitianEigenvalues(assemble(block!, parameters), block!.size);
        expect(largestDifference(spectrum(checked), Array.from(complete))).toBeLessThan(1e-6);
      }),
      12,
    );
  });

  it('a magnetic field along an axis of the ligands, in its rows, gives what the complete complex matrix gives', () => {
    const turn = fc.tuple(energy(1), energy(1), fc.double({ min: 0.1, max: 1, noNaN: true }));
    const fields = fc.constantFrom<LevelProblem['field']>(
      { type: 'oct', tenDq: 12_000 },
      { type: 'trigonal', tenDq: 12_000, Dsigma: 300, Dtau: -80 },
      { type: 'tetragonal', tenDq: 12_000, Ds: 300, Dt: -80 },
      { type: 'sqp', e_sigma: 7000, e_pi_perp: 900, e_pi_par: 400 },
    );
    fc.assert(
      fc.property(
        fc.constantFrom(2, 3, 8),
        fields,
        fc.constantFrom(...['x', 'y', 'z', 'skew']),
        turn,
        (n, spec, axis, skew) => {
          const B_T = { x: [7, 0, 0], y: [0, -7, 0], z: [0, 0, 7], skew: skew.map((part) => 5 * part) }[
            axis
          ]!;
          const checked = checkProblem({
            ...{ dElectrons: n, B: 600, C: 2500, zeta: 400, field: spec },
            zeeman: { B_T: B_T as [number, number, number], k: 0.9 },
          });
          const { tensors, parameters } = magneticProblem(checked, checked.zeeman!);
          const [block] = magneticBlocks(n, 1, 'complex');
          const all = new Map([...hamiltonianParameters(checked, tensors), ...parameters]);
          const complete = hermitianEigenvalues(assemble(block!, all), block!.size);
          expect(largestDifference(spectrum(checked), Array.from(complete))).toBeLessThan(1e-7);
        },
      ),
      { numRuns: 30, seed: 8 },
    );
  });

  it('a magnetic field and its opposite give the same energies', () => {
    check(
      fc.property(problem, (each) => {
        const small = { ...each, dElectrons: each.dElectrons > 5 ? 8 : 2 };
        const at = (sign: number): number[] =>
          spectrum(checkProblem({ ...small, zeeman: { B_T: [3 * sign, -2 * sign, 5 * sign], k: 0.8 } }));
        expect(largestDifference(at(1), at(-1))).toBeLessThan(1e-6);
      }),
    );
  });
});

describe('limits', () => {
  it('without repulsion the energies are sums of one-electron energies, spin-orbit coupling included', () => {
    check(
      fc.property(problem, (each) => {
        const bare = { ...each, B: 0, C: 0, alpha: 0 };
        const centre = fieldTrace(checkProblem(bare).V) / 5;
        const single = spectrum(checkProblem({ ...bare, dElectrons: 1 })).map((value) => value + centre);
        const sums: number[] = [];
        for (let mask = 0; mask < 1024; mask++) {
          const chosen = single.filter((_, i) => (mask >> i) & 1);
          if (chosen.length === each.dElectrons) sums.push(chosen.reduce((a, b) => a + b, 0));
        }
        sums.sort((a, b) => a - b);
        const mine = spectrum(checkProblem(bare)).map((value) => value + each.dElectrons * centre);
        expect(largestDifference(mine, sums)).toBeLessThan(1e-6);
      }),
    );
  });

  it('a vanishing coupling meets the levels without coupling, and a vanishing field the free ion', () => {
    check(
      fc.property(problem, (each) => {
        const checked = checkProblem(each);
        const without = spectrum({ ...checked, zeta: 0 });
        expect(largestDifference(spectrum({ ...checked, zeta: 1e-6 }), without)).toBeLessThan(1e-4);
        const faint = checked.V.map((row) => row.map((value) => value * 1e-9));
        const free = checked.V.map((row) => row.map(() => 0));
        expect(
          largestDifference(spectrum({ ...checked, V: faint }), spectrum({ ...checked, V: free })),
        ).toBeLessThan(1e-3);
      }),
      15,
    );
  });

  it('all fields of an octahedron agree: 10Dq, tetragonal without distortion, standing on a face, as a matrix', () => {
    const base = { dElectrons: 6, B: 650, C: 2900, zeta: 400 };
    const spectra = (
      [
        { type: 'oct', tenDq: 15_000 },
        { type: 'tetragonal', tenDq: 15_000, Ds: 0, Dt: 0 },
        { type: 'trigonal', tenDq: 15_000, Dsigma: 0, Dtau: 0 },
        {
          type: 'matrix',
          matrix: [9000, 9000, -6000, -6000, -6000].map((value, a) =>
            [0, 1, 2, 3, 4].map((b) => (a === b ? value : 0)),
          ),
        },
      ] as const
    ).map((spec) => spectrum(checkProblem({ ...base, field: spec })));
    for (const other of spectra.slice(1)) expect(largestDifference(spectra[0]!, other)).toBeLessThan(1e-7);
  });
});
