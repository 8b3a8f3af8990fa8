import { polyhedron } from '../geometry';
import { averageEnvironment } from '../estimation';
import type { CoordinationSymmetry } from './coordinationSymmetry';

/** One component of a band that unlike ligands split. */
export interface AxialComponent {
  /** 10Dq of the four donors in the plane it belongs to, less the mean of all six, cm⁻¹. */
  readonly shift_cm1: number;
  /** Of the three components of a T level, how many lie here. */
  readonly count: number;
  /** The donors in that plane: `2 Cl, 2 NH3`. */
  readonly plane: string;
}

export interface PlacedDonor {
  readonly name: string;
  /** 10Dq if all six donors were like it, cm⁻¹. */
  readonly tenDq: number;
}

/** Components closer than this are one, cm⁻¹. */
const alike_cm1 = 200;

const opposite = (() => {
  const { vertices } = polyhedron('octahedral');
  return vertices.map(([x, y, z]) =>
    vertices.findIndex(([a, b, c]) => Math.hypot(a + x, b + y, c + z) < 1e-6),
  );
})();

/** The three pairs of opposite vertices of the octahedron. */
const axes: readonly (readonly [number, number])[] = opposite.flatMap((to, from) =>
  from < to ? [[from, to] as const] : [],
);

const count = (names: readonly string[]): string =>
  [...new Set(names)].map((name) => `${names.filter((each) => each === name).length} ${name}`).join(', ');

/**
 * Splitting of the first spin-allowed band of a d3, d8 or low-spin d6 complex of six donors. Each of its three
 * components moves an electron within one plane, from xy to x²-y² and so on, so its energy is the 10Dq of the four donors
 * there: the components of trans-MA4B2 lie (ΔA - ΔB)/2 apart, those of the cis isomer a quarter the other way round.
 * R. A. D. Wentworth and T. S. Piper, Inorg. Chem. 4, 709 (1965), from memory. The mean is the average environment.
 */
export function axialComponents(donors: readonly PlacedDonor[]): AxialComponent[] {
  const mean = averageEnvironment(donors.map(({ tenDq }) => ({ tenDq, places: 1 })));
  const planes = axes.map(([up, down]) => {
    const inPlane = donors.filter((_, vertex) => vertex !== up && vertex !== down);
    return {
      shift: averageEnvironment(inPlane.map(({ tenDq }) => ({ tenDq, places: 1 }))) - mean,
      plane: count(inPlane.map(({ name }) => name).toSorted()),
    };
  });
  const components: AxialComponent[] = [];
  for (const { shift, plane } of planes.toSorted((a, b) => a.shift - b.shift)) {
    const last = components.at(-1);
    if (last !== undefined && shift - last.shift_cm1 < alike_cm1) {
      const together = last.count + 1;
      components[components.length - 1] = {
        ...last,
        shift_cm1: (last.shift_cm1 * last.count + shift) / together,
        count: together,
      };
    } else components.push({ shift_cm1: shift, count: 1, plane });
  }
  return components;
}

/** Donors in the order of the vertices of the octahedron, from the first isomer the composition may stand for. */
export function placedDonors(
  { isomers }: CoordinationSymmetry,
  strengths: ReadonlyMap<string, PlacedDonor>,
): PlacedDonor[] | null {
  const [isomer] = isomers;
  if (isomer === undefined || isomers.length !== 1 || isomer.kinds.length !== 6) return null;
  const donors = isomer.kinds.map((kind) => strengths.get(kind));
  return donors.every((donor) => donor !== undefined) ? (donors as PlacedDonor[]) : null;
}
