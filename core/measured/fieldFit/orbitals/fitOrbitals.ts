import { SpinhueError } from '../../../errors';
import { leastSquares, type LeastSquaresResult } from '../../../numerics/leastSquares';
import { rankedAssignments } from '../../assignment/ranked';
import type { FieldBand } from '../candidates';
import { keyOf, orbitalLevels, type OrbitalLevel } from './orbitalLevels';
import { patterns, type OrbitalFamily, type Pattern } from './patterns';

/** What moves in a fit: every orbital set, or the typical pattern as a whole. */
interface Freedom {
  readonly orbitals: 'each' | 'scale';
  readonly B: boolean;
}

export interface OrbitalFit {
  /** Relative to the last set, cm-1. */
  readonly orbitals: readonly {
    readonly name: string;
    readonly energy_cm1: number;
    readonly se: number | null;
  }[];
  /** x2-y2 above xy, which is 10Dq in a field with a fourfold axis; null in other fields. */
  readonly tenDq: { readonly value: number; readonly se: number | null } | null;
  readonly B: { readonly value: number | null; readonly se: number | null; readonly fitted: boolean };
  readonly C: number | null;
  readonly levels: readonly OrbitalLevel[];
  readonly calculated: readonly number[];
  readonly chi2: number;
  readonly freedom: Freedom;
  readonly freeParameters: number;
  /** Spin-allowed levels below the highest one used that no band was found for. */
  readonly skipped: number;
  readonly isGround: boolean;
  readonly groundLabel: string;
}

interface Setting {
  readonly dElectrons: number;
  readonly family: OrbitalFamily;
  readonly bands: readonly FieldBand[];
  readonly ratio: number;
  readonly usualB: number;
  readonly groundMultiplicity: number;
}

const scales = [6000, 10_000, 15_000, 21_000, 28_000, 36_000];

/** `2B1g -> 2B2g`, `2Eg`: multiplicity and D4h name without g. */
function named(label: string | null): { multiplicity: number; name: string } | null {
  const match = /^(\d+)\s*([ABE][12]?)g?/.exec((label ?? '').split(/->|→/).at(-1)!.trim());
  return match === null ? null : { multiplicity: Number(match[1]), name: match[2]! };
}

function fits(band: FieldBand, level: OrbitalLevel, groundMultiplicity: number): boolean {
  const wanted = named(band.label);
  if (wanted === null || level.label === null) {
    return level.multiplicity === (wanted?.multiplicity ?? band.multiplicity ?? groundMultiplicity);
  }
  return level.multiplicity === wanted.multiplicity && level.label.replace(/g$/, '') === wanted.name;
}

function match(setting: Setting, found: readonly OrbitalLevel[]): OrbitalLevel[] | null {
  const upper = found.filter((level) => level.energy > 1);
  const cost = setting.bands.map((band) =>
    upper.map((level) =>
      fits(band, level, setting.groundMultiplicity)
        ? ((level.energy - band.energy_cm1) / (0.1 * band.energy_cm1 + 500)) ** 2
        : Infinity,
    ),
  );
  const best = rankedAssignments(cost, 1)[0];
  return best === undefined ? null : best.columns.map((j) => upper[j]!);
}

function solve(
  setting: Setting,
  targets: readonly OrbitalLevel[],
  pattern: readonly number[],
  scale: number,
  freedom: Freedom,
): OrbitalFit {
  const { dElectrons, family, bands, ratio, usualB, groundMultiplicity } = setting;
  const hasB = dElectrons > 1 && dElectrons < 9;
  const sets = freedom.orbitals === 'each' ? pattern.length : 1;
  const start = freedom.orbitals === 'each' ? pattern.map((part) => part * scale) : [scale];
  const n = sets + (freedom.B ? 1 : 0);
  const energiesOf = (p: ArrayLike<number>): number[] =>
    freedom.orbitals === 'each' ? Array.from(p).slice(0, sets) : pattern.map((part) => part * p[0]!);
  const repulsion = (p: ArrayLike<number>): number => (!hasB ? 0 : freedom.B ? p[sets]! : usualB);
  const at = (p: ArrayLike<number>) => {
    const B = repulsion(p);
    return orbitalLevels(dElectrons, family, energiesOf(p), B, ratio * B, groundMultiplicity);
  };
  const calculate = (p: ArrayLike<number>): number[] => {
    const byKey = new Map(at(p).levels.map((level) => [keyOf(level), level.energy]));
    return targets.map((target) => byKey.get(keyOf(target)) ?? 1e6);
  };
  const fit: LeastSquaresResult = leastSquares({
    points: bands.length,
    start: freedom.B ? [...start, usualB] : start,
    lower: [
      ...new Array<number>(sets).fill(freedom.orbitals === 'each' ? -80_000 : 500),
      ...(freedom.B ? [50] : []),
    ],
    upper: [...new Array<number>(sets).fill(80_000), ...(freedom.B ? [1500] : [])],
    maxIterations: 40,
    evaluate(p, residuals, jacobian) {
      const here = calculate(p);
      for (const [i, band] of bands.entries()) residuals[i] = (here[i]! - band.energy_cm1) / band.se_cm1;
      if (jacobian === null) return;
      for (let j = 0; j < n; j++) {
        const h = Math.max(0.5, 1e-4 * Math.abs(p[j]!));
        const moved = (by: number) =>
          calculate(Float64Array.from(p, (value, k) => (k === j ? value + by : value)));
        const [up, down] = [moved(h), moved(-h)];
        for (const [i, band] of bands.entries())
          jacobian[i * n + j] = (up[i]! - down[i]!) / (2 * h * band.se_cm1);
      }
    },
  });
  const p = fit.parameters;
  const inverse = fit.inverseNormal;
  const se = (j: number): number | null =>
    inverse === null || fit.atBound[j] ? null : Math.sqrt(inverse[j]![j]!);
  const energies = energiesOf(p);
  const { isGround, groundLabel, levels } = at(p);
  const used = new Set(targets.map(keyOf));
  const calculated = calculate(p);
  const top = Math.max(...calculated);
  const skipped = levels.filter(
    (level) =>
      level.multiplicity === groundMultiplicity &&
      level.energy > 1 &&
      level.energy < top &&
      !used.has(keyOf(level)),
  ).length;
  const setSe = (j: number): number | null =>
    freedom.orbitals === 'each' ? se(j) : se(0) === null ? null : Math.abs(pattern[j]!) * se(0)!;
  const difference = (): number | null => {
    if (inverse === null) return null;
    if (freedom.orbitals === 'scale')
      return se(0) === null ? null : Math.abs(pattern[1]! - pattern[2]!) * se(0)!;
    return Math.sqrt(Math.max(0, inverse[1]![1]! + inverse[2]![2]! - 2 * inverse[1]![2]!));
  };
  return {
    orbitals: family.names.map((name, j) => ({
      name,
      energy_cm1: energies[j] ?? 0,
      se: j < energies.length ? setSe(j) : 0,
    })),
    tenDq: family.named ? { value: energies[1]! - energies[2]!, se: difference() } : null,
    B: { value: hasB ? repulsion(p) : null, se: freedom.B ? se(sets) : null, fitted: freedom.B },
    C: hasB ? ratio * repulsion(p) : null,
    levels: targets,
    calculated,
    skipped,
    chi2: fit.status === 'converged' ? fit.rss : fit.rss + 1e3,
    freedom,
    freeParameters: n,
    isGround,
    groundLabel,
  };
}

