import { type Quaternion, type Vector3 } from '../rotation';
import { type GroupRecipe } from './catalogue';
import { type Operation } from './operation';

const tolerance = 1e-6;

/** Rotation angle in (−π, π] turns/2π reduced to k/n in lowest terms, with the axis that makes k positive. */
function turn([w, x, y, z]: Quaternion): { n: number; k: number; axis: Vector3 } {
  const sine = Math.hypot(x, y, z);
  if (sine < tolerance) return { n: 1, k: 0, axis: [0, 0, 1] };
  const fraction = Math.atan2(sine, w) / Math.PI;
  for (let n = 2; n <= 24; n++) {
    const k = Math.round(fraction * n);
    if (Math.abs(fraction * n - k) < tolerance) {
      // A turn of more than half is the shorter one about the opposite axis.
      const [count, sign] = 2 * k > n ? [n - k, -1] : [k, 1];
      return { n, k: count, axis: [(sign * x) / sine, (sign * y) / sine, (sign * z) / sine] };
    }
  }
  throw new Error('not an operation of a crystallographic or small axial point group');
}

const power = (symbol: string, n: number, k: number): string =>
  k === 1 ? `${symbol}${n}` : `${symbol}${n}^${k}`;

/**
 * Schoenflies symbol of an operation, without regard to its group: `E`, `C3`, `C5^2`, `S4`, `i`, `σ`.
 * An improper operation is C times the inversion here; as S_n it has the angle increased by π.
 */
function plainName({ rotation, parity }: Operation): { symbol: string; axis: Vector3 } {
  const { n, k, axis } = turn(rotation);
  if (parity === 1) return { symbol: n === 1 ? 'E' : power('C', n, k), axis };
  if (n === 1) return { symbol: 'i', axis };
  const doubled = Math.abs(2 * k + n) % (2 * n);
  const shorter = Math.min(doubled, 2 * n - doubled);
  if (shorter === 0) return { symbol: 'σ', axis };
  const common = greatestCommonDivisor(shorter, 2 * n);
  const [order, step] = [(2 * n) / common, shorter / common];
  // An even power of S_n with n odd is a rotation, so the tables call the turn by 2·72° with reflection S5^3.
  return { symbol: power('S', order, step % 2 === 0 ? order - step : step), axis };
}

const greatestCommonDivisor = (a: number, b: number): number =>
  b === 0 ? a : greatestCommonDivisor(b, a % b);

const letters = ['x', 'y', 'z'] as const;
const planes = ['yz', 'xz', 'xy'] as const;

/** Name of a class by one of its members: twofold axes and mirror planes get ', '', h, v, d from where they lie. */
export function className(operation: Operation, members: readonly Operation[], recipe: GroupRecipe): string {
  const { symbol, axis } = plainName(operation);
  if (symbol !== 'C2' && symbol !== 'σ') return symbol;
  const anyAlong = (component: 0 | 1 | 2): boolean =>
    members.some((m) => along(plainName(m).axis, component));
  if (recipe.family === 'cubic') {
    const onAxes = anyAlong(0) || anyAlong(1) || anyAlong(2);
    if (symbol === 'C2') return onAxes ? 'C2' : "C2'";
    return onAxes ? 'σh' : 'σd';
  }
  const threeAxes = recipe.order === 2 && ['dihedral', 'prismatic', 'pyramidal'].includes(recipe.family);
  if (threeAxes) {
    const component = axis.findIndex((c) => Math.abs(c) > 1 - tolerance);
    if (recipe.family === 'pyramidal' && symbol === 'C2') return 'C2';
    return symbol === 'C2' ? `C2(${letters[component]})` : `σ(${planes[component]})`;
  }
  if (along(axis, 2)) return symbol === 'C2' ? 'C2' : 'σh';
  if (symbol === 'σ') return recipe.family !== 'antiprismatic' && anyAlong(1) ? 'σv' : 'σd';
  if (recipe.order % 2 === 1) return 'C2';
  return anyAlong(0) ? "C2'" : "C2''";
}

const along = (axis: Vector3, component: 0 | 1 | 2): boolean => Math.abs(axis[component]) > 1 - tolerance;
