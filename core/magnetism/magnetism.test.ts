import { describe, expect, it } from 'vitest';
import { type FieldSpec, solveStates } from '../dshell';
import { computedCases, type ComputedCurve } from '../testing/levels/computedCases';
import { boltzmann_cm1_K } from '../units';
import {
  groundDoubletG,
  inducedSusceptibility,
  kotaniMoment,
  magnetisation,
  type MagneticProblem,
  momentFactors,
  momentSquaredPerChiT,
  powderMagnetisation,
  temperatureIndependent,
  vanVleckFactor,
  vanVleckSusceptibility,
  zeroFieldSplitting,
} from './index';

const magnetic = computedCases().flatMap(({ magnetic: answers, ...problem }) =>
  answers === undefined ? [] : [{ ...problem, magnetic: answers }],
);

const problemOf = ({
  dElectrons,
  B,
  C,
  zeta,
  field,
  magnetic: { k, ge },
}: (typeof magnetic)[number]): MagneticProblem => ({
  ...{ dElectrons, B, C, field, orbitalReduction: k, ge },
  ...(zeta === undefined ? {} : { zeta }),
});

function expectCurve(found: ReturnType<typeof vanVleckSusceptibility>, expected: ComputedCurve): void {
  found.forEach(({ chi_xyz, muEff }, i) => {
    chi_xyz.forEach((chi, axis) =>
      expect(Math.abs(chi / expected.chi_xyz_cm3_mol[i]![axis]! - 1)).toBeLessThan(1e-6),
    );
    expect(muEff).toBeCloseTo(expected.mu_eff_iso_BM[i]!, 6);
  });
}

describe('magnetism agrees with the independently computed cases', () => {
  it.each(magnetic.map((each) => [`${each.id} (${each.subkind})`, each] as const))(
    '%s: Van Vleck sum at all temperatures, g of the doublet, D and E',
    (_, each) => {
      const problem = problemOf(each);
      const { T_K, vanVleck_zeroField, groundDoublet_g, zfs } = each.magnetic;
      expectCurve(vanVleckSusceptibility(problem, T_K), vanVleck_zeroField);
      const states = solveStates(problem);
      const doublet = groundDoubletG(states, momentFactors(problem));
      if (groundDoublet_g !== undefined) {
        doublet!.G.forEach((row, a) =>
          row.forEach((value, b) => expect(value).toBeCloseTo(groundDoublet_g.G_xyz[a]![b]!, 6)),
        );
      } else expect(doublet).toBeNull();
      if (zfs !== undefined) {
        const found = zeroFieldSplitting(problem, states)!;
        expect(found.D).toBeCloseTo(zfs.D_cm1, 5);
        expect(found.E).toBeCloseTo(zfs.E_cm1, 5);
        found.levels.forEach((level, i) => expect(level).toBeCloseTo(zfs.levels_cm1[i]!, 5));
      }
    },
  );

  const small = magnetic.filter(({ dElectrons: n }) => n < 3 || n > 7);
  it.each(small.map((each) => [each.id, each] as const))('%s: exact average in 0.1 T', (_, each) => {
    const { T_K, B_T, thermal_0p1T } = each.magnetic;
    expectCurve(inducedSusceptibility(problemOf(each), B_T, T_K), thermal_0p1T);
  });
});

const octahedral = (tenDq: number): FieldSpec => ({ type: 'oct', tenDq });
const room = 298;