function freedoms(count: number, sets: number, hasB: boolean): Freedom[] {
  const list: Freedom[] = [];
  if (hasB && count >= sets + 1) list.push({ orbitals: 'each', B: true });
  if (count >= sets) list.push({ orbitals: 'each', B: false });
  if (hasB && count >= 2) list.push({ orbitals: 'scale', B: true });
  list.push({ orbitals: 'scale', B: false });
  return list;
}

const isUseful = (fit: OrbitalFit): boolean => {
  const largest = Math.max(...fit.orbitals.map((orbital) => Math.abs(orbital.energy_cm1)));
  const known = fit.orbitals.every((orbital) => orbital.se !== null && orbital.se < 0.35 * largest);
  return fit.chi2 < 1e3 && known && (!fit.freedom.B || (fit.B.se !== null && fit.B.se < 0.35 * fit.B.value!));
};

/**
 * Energies of the d orbitals (and B) from band positions in a geometry without cubic symmetry, through the exact levels of
 * the whole configuration space. Where the bands are too few the typical pattern of the geometry is scaled as a whole.
 * Null for a geometry that has no pattern here. Throws a SpinhueError where no level can be found for the bands.
 */
export function fitOrbitals(
  geometry: string,
  request: Omit<Setting, 'family' | 'groundMultiplicity'> & {
    readonly groundMultiplicities: readonly number[];
  },
): OrbitalFit | null {
  const pattern = Object.hasOwn(patterns, geometry) ? patterns[geometry as keyof typeof patterns] : undefined;
  if (pattern === undefined) return null;
  const hasB = request.dElectrons > 1 && request.dElectrons < 9;
  for (const freedom of freedoms(request.bands.length, pattern.family.names.length - 1, hasB)) {
    const best = bestWith(freedom, pattern, request, hasB);
    const last = freedom.orbitals === 'scale' && !freedom.B;
    if (best !== null && (last || isUseful(best))) return best;
  }
  throw new SpinhueError({
    code: 'no-convergence',
    field: 'bands',
    message: 'no assignment of these bands to levels of this ion can be fitted',
    remedy: 'check the d count, the labels and the multiplicities',
  });
}

function bestWith(
  freedom: Freedom,
  pattern: Pattern,
  request: Omit<Setting, 'family' | 'groundMultiplicity'> & {
    readonly groundMultiplicities: readonly number[];
  },
  hasB: boolean,
): OrbitalFit | null {
  let best: OrbitalFit | null = null;
  let least = Infinity;
  const B = hasB ? request.usualB : 0;
  for (const groundMultiplicity of request.groundMultiplicities) {
    const setting = { ...request, family: pattern.family, groundMultiplicity };
    for (const start of pattern.starts) {
      for (const scale of scales) {
        const energies = start.map((part) => part * scale);
        const here = orbitalLevels(
          request.dElectrons,
          pattern.family,
          energies,
          B,
          request.ratio * B,
          groundMultiplicity,
        );
        const targets = match(setting, here.levels);
        if (targets === null) continue;
        const fit = solve(setting, targets, start, scale, freedom);
        // The typical order of orbitals is worth a little; a ground level of another spin rules a solution out.
        const largest = Math.max(...fit.orbitals.map((orbital) => Math.abs(orbital.energy_cm1)), 1);
        const oddness = start.reduce(
          (sum, part, j) => sum + (fit.orbitals[j]!.energy_cm1 / largest - part) ** 2,
          0,
        );
        const cost = fit.chi2 + oddness + fit.skipped + (fit.isGround ? 0 : 50);
        if (cost < least) [best, least] = [fit, cost];
      }
    }
  }
  return best;
}
