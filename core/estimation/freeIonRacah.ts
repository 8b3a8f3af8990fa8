import type { IonRecord, ParameterLibrary } from '../library';
import { defaultDoubts } from './defaultDoubts';
import type { Factor } from './ligandStrength';

/** Solves the normal equations of y = a + b x1 + c x2. */
function plane(points: readonly { x1: number; x2: number; y: number }[]): [number, number, number] {
  const n = points.length;
  const mean = (of: (p: (typeof points)[number]) => number): number =>
    points.reduce((sum, point) => sum + of(point), 0) / n;
  const [m1, m2, my] = [mean((p) => p.x1), mean((p) => p.x2), mean((p) => p.y)];
  let [s11, s12, s22, s1y, s2y] = [0, 0, 0, 0, 0];
  for (const { x1, x2, y } of points) {
    s11 += (x1 - m1) ** 2;
    s12 += (x1 - m1) * (x2 - m2);
    s22 += (x2 - m2) ** 2;
    s1y += (x1 - m1) * (y - my);
    s2y += (x2 - m2) * (y - my);
  }
  const determinant = s11 * s22 - s12 * s12;
  const b = (s1y * s22 - s2y * s12) / determinant;
  const c = (s2y * s11 - s1y * s12) / determinant;
  return [my - b * m1 - c * m2, b, c];
}

/**
 * Free-ion Racah B: the tabulated one; for a 3d ion without, the plane through the tabulated values over d count and
 * charge, which they follow within 4 %; for a 4d or 5d ion without, the mean of its row.
 */
export function freeIonB(ion: IonRecord, library: ParameterLibrary): Factor | null {
  if (ion.B0.value !== null) {
    return {
      value: ion.B0.value,
      sigma: ion.B0.sigma === null ? defaultDoubts.freeIonB : ion.B0.sigma / ion.B0.value,
      route: 'published-factors',
      reasons: [{ kind: 'source', text: `B0(${ion.ion}) = ${ion.B0.value} (${ion.B0.source})` }],
    };
  }
  const row = [...library.ions.values()].filter(
    (other) => other.period === ion.period && other.B0.value !== null,
  );
  if (row.length < 3) return null;
  const light = ion.period === '3d';
  const [a, b, c] = plane(row.map((o) => ({ x1: o.dElectrons, x2: o.oxidationState, y: o.B0.value! })));
  const mean = row.reduce((sum, other) => sum + other.B0.value!, 0) / row.length;
  const value = light ? a + b * ion.dElectrons + c * ion.oxidationState : mean;
  if (value <= 0) return null;
  const how = light ? 'over d count and charge' : 'of its row';
  return {
    value,
    sigma: light ? 0.06 : 0.12,
    route: 'donor-class',
    reasons: [
      {
        kind: 'assumption',
        text: `no free-ion B of ${ion.ion} is on file; ${Math.round(value / 10) * 10} from the trend ${how}`,
      },
    ],
  };
}
