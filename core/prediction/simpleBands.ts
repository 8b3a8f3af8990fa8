import type { Estimate, FieldLevel } from '../estimation';
import type { Band } from '../transitions/types';
import { wavelength_nm } from '../units';

/** Beyond this the ligands' own absorption hides every d-d band. */
const highest_cm1 = 45_000;
/** Band centres are no better than this, whatever the parameters say. */
const smallestSigma_cm1 = 400;

interface Inputs {
  readonly levels: readonly FieldLevel[];
  readonly tenDq: Estimate;
  readonly B: Estimate;
  readonly C: Estimate;
  readonly centrosymmetric: boolean;
}

/** Standard deviation of a band centre from the shared doubts of 10Dq, B and C, through the level's own slopes. */
export function bandSigma(
  slope: { readonly tenDq: number; readonly B: number; readonly C: number },
  { tenDq, B, C }: { tenDq: Estimate; B: Estimate; C: Estimate },
): number {
  const byCause = new Map<string, number>();
  for (const [estimate, factor] of [
    [tenDq, slope.tenDq],
    [B, slope.B],
    [C, slope.C],
  ] as const) {
    for (const { cause, sigma } of estimate.shares ?? []) {
      byCause.set(cause, (byCause.get(cause) ?? 0) + sigma * factor);
    }
  }
  return Math.max(smallestSigma_cm1, Math.hypot(...byCause.values()));
}

const configurationText = (level: FieldLevel, even: string): string => {
  const first = level.configurations[0];
  if (first === undefined) return '';
  const { t2, e } = first;
  return `t2${even}${t2} e${even}${e}`;
};

/** Bands from the ground level to every other level, by spin only: class of intensity, width from the slope. */
export function simpleBands(inputs: Inputs): Band[] {
  const { levels, centrosymmetric } = inputs;
  const ground = levels[0];
  if (ground === undefined) return [];
  return levels.slice(1).flatMap((level): Band[] => {
    if (level.energy < 500 || level.energy > highest_cm1) return [];
    const allowed = level.multiplicity === ground.multiplicity;
    if (!allowed && Math.abs(level.multiplicity - ground.multiplicity) > 2) return [];
    const range: [number, number] = allowed ? (centrosymmetric ? [1, 100] : [50, 1000]) : [0.001, 1];
    const moved = Math.abs((level.configurations[0]?.e ?? 0) - (ground.configurations[0]?.e ?? 0));
    return [
      {
        energy_cm1: level.energy,
        sigma_cm1: bandSigma(level.slope, inputs),
        wavelength_nm: wavelength_nm(level.energy),
        multiplicity: level.multiplicity,
        label: level.label,
        kind: allowed ? 'spin-allowed' : 'spin-forbidden',
        molarAbsorptivity: allowed ? (centrosymmetric ? 12 : 200) : 0.1,
        molarAbsorptivityRange: range,
        intensityClass: `${allowed ? 'spin-allowed' : 'spin-forbidden'}, ${range[0]}-${range[1]}`,
        width_cm1: 250 + 3000 * Math.min(1.2, Math.abs(level.slope.tenDq)),
        configuration: configurationText(level, centrosymmetric ? 'g' : ''),
        electronsMoved: moved,
        slopeTenDq: level.slope.tenDq,
        slopeB: level.slope.B,
        slopeC: level.slope.C,
        reasons: [],
      },
    ];
  });
}
