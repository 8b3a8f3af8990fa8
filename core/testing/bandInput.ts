import { cubicLevels } from '../dshell';
import { estimate, notEstimated, type Estimate } from '../estimation';
import { defaultLibrary, findIon } from '../library';
import type { GeometryId } from '../record/composition';
import type { BandInput } from '../transitions';

const sure = (value: number, sigma = 0): Estimate =>
  estimate(value, sigma === 0 ? [] : [{ cause: 'test', sigma }], 'measured-complex', []);

/** Field parameters stated outright, so that a test of bands does not depend on how they are estimated. */
export interface StatedComplex {
  readonly metal: string;
  readonly oxidationState: number;
  readonly ligands: Readonly<Record<string, number>>;
  readonly tenDq?: number;
  readonly B?: number;
  readonly C?: number;
  readonly zeta?: number;
  readonly geometry?: GeometryId;
  readonly isomer?: string;
  readonly temperature_K?: number;
  readonly groundMultiplicity?: number;
  readonly donorStrengths?: BandInput['donorStrengths'];
}

/** What `predictBands` takes, for a complex in a cubic field with stated parameters. */
export function statedInput(complex: StatedComplex): BandInput {
  const { metal, oxidationState, tenDq, B, C, zeta, geometry = 'octahedral' } = complex;
  const ion = findIon(defaultLibrary, metal, oxidationState)!;
  const d = ion.dElectrons;
  const cubic = geometry === 'octahedral' || geometry === 'tetrahedral';
  const levels =
    !cubic || tenDq === undefined || d < 1 || d > 9
      ? []
      : cubicLevels({ dElectrons: d, geometry, tenDq, B: B ?? 0, C: C ?? 0 });
  const or = (value: number | undefined): Estimate =>
    value === undefined ? notEstimated('a test leaves it out') : sure(value);
  return {
    dElectrons: d,
    ion,
    ligands: Object.entries(complex.ligands).map(([id, count]) => ({
      ligand: defaultLibrary.ligands.get(id)!,
      count,
    })),
    geometry,
    isomer: complex.isomer ?? null,
    levels,
    tenDq: or(tenDq),
    racahB: or(B),
    racahC: or(C),
    zeta: or(zeta),
    temperature_K: complex.temperature_K ?? 298.15,
    ...(complex.groundMultiplicity === undefined ? {} : { groundMultiplicity: complex.groundMultiplicity }),
    ...(complex.donorStrengths === undefined ? {} : { donorStrengths: complex.donorStrengths }),
  };
}
