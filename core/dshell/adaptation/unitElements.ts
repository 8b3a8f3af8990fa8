import { parity } from '../angularMomentum/factorials';
import { threeJ } from '../angularMomentum/threeJ';
import { type FieldComponent, type FieldTensors } from '../field/tensorComponents';
import { type AdaptedVector } from './vector';

export interface Complex {
  readonly re: number;
  readonly im: number;
}

const cache = new Map<number, Float64Array>();

/** (−1)^{J−M} (J k J′; −M q M−q) for all M (index M + J) and q (index q + k); kept, since every block asks again. */
function geometry(J: number, k: number, JPrime: number): Float64Array {
  const key = (2 * J * 32 + 2 * JPrime) * 8 + k;
  let table = cache.get(key);
  if (table === undefined) {
    const width = 2 * k + 1;
    table = new Float64Array((2 * J + 1) * width);
    for (let M = -J; M <= J; M++) {
      for (let q = -k; q <= k; q++) {
        if (Math.abs(M - q) > JPrime) continue;
        table[(M + J) * width + q + k] = parity(J - M) * threeJ(J, k, JPrime, -M, q, M - q);
      }
    }
    cache.set(key, table);
  }
  return table;
}

/** ⟨J u|T^(k)_q|J′ v⟩ per unit of the reduced element ⟨J‖T^(k)‖J′⟩. */
export function unitElement(
  J: number,
  u: AdaptedVector,
  k: number,
  q: number,
  JPrime: number,
  v: AdaptedVector,
): Complex {
  let re = 0;
  let im = 0;
  for (let i = 0; i < u.M.length; i++) {
    const M = u.M[i]!;
    const j = v.M.indexOf(M - q);
    if (j < 0) continue;
    const factor = geometry(J, k, JPrime)[(M + J) * (2 * k + 1) + q + k]!;
    re += factor * (u.re[i]! * v.re[j]! + u.im[i]! * v.im[j]!);
    im += factor * (u.re[i]! * v.im[j]! - u.im[i]! * v.re[j]!);
  }
  return { re, im };
}

/** The same for one real field component: U_q + (−1)^q U_−q (`re`) or i(U_q − (−1)^q U_−q) (`im`). */
export function componentElement(
  J: number,
  u: AdaptedVector,
  component: FieldComponent,
  JPrime: number,
  v: AdaptedVector,
): Complex {
  const { k, q, part } = component;
  const up = unitElement(J, u, k, q, JPrime, v);
  if (q === 0) return up;
  const down = unitElement(J, u, k, -q, JPrime, v);
  const sign = parity(q);
  if (part === 're') return { re: up.re + sign * down.re, im: up.im + sign * down.im };
  return { re: -(up.im - sign * down.im), im: up.re - sign * down.re };
}

/** ⟨J u|V^(k)|J′ v⟩ of the rank-k part of a field, per unit of the reduced element. */
export function fieldElement(
  J: number,
  u: AdaptedVector,
  k: 2 | 4,
  field: FieldTensors,
  JPrime: number,
  v: AdaptedVector,
): Complex {
  let re = 0;
  let im = 0;
  for (let q = 0; q <= k; q++) {
    for (const part of ['re', 'im'] as const) {
      const coefficient = field[part][k][q]!;
      if (coefficient === 0 || (q === 0 && part === 'im')) continue;
      const element = componentElement(J, u, { k, q, part }, JPrime, v);
      re += coefficient * element.re;
      im += coefficient * element.im;
    }
  }
  return { re, im };
}