describe('magnetism in its limits', () => {
  it('follows the Curie law of a free spin: d5 6A1 has μ = g √(S(S+1)) at every temperature (Van Vleck 1932)', () => {
    const problem: MagneticProblem = { dElectrons: 5, B: 860, C: 3850, ge: 2, field: octahedral(8500) };
    for (const { muEff } of vanVleckSusceptibility(problem, [5, 77, room])) {
      expect(muEff).toBeCloseTo(Math.sqrt(35), 6);
    }
  });

  it('saturates at g S, by the Brillouin function (Kittel, Introduction to Solid State Physics)', () => {
    // A field so strong that the orbital moment it leaves is nothing.
    const field: FieldSpec = { type: 'tetragonal', tenDq: 1e8, Ds: 8e6, Dt: 3e6 };
    const problem: MagneticProblem = { dElectrons: 9, B: 0, C: 0, ge: 2, field };
    const [point] = magnetisation(problem, 5, [0, 0, 1], [2]);
    const x = (0.46686447783 * 5) / (boltzmann_cm1_K * 2);
    expect(point!.moment_NAmuB).toBeCloseTo(Math.tanh(x), 6);
  });

  it('gives Kotani curves for t2g^n in a field without limit (M. Kotani, J. Phys. Soc. Japan 4, 293, 1949)', () => {
    for (const n of [1, 2, 4, 5] as const) {
      const zeta = 100;
      const ratios = [0.3, 0.6, 1, 1.5];
      const temperatures = ratios.map((ratio) => (ratio * zeta) / boltzmann_cm1_K);
      const problem: MagneticProblem = {
        dElectrons: n,
        B: 800,
        C: 3000,
        zeta,
        ge: 2,
        field: octahedral(3e7),
      };
      vanVleckSusceptibility(problem, temperatures).forEach(({ muEff }, i) =>
        expect(Math.abs(muEff / kotaniMoment(n, ratios[i]!) - 1), `t2g${n} at ${ratios[i]}`).toBeLessThan(
          2e-3,
        ),
      );
    }
  });

  it('reaches the printed limits of Kotani curves: √5 and √10 for hot 2T2 and 3T1, √3 for cold t2g5, 0 for cold t2g4', () => {
    expect(kotaniMoment(1, 1e5)).toBeCloseTo(Math.sqrt(5), 3);
    expect(kotaniMoment(2, 1e5)).toBeCloseTo(Math.sqrt(10), 3);
    expect(kotaniMoment(5, 1e-3)).toBeCloseTo(Math.sqrt(3), 2);
    expect(kotaniMoment(4, 1e-5)).toBeCloseTo(0, 1);
    expect(kotaniMoment(3, 1)).toBeCloseTo(3.873, 3);
  });

  it('raises the moment of A2 terms by 1 − 4λ/10Dq, of E terms by 1 − 2λ/10Dq (Figgis and Lewis 1964)', () => {
    // First order in λ: the temperature-independent part is taken off.
    const moment = (problem: MagneticProblem): number => {
      const [point] = vanVleckSusceptibility(problem, [room]);
      const { chi } = temperatureIndependent(problem);
      return Math.sqrt(momentSquaredPerChiT * (point!.chi - chi) * room);
    };
    const nickel: MagneticProblem = {
      dElectrons: 8,
      B: 900,
      C: 3800,
      zeta: 6,
      ge: 2,
      field: octahedral(8500),
    };
    expect(moment(nickel) / Math.sqrt(8)).toBeCloseTo(1 + (4 * 3) / 8500, 5);
    const chromium: MagneticProblem = {
      dElectrons: 3,
      B: 700,
      C: 2900,
      zeta: 6,
      ge: 2,
      field: octahedral(17_000),
    };
    expect(moment(chromium) / Math.sqrt(15)).toBeCloseTo(1 - (4 * 2) / 17_000, 5);
    const copper: MagneticProblem = { dElectrons: 9, B: 0, C: 0, zeta: 6, ge: 2, field: octahedral(12_000) };
    expect(moment(copper) / Math.sqrt(3)).toBeCloseTo(1 + (2 * 6) / 12_000, 5);
  });

  it('has the temperature-independent paramagnetism of A2 terms, 8 N μB²/10Dq, and of low-spin d6, 16 N μB²/E(1T1g) (Figgis and Lewis 1964)', () => {
    const nickel = temperatureIndependent({ dElectrons: 8, B: 900, C: 3800, field: octahedral(8500) });
    expect(nickel.manifold).toBe(3);
    expect(nickel.chi).toBeCloseTo((8 * vanVleckFactor) / 8500, 9);
    // Strong field: E(1T1g) = 10Dq − C and no mixing of configurations.
    const cobalt = temperatureIndependent({ dElectrons: 6, B: 1, C: 4, field: octahedral(20_000) });
    expect(cobalt.chi / ((16 * vanVleckFactor) / (20_000 - 4))).toBeCloseTo(1, 3);
  });
});

describe('spin Hamiltonian in its limits', () => {
  const g = (problem: MagneticProblem): readonly number[] =>
    groundDoubletG(solveStates(problem), momentFactors(problem))!.principal;

  it('shifts g of tetragonal Cu(II) by 8ζ/Δ(xy) along z and 2ζ/Δ(xz, yz) across (Abragam and Bleaney 1970)', () => {
    const zeta = 5;
    const energies = { xy: 12_000, xz: 14_000 };
    const matrix = [9_000, 0, -energies.xy, -energies.xz, -energies.xz].map((e, a) =>
      [0, 1, 2, 3, 4].map((b) => (a === b ? (a === 0 ? -9_000 : e) : 0)),
    );
    const [across, , along] = g({ dElectrons: 9, B: 0, C: 0, zeta, field: { type: 'matrix', matrix } });
    expect(along! - 2.0023).toBeCloseTo((8 * zeta) / energies.xy, 4);
    expect(across! - 2.0023).toBeCloseTo((2 * zeta) / energies.xz, 4);
  });

  it('gives D of tetragonal d8 by second order in λ, −4λ²(1/Δ∥ − 1/Δ⊥), where singlets are far away (Abragam and Bleaney 1970)', () => {
    const zeta = 10;
    const lambda = -zeta / 2;
    // 3B2g (from xy) and 3Eg of 3T2g stand at these energies above 3B1g; a large B keeps singlets and 3T1g away.
    const matrix = [0, 0, -9_000, -11_000, -11_000].map((e, a) =>
      [0, 1, 2, 3, 4].map((b) => (a === b ? e : 0)),
    );
    const problem: MagneticProblem = {
      dElectrons: 8,
      B: 2e5,
      C: 8e5,
      zeta,
      field: { type: 'matrix', matrix },
    };
    const { energies } = solveStates({ ...problem, zeta: 0 });
    const levels = [
      ...new Set(Array.from(energies, (energy) => Math.round((energy - energies[0]!) * 1e3) / 1e3)),
    ];
    const [, first, second] = levels as [number, number, number];
    const expected = -4 * lambda ** 2 * (1 / first - 1 / second);
    const { D, E, purity } = zeroFieldSplitting(problem)!;
    expect(first).toBeCloseTo(9_000, 0);
    expect(D / expected).toBeCloseTo(1, 2);
    expect(Math.abs(E)).toBeLessThan(1e-7);
    expect(purity).toBeGreaterThan(0.9999);
  });

  it('splits S = 3/2 by 2 √(D² + 3E²) and S = 1 into D + E, D − E (Abragam and Bleaney 1970)', () => {
    const rhombic = (n: number): MagneticProblem => ({
      ...{ dElectrons: n, B: 700, C: 2900, zeta: 250 },
      field: {
        type: 'matrix',
        matrix: [9_500, 8_700, -5_600, -6_100, -6_900].map((e, a) =>
          [0, 1, 2, 3, 4].map((b) => (a === b ? e : 0)),
        ),
      },
    });
    const quartet = zeroFieldSplitting(rhombic(3))!;
    expect(quartet.levels[3]! - quartet.levels[0]!).toBeCloseTo(
      2 * Math.hypot(quartet.D, Math.sqrt(3) * quartet.E),
      6,
    );
    const triplet = zeroFieldSplitting(rhombic(8))!;
    const { D, E } = triplet;
    const expected = [0, D - E, D + E].sort((a, b) => a - b);
    triplet.levels.forEach((level, i) => expect(level).toBeCloseTo(expected[i]! - expected[0]!, 6));
  });

  it('is not offered where it has no meaning: orbital degeneracy, S = 1/2, no spin-orbit coupling, even N for g', () => {
    const base = { B: 800, C: 3200, zeta: 300 };
    expect(zeroFieldSplitting({ ...base, dElectrons: 7, field: octahedral(9_000) })).toBeNull();
    expect(zeroFieldSplitting({ ...base, dElectrons: 9, field: octahedral(9_000) })).toBeNull();
    expect(zeroFieldSplitting({ ...base, zeta: 0, dElectrons: 8, field: octahedral(9_000) })).toBeNull();
    const even = solveStates({ ...base, dElectrons: 8, field: octahedral(9_000) });
    expect(groundDoubletG(even, { k: 1, ge: 2 })).toBeNull();
  });
});

describe('powders in strong fields', () => {
  const problem: MagneticProblem = {
    dElectrons: 9,
    B: 0,
    C: 0,
    zeta: 800,
    field: { type: 'tetragonal', tenDq: 12_000, Ds: 800, Dt: 300 },
  };

  it('are the mean of the axes while the field is weak', () => {
    const [powder] = powderMagnetisation(problem, 0.01, [room]);
    const [point] = inducedSusceptibility(problem, 0.01, [room]);
    expect(powder!.moment_emu / 100 / point!.chi).toBeCloseTo(1, 6);
  });

  it('lie between the axes when the moment saturates', () => {
    const along = (direction: [number, number, number]) =>
      magnetisation(problem, 7, direction, [2])[0]!.moment_NAmuB;
    const [powder] = powderMagnetisation(problem, 7, [2]);
    expect(powder!.moment_NAmuB).toBeGreaterThan(along([1, 0, 0]));
    expect(powder!.moment_NAmuB).toBeLessThan(along([0, 0, 1]));
  });
});

describe('magnetic input', () => {
  const problem: MagneticProblem = { dElectrons: 8, B: 900, C: 3800, field: octahedral(8500) };
  it('is refused by name: temperatures of 0 K, a negative reduction, no field where one is asked for', () => {
    expect(() => vanVleckSusceptibility(problem, [300, 0])).toThrow(/temperatures_K\[1\]/);
    expect(() => vanVleckSusceptibility({ ...problem, orbitalReduction: -1 }, [300])).toThrow(
      /orbitalReduction/,
    );
    expect(() => inducedSusceptibility(problem, 0, [300])).toThrow(/field_T/);
    expect(() => vanVleckSusceptibility({ ...problem, ge: NaN }, [300])).toThrow(/ge is NaN/);
  });
});
